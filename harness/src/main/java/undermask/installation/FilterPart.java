package undermask.installation;

import java.util.Objects;

/**
 * A one-stage mains filter of the catalogue: X capacitors on both sides of a current-compensated choke, Y capacitors on
 * its drive side.
 *
 * @param name as installations name it
 * @param phases 1 or 3
 * @param ratedCurrent in A
 * @param xMains X capacitor on the mains side, between each pair of lines
 * @param xDrive X capacitor on the drive side, likewise
 * @param y Y capacitor from each line to the filter's case on the drive side
 * @param chokeInductance common-mode inductance in H (all windings together)
 * @param leakageInductance per winding in H
 * @param windingCapacitance across each winding in F
 * @param lossResistance across the common-mode inductance in ohm
 * @param source where the values come from
 */
public record FilterPart(
        String name,
        int phases,
        double ratedCurrent,
        Capacitor xMains,
        Capacitor xDrive,
        Capacitor y,
        double chokeInductance,
        double leakageInductance,
        double windingCapacitance,
        double lossResistance,
        String source) {
    /** Builds a part; inductances, resistance and current are positive. */
    public FilterPart {
        Objects.requireNonNull(name);
        Objects.requireNonNull(source);
        if (phases != 1 && phases != 3) {
            throw new IllegalArgumentException("a filter has 1 or 3 phases, not " + phases);
        }
        positive(ratedCurrent, "rated current");
        positive(chokeInductance, "choke inductance");
        positive(leakageInductance, "leakage inductance");
        positive(windingCapacitance, "winding capacitance");
        positive(lossResistance, "loss resistance");
        if (leakageInductance >= chokeInductance) {
            throw new IllegalArgumentException("leakage inductance is not below the choke inductance");
        }
    }

    private static void positive(double value, String quantity) {
        if (!(value > 0) || Double.isInfinite(value)) {
            throw new IllegalArgumentException(quantity + " of a filter is " + value);
        }
    }
}
