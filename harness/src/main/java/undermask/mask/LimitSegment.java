package undermask.mask;

import java.util.Objects;
import undermask.receiver.Detector;
import undermask.unit.Dimension;
import undermask.unit.Range;

/**
 * A stretch of a limit line, straight in dB over the logarithm of frequency.
 *
 * @param detector the detector it limits
 * @param fromHz start
 * @param toHz end, above the start
 * @param fromDbuv limit at the start
 * @param toDbuv limit at the end
 */
public record LimitSegment(Detector detector, double fromHz, double toHz, double fromDbuv, double toDbuv) {
    public static final Range FREQUENCY = new Range("frequency of a limit", Dimension.FREQUENCY, 9e3, 30e6);
    public static final Range LEVEL = new Range("level of a limit", Dimension.LEVEL, -20, 200);

    /** Builds a segment; frequencies rise and all values lie in their ranges. */
    public LimitSegment {
        Objects.requireNonNull(detector);
        FREQUENCY.check(fromHz);
        FREQUENCY.check(toHz);
        LEVEL.check(fromDbuv);
        LEVEL.check(toDbuv);
        if (!(toHz > fromHz)) {
            throw new IllegalArgumentException("a limit must end above the frequency at which it starts");
        }
    }

    boolean covers(double frequency) {
        return frequency >= fromHz && frequency <= toHz;
    }

    /** The limit in dBµV at a frequency inside the segment. */
    double limitDbuv(double frequency) {
        if (frequency == toHz) {
            return toDbuv;
        }
        return fromDbuv + (toDbuv - fromDbuv) * Math.log(frequency / fromHz) / Math.log(toHz / fromHz);
    }
}
