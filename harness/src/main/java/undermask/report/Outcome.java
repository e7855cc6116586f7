package undermask.report;

import java.util.Comparator;
import java.util.List;
import undermask.check.FurtherLimit;
import undermask.check.Leverage;
import undermask.check.PointResult;
import undermask.check.Profile;
import undermask.check.ProfileResult;
import undermask.mask.Judgement;
import undermask.mask.Verdict;
import undermask.receiver.Detector;

/**
 * What is kept of a checked profile when its own reports are written: judgements, no traces.
 *
 * @param points label and judgements of each operating point
 * @param judgements worst frequency of each limited detector over all points
 * @param leverages what rules at each of these frequencies, in their order
 * @param furtherLimits limits of the policy that are not about emission
 * @param advice what single changes would do, a line each; empty for a profile that passes
 */
public record Outcome(
        Profile profile,
        List<Point> points,
        List<Judgement> judgements,
        List<Leverage> leverages,
        List<FurtherLimit> furtherLimits,
        List<String> advice) {
    /**
     * What is kept of an operating point.
     *
     * @param carrierHz mean carrier frequency there
     * @param remarks what a drive engineer should know of it, in sentences
     */
    public record Point(String label, double carrierHz, List<String> remarks, List<Judgement> judgements) {
        Judgement of(Detector detector) {
            return judgements.stream()
                    .filter(judgement -> judgement.detector() == detector)
                    .findFirst()
                    .orElseThrow();
        }
    }

    static Outcome of(ProfileResult result) {
        return new Outcome(
                result.profile(),
                result.points().stream()
                        .map((PointResult point) -> new Point(
                                point.point().label(),
                                point.bridge().window().carrierHz(),
                                point.bridge().remarks(),
                                point.judgements()))
                        .toList(),
                result.judgements(),
                result.leverages(),
                result.furtherLimits(),
                List.of());
    }

    /** The same with advice. */
    Outcome with(List<String> lines) {
        return new Outcome(profile, points, judgements, leverages, furtherLimits, lines);
    }

    /** What rules at the frequency of a judgement. */
    Leverage leverage(Judgement judgement) {
        return leverages.get(judgements.indexOf(judgement));
    }

    /** The judgement with the least left of what its policy asks for. */
    public Judgement worst() {
        return judgements.stream()
                .min(Comparator.comparingDouble(judgement -> judgement.marginDb() - judgement.requiredDb()))
                .orElseThrow();
    }

    /** The worst verdict over detectors. */
    public Verdict verdict() {
        return judgements.stream().map(Judgement::verdict).reduce(Verdict.CLEAR, Verdict::worse);
    }

    /** Whether the profile's policy lets a judgement through. */
    public boolean passes(Judgement judgement) {
        return profile.policy().passes(judgement.verdict());
    }

    /** Whether the profile's policy lets all of it through. */
    public boolean passes() {
        return judgements.stream().allMatch(this::passes)
                && furtherLimits().stream().allMatch(FurtherLimit::kept);
    }

    /** The operating point at which a detector reads worst. */
    Point pointOf(Judgement judgement) {
        return points.stream()
                .min(Comparator.comparingDouble(
                        (Point point) -> point.of(judgement.detector()).marginDb()))
                .orElseThrow();
    }
}
