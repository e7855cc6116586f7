package undermask.check;

import undermask.receiver.Trace;

/**
 * Where the readings lie when the installation's values are what they may be.
 *
 * @param low 5th percentile of the tolerance runs
 * @param middle 50th
 * @param high 95th
 * @param judged the percentile that the policy judges
 */
public record TraceBand(Trace low, Trace middle, Trace high, Trace judged) {
    TraceBand envelopeWith(TraceBand other) {
        return new TraceBand(
                low.envelopeWith(other.low),
                middle.envelopeWith(other.middle),
                high.envelopeWith(other.high),
                judged.envelopeWith(other.judged));
    }
}
