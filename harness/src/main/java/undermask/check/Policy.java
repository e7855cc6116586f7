package undermask.check;

import java.util.OptionalDouble;
import undermask.mask.Verdict;
import undermask.unit.Dimension;
import undermask.unit.Range;

/**
 * What a team asks of its profiles.
 *
 * @param requiredMarginDb margin to the mask below which a profile is tight
 * @param tightPasses whether a tight profile passes
 * @param percentile of the tolerance runs that is judged, a share; of no effect without runs
 * @param toleranceRuns how often the installation's values are drawn anew; 0 for none
 * @param seed where the drawing begins; equal seeds give equal results
 * @param leakageLimit of the current into PE at mains frequency, A; empty for none
 * @param windingLimit of the motor winding's temperature, °C; empty for none
 * @param motorPeakLimit of the voltage between motor terminals, V; empty for none
 */
public record Policy(
        double requiredMarginDb,
        boolean tightPasses,
        double percentile,
        int toleranceRuns,
        long seed,
        OptionalDouble leakageLimit,
        OptionalDouble windingLimit,
        OptionalDouble motorPeakLimit) {
    public static final Range REQUIRED_MARGIN = new Range("required margin", Dimension.DECIBEL, 0, 40);
    public static final Range PERCENTILE = new Range("percentile", Dimension.NUMBER, 0.01, 0.99);
    public static final Range RUNS = new Range("tolerance runs", Dimension.NUMBER, 0, 10_000);
    public static final Range SEED = new Range("tolerance seed", Dimension.NUMBER, 0, 1e9);
    public static final Range LEAKAGE_LIMIT = new Range("leakage current limit", Dimension.CURRENT, 1e-5, 10);
    public static final Range WINDING_LIMIT = new Range("winding temperature limit", Dimension.TEMPERATURE, 40, 220);
    public static final Range MOTOR_PEAK_LIMIT = new Range("motor peak voltage limit", Dimension.VOLTAGE, 300, 5000);

    /** Builds a policy; each value must lie in its range. */
    public Policy {
        REQUIRED_MARGIN.check(requiredMarginDb);
        PERCENTILE.check(percentile);
        RUNS.check(toleranceRuns);
        SEED.check(seed);
        leakageLimit.ifPresent(LEAKAGE_LIMIT::check);
        windingLimit.ifPresent(WINDING_LIMIT::check);
        motorPeakLimit.ifPresent(MOTOR_PEAK_LIMIT::check);
    }

    /** A policy about margins alone. */
    public Policy(double requiredMarginDb, boolean tightPasses) {
        this(
                requiredMarginDb,
                tightPasses,
                0.5,
                0,
                1,
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                OptionalDouble.empty());
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
