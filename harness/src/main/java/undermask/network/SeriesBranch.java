package undermask.network;

/**
 * Resistance, inductance and capacitance in series, each of which may be missing: R = 0, L = 0, C = ∞.
 *
 * @param from node
 * @param to node
 * @param resistance in ohm
 * @param inductance in H
 * @param capacitance in F
 */
record SeriesBranch(int from, int to, double resistance, double inductance, double capacitance) implements Element {
    @Override
    public void stamp(NodalEquations equations, double omega) {
        double reactance = omega * inductance - 1 / (omega * capacitance);
        double square = resistance * resistance + reactance * reactance;
        equations.admittance(from, to, resistance / square, -reactance / square);
    }
}
