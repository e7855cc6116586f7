package undermask.check;

import undermask.mask.Verdict;
import undermask.unit.Dimension;
import undermask.unit.Range;

/**
 * What a team asks of its profiles.
 *
 * @param requiredMarginDb margin to the mask below which a profile is tight
 * @param tightPasses whether a tight profile passes
 */
public record Policy(double requiredMarginDb, boolean tightPasses) {
    public static final Range REQUIRED_MARGIN = new Range("required margin", Dimension.DECIBEL, 0, 40);

    /** Builds a policy; the margin must lie in its range. */
    public Policy {
        REQUIRED_MARGIN.check(requiredMarginDb);
    }

    /** Whether the gate lets a verdict through. */
    public boolean passes(Verdict verdict) {
        return switch (verdict) {
            case CLEAR -> true;
            case TIGHT -> tightPasses;
            case OVER -> false;
        };
    }
}
