package undermask.installation;

import java.util.Objects;
import java.util.Optional;

/**
 * A stage of a mains filter, from mains to drive: a current-compensated choke, then X and Y capacitors.
 *
 * @param choke common-mode inductance in H, all windings together, at low frequency
 * @param leakage inductance per winding in H
 * @param windingCapacitance across each winding in F
 * @param lossResistance across the common-mode inductance in ohm; used where no material is given
 * @param core material whose permeability the common-mode inductance follows; empty: constant
 * @param x between each pair of lines
 * @param y from each line to the filter's case
 */
public record FilterStage(
        double choke,
        double leakage,
        double windingCapacitance,
        double lossResistance,
        Optional<Material> core,
        Capacitor x,
        Capacitor y) {
    /** Builds a stage; inductances and resistance are positive. */
    public FilterStage {
        positive(choke, "choke inductance");
        positive(leakage, "leakage inductance");
        positive(windingCapacitance, "winding capacitance");
        positive(lossResistance, "loss resistance");
        Objects.requireNonNull(core);
        Objects.requireNonNull(x);
        Objects.requireNonNull(y);
        if (leakage >= choke) {
            throw new IllegalArgumentException("leakage inductance is not below the choke inductance");
        }
    }

    private static void positive(double value, String quantity) {
        if (!(value > 0) || Double.isInfinite(value)) {
            throw new IllegalArgumentException(quantity + " of a filter is " + value);
        }
    }
}
