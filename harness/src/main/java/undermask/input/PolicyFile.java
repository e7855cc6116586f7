package undermask.input;

import java.util.Optional;
import java.util.OptionalDouble;
import undermask.check.Policy;
import undermask.unit.Range;

/** Reads the quantities of a policy, from a file of their own or from a profile that overrides some of them. */
final class PolicyFile {
    /** What holds where no file says anything. */
    static final Policy DEFAULT = new Policy(6, false);

    private PolicyFile() {}

    /** Reads {@code policy.csv}; empty when anything is wrong. */
    static Optional<Policy> read(SourceText source, Problems problems) {
        return QuantityTable.read(source, "a policy", problems).flatMap(rows -> {
            Optional<Policy> policy = read(rows, Optional.of(DEFAULT));
            rows.rejectUnknown();
            return policy;
        });
    }

    /**
     * Reads the rows that are given.
     *
     * @param otherwise holds where they are not; empty when it could not be read
     */
    static Optional<Policy> read(QuantityTable rows, Optional<Policy> otherwise) {
        Policy base = otherwise.orElse(DEFAULT);
        Optional<Policy> policy = rows.record(
                Policy.REQUIRED_MARGIN.quantity(),
                () -> new Policy(
                        rows.number(Policy.REQUIRED_MARGIN, base.requiredMarginDb()),
                        rows.yes("tight passes", base.tightPasses()),
                        rows.number(Policy.PERCENTILE, base.percentile()),
                        (int) rows.number(Policy.RUNS, base.toleranceRuns()),
                        (long) rows.number(Policy.SEED, base.seed()),
                        limit(rows, Policy.LEAKAGE_LIMIT, base.leakageLimit()),
                        limit(rows, Policy.WINDING_LIMIT, base.windingLimit()),
                        limit(rows, Policy.MOTOR_PEAK_LIMIT, base.motorPeakLimit())));
        return otherwise.isPresent() ? policy : Optional.empty();
    }

    private static OptionalDouble limit(QuantityTable rows, Range range, OptionalDouble otherwise) {
        return rows.gives(range.quantity()) ? rows.optional(range) : otherwise;
    }
}
