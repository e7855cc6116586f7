package undermask.drive;

import java.util.Objects;
import undermask.unit.Dimension;
import undermask.unit.Figures;
import undermask.unit.Range;

/**
 * How the commands of the comparison reach the switches.
 *
 * @param deadTime between the two switches of a leg, s
 * @param compensated whether the drive corrects the volt-seconds that dead time takes
 * @param minimumPulse shortest pulse or gap, s; 0 for none
 * @param shortPulses what becomes of shorter ones
 * @param upperDelay turn-on less turn-off delay of the upper switches, s
 * @param lowerDelay the same of the lower switches, s
 */
public record Switching(
        double deadTime,
        boolean compensated,
        double minimumPulse,
        ShortPulses shortPulses,
        double upperDelay,
        double lowerDelay) {
    public static final Range DEAD_TIME = new Range("dead time", Dimension.TIME, 0, 20e-6);
    public static final Range MINIMUM_PULSE = new Range("minimum pulse width", Dimension.TIME, 0, 50e-6);
    public static final Range UPPER_DELAY = new Range("upper switch delay difference", Dimension.TIME, -2e-6, 5e-6);
    public static final Range LOWER_DELAY = new Range("lower switch delay difference", Dimension.TIME, -2e-6, 5e-6);

    /** Builds switching; each value must lie in its range. */
    public Switching {
        DEAD_TIME.check(deadTime);
        MINIMUM_PULSE.check(minimumPulse);
        Objects.requireNonNull(shortPulses);
        UPPER_DELAY.check(upperDelay);
        LOWER_DELAY.check(lowerDelay);
        if (minimumPulse > 0 && deadTime > minimumPulse) {
            throw new IllegalArgumentException("dead time " + Figures.withUnit(deadTime, Dimension.TIME, 4)
                    + " must not exceed the minimum pulse width, "
                    + Figures.withUnit(minimumPulse, Dimension.TIME, 4));
        }
        if (deadTime + Math.min(upperDelay, lowerDelay) < 0) {
            throw new IllegalArgumentException(
                    "a switch that turns off later than its opposite turns on shorts the link: dead time and delay difference together are below 0 s");
        }
    }

    /** Dead time and nothing else. */
    public static Switching of(double deadTime) {
        return new Switching(deadTime, false, 0, ShortPulses.DROP, 0, 0);
    }
}
