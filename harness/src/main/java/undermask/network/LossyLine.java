package undermask.network;

/**
 * A uniform line of two conductors. Resistance per length grows with the square root of frequency from a given point,
 * conductance is that of an insulation of constant tan δ.
 *
 * @param length in m
 * @param inductance of the loop in H/m
 * @param capacitance in F/m
 * @param resistance of the loop at {@code resistanceHz} in ohm/m
 * @param resistanceHz frequency at which the resistance is given
 * @param lossFactor tan δ
 */
public record LossyLine(
        double length,
        double inductance,
        double capacitance,
        double resistance,
        double resistanceHz,
        double lossFactor) {
    /** Builds a line; length, inductance, capacitance and the frequency are positive, the losses not negative. */
    public LossyLine {
        for (double value : new double[] {length, inductance, capacitance, resistanceHz}) {
            if (!(value > 0) || Double.isInfinite(value)) {
                throw new IllegalArgumentException("a line has a value of " + value);
            }
        }
        for (double value : new double[] {resistance, lossFactor}) {
            if (!(value >= 0) || Double.isInfinite(value)) {
                throw new IllegalArgumentException("a line has a loss of " + value);
            }
        }
    }
}
