package undermask.installation;

import undermask.unit.Dimension;
import undermask.unit.Range;

/**
 * The mains that feeds the drive.
 *
 * @param phases 1 or 3
 * @param voltage rms in V: line to neutral for one phase, line to line for three
 * @param frequencyHz mains frequency
 */
public record Supply(int phases, double voltage, double frequencyHz) {
    public static final Range VOLTAGE = new Range("supply voltage", Dimension.VOLTAGE, 90, 760);
    public static final Range FREQUENCY = new Range("supply frequency", Dimension.FREQUENCY, 40, 70);

    /** Builds a supply; each value must lie in its range. */
    public Supply {
        if (phases != 1 && phases != 3) {
            throw new IllegalArgumentException("supply phases is " + phases + "; allowed: 1 or 3");
        }
        VOLTAGE.check(voltage);
        FREQUENCY.check(frequencyHz);
    }

    /** Number of current-carrying mains conductors: two for one phase, three for three. */
    public int conductors() {
        return phases == 1 ? 2 : 3;
    }

    /** Half-waves per mains period behind an uncontrolled bridge. */
    public int pulses() {
        return phases == 1 ? 2 : 6;
    }

    /** Voltage of a link charged by this supply at light load: √2 times the rectified rms voltage, V. */
    public double lightLoadLinkVoltage() {
        return Math.sqrt(2) * voltage;
    }
}
