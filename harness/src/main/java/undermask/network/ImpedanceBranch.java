package undermask.network;

/** A frequency-dependent impedance between two nodes. */
record ImpedanceBranch(int from, int to, Impedance impedance) implements Element {
    @Override
    public void stamp(NodalEquations equations, double omega) {
        Phasor z = impedance.at(omega / (2 * Math.PI));
        double square = z.re() * z.re() + z.im() * z.im();
        equations.admittance(from, to, z.re() / square, -z.im() / square);
    }
}
