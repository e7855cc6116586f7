package undermask.drive;

import java.util.OptionalDouble;
import undermask.unit.Dimension;
import undermask.unit.Figures;
import undermask.unit.Range;

/**
 * The lower carrier that a drive falls back to.
 *
 * @param hz the lower carrier frequency
 * @param aboveCurrent rms load current above which it is used, A; empty when load does not decide
 * @param belowHz output frequency below which it is used; empty when output frequency does not decide
 */
public record ReducedCarrier(double hz, OptionalDouble aboveCurrent, OptionalDouble belowHz) {
    public static final Range FREQUENCY = new Range("reduced carrier frequency", Dimension.FREQUENCY, 500, 40e3);
    public static final Range ABOVE_CURRENT =
            new Range("reduced carrier above load current", Dimension.CURRENT, 0, 2000);
    public static final Range BELOW_HZ =
            new Range("reduced carrier below output frequency", Dimension.FREQUENCY, 0.5, 590);

    /** Builds a fall-back; something must decide when it is used. */
    public ReducedCarrier {
        FREQUENCY.check(hz);
        aboveCurrent.ifPresent(ABOVE_CURRENT::check);
        belowHz.ifPresent(BELOW_HZ::check);
        if (aboveCurrent.isEmpty() && belowHz.isEmpty()) {
            throw new IllegalArgumentException(FREQUENCY.quantity() + " "
                    + Figures.withUnit(hz, Dimension.FREQUENCY, 4) + " needs " + ABOVE_CURRENT.quantity() + " or "
                    + BELOW_HZ.quantity());
        }
    }

    /** Whether it is used at a point. */
    boolean appliesTo(OperatingPoint point) {
        return point.loadCurrentRms() > aboveCurrent.orElse(Double.POSITIVE_INFINITY)
                || point.outputHz() < belowHz.orElse(0);
    }
}
