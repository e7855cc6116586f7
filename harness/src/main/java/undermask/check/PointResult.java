package undermask.check;

import java.util.List;
import java.util.Optional;
import undermask.drive.OperatingPoint;
import undermask.mask.Judgement;
import undermask.pwm.Bridge;
import undermask.receiver.Detector;
import undermask.receiver.Trace;

/**
 * One operating point, checked.
 *
 * @param bridge the switching that was computed
 * @param trace what the receiver shows, the worse line of the mains
 * @param band where that lies with tolerances; empty without tolerance runs
 * @param judgements worst frequency of each detector that the mask limits
 */
public record PointResult(
        OperatingPoint point, Bridge bridge, Trace trace, Optional<TraceBand> band, List<Judgement> judgements) {
    /** Takes a copy of the judgements. */
    public PointResult {
        judgements = List.copyOf(judgements);
    }

    Judgement of(Detector detector) {
        return judgements.stream()
                .filter(judgement -> judgement.detector() == detector)
                .findFirst()
                .orElseThrow();
    }
}
