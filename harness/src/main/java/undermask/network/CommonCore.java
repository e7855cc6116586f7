package undermask.network;

import undermask.installation.Material;

/**
 * Equal windings on one core whose permeability depends on frequency: each has a leakage inductance of its own, all share
 * the core's flux. With the inductance matrix λI + s(f)J its inverse is (I − s/(λ + n·s)·J)/λ.
 */
final class CommonCore implements Element {
    private final int[] starts;
    private final int[] ends;
    private final double leakage;
    private final double shared;
    private final Material material;
    private final double[] permeability = new double[2];

    /**
     * Winds a core.
     *
     * @param leakage per winding in H
     * @param shared inductance at low frequency in H
     */
    CommonCore(int[] starts, int[] ends, double leakage, double shared, Material material) {
        this.starts = starts.clone();
        this.ends = ends.clone();
        this.leakage = leakage;
        this.shared = shared;
        this.material = material;
    }

    @Override
    public void stamp(NodalEquations equations, double omega) {
        material.permeability(omega / (2 * Math.PI), permeability);
        double re = shared * permeability[0] / material.initial();
        double im = shared * permeability[1] / material.initial();
        double downRe = leakage + starts.length * re;
        double downIm = starts.length * im;
        double square = downRe * downRe + downIm * downIm;
        double shareRe = (re * downRe + im * downIm) / square;
        double shareIm = (im * downRe - re * downIm) / square;
        for (int i = 0; i < starts.length; i++) {
            for (int j = 0; j < starts.length; j++) {
                // times 1/(jωλ)
                double oneRe = (i == j ? 1 : 0) - shareRe;
                equations.transferAdmittance(
                        starts[i],
                        ends[i],
                        starts[j],
                        ends[j],
                        -shareIm / (omega * leakage),
                        -oneRe / (omega * leakage));
            }
        }
    }
}
