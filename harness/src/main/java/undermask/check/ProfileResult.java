package undermask.check;

import java.util.List;
import java.util.Optional;
import undermask.mask.Judgement;
import undermask.receiver.Trace;

/**
 * A profile, checked.
 *
 * @param points results in the order of the profile's operating points
 * @param envelope the highest reading over all points
 * @param band where the envelope lies with tolerances; empty without tolerance runs
 * @param judgements worst frequency of each limited detector on the envelope, or on the percentile that is judged
 * @param leverages what rules at each of these frequencies, in their order
 * @param furtherLimits limits of the policy that are not about emission
 */
public record ProfileResult(
        Profile profile,
        List<PointResult> points,
        Trace envelope,
        Optional<TraceBand> band,
        List<Judgement> judgements,
        List<Leverage> leverages,
        List<FurtherLimit> furtherLimits) {
    /** Takes copies; a result without a judgement is no result. */
    public ProfileResult {
        points = List.copyOf(points);
        judgements = List.copyOf(judgements);
        leverages = List.copyOf(leverages);
        furtherLimits = List.copyOf(furtherLimits);
        if (judgements.isEmpty()) {
            throw new IllegalArgumentException("profile " + profile.name() + " was held against no limit");
        }
    }
}
