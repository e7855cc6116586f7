package undermask.drive;

import java.util.Objects;
import undermask.unit.Dimension;
import undermask.unit.Range;

/**
 * The spread of a carrier.
 *
 * @param deviationHz largest distance from the set carrier, Hz
 * @param rateHz how often a periodic spread goes up and down, Hz; of no effect for the others
 * @param seed where the random one begins; equal seeds give equal carriers
 */
public record Spread(SpreadForm form, double deviationHz, double rateHz, long seed) {
    public static final Range DEVIATION = new Range("carrier spread deviation", Dimension.FREQUENCY, 0, 20e3);
    public static final Range RATE = new Range("carrier spread rate", Dimension.FREQUENCY, 1, 2000);
    public static final Range SEED = new Range("carrier spread seed", Dimension.NUMBER, 0, 1e9);

    public static final Spread NONE = new Spread(SpreadForm.NONE, 0, RATE.low(), 0);

    /** Builds a spread; each value must lie in its range. */
    public Spread {
        Objects.requireNonNull(form);
        DEVIATION.check(deviationHz);
        RATE.check(rateHz);
        SEED.check(seed);
    }

    /** Whether the carrier stays where it is set. */
    public boolean none() {
        return form == SpreadForm.NONE;
    }
}
