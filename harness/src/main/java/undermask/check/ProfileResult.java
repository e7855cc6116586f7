package undermask.check;

import java.util.List;
import undermask.mask.Judgement;
import undermask.mask.Verdict;
import undermask.receiver.Trace;

/**
 * A profile, checked.
 *
 * @param points results in the order of the profile's operating points
 * @param envelope the highest reading over all points
 * @param judgements worst frequency of each limited detector on the envelope
 */
public record ProfileResult(Profile profile, List<PointResult> points, Trace envelope, List<Judgement> judgements) {
    /** Takes copies; a result without a judgement is no result. */
    public ProfileResult {
        points = List.copyOf(points);
        judgements = List.copyOf(judgements);
        if (judgements.isEmpty()) {
            throw new IllegalArgumentException("profile " + profile.name() + " was held against no limit");
        }
    }

    /** The worst verdict over detectors. */
    public Verdict verdict() {
        return judgements.stream().map(Judgement::verdict).reduce(Verdict.CLEAR, Verdict::worse);
    }

    /** Whether the gate lets a judgement of this profile through. */
    public boolean passes(Judgement judgement) {
        return switch (judgement.verdict()) {
            case CLEAR -> true;
            case TIGHT -> profile.policy().tightPasses();
            case OVER -> false;
        };
    }

    /** Whether the gate lets the profile through. */
    public boolean passes() {
        return judgements.stream().allMatch(this::passes);
    }

    /** The order of the carrier multiple nearest to a frequency. */
    public long carrierOrder(double frequencyHz) {
        return Math.round(frequencyHz / profile.settings().carrierHz());
    }
}
