package undermask.check;

import java.util.List;
import undermask.mask.Judgement;
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
}
