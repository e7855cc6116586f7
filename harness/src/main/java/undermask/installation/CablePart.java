package undermask.installation;

import java.util.Objects;

/**
 * A motor lead of the catalogue, in common mode: all cores together against shield and PE, or against the earthed plane
 * that an unshielded one lies on.
 *
 * @param name as installations name it
 * @param capacitance cores to shield in F/m
 * @param inductance of the loop cores to shield in H/m
 * @param resistance of that loop at {@code resistanceHz} in ohm/m; it grows with the square root of frequency
 * @param resistanceHz frequency at which the resistance is given
 * @param lossFactor tan δ of the insulation
 * @param shielded whether it has a shield; without one the values hold above the plate or tray that it lies on
 * @param source where the values come from
 */
public record CablePart(
        String name,
        double capacitance,
        double inductance,
        double resistance,
        double resistanceHz,
        double lossFactor,
        boolean shielded,
        String source) {
    /** Builds a part of positive, finite values. */
    public CablePart {
        Objects.requireNonNull(name);
        Objects.requireNonNull(source);
        for (double value : new double[] {capacitance, inductance, resistance, resistanceHz, lossFactor}) {
            if (!(value > 0) || Double.isInfinite(value)) {
                throw new IllegalArgumentException("cable " + name + " has a value of " + value);
            }
        }
    }
}
