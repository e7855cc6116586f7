package undermask.drive;

import undermask.unit.Dimension;
import undermask.unit.Range;

/**
 * The V/f curve: the line-to-line voltage that the drive sets at an output frequency.
 *
 * @param baseVoltage line-to-line rms voltage at and above the base frequency, V
 * @param baseHz base frequency
 * @param boost line-to-line rms voltage at standstill, V
 */
public record VoltageCurve(double baseVoltage, double baseHz, double boost) {
    public static final Range BASE_VOLTAGE = new Range("base voltage", Dimension.VOLTAGE, 50, 1000);
    public static final Range BASE_FREQUENCY = new Range("base frequency", Dimension.FREQUENCY, 10, 590);
    public static final Range BOOST = new Range("boost", Dimension.VOLTAGE, 0, 200);

    /** Builds a curve; each value must lie in its range and the boost below the base voltage. */
    public VoltageCurve {
        BASE_VOLTAGE.check(baseVoltage);
        BASE_FREQUENCY.check(baseHz);
        BOOST.check(boost);
        if (boost >= baseVoltage) {
            throw new IllegalArgumentException("boost is not below the base voltage");
        }
    }

    /** The line-to-line rms voltage at an output frequency: straight from boost to base voltage, then constant. */
    public double lineVoltage(double outputHz) {
        return outputHz >= baseHz ? baseVoltage : boost + (baseVoltage - boost) * outputHz / baseHz;
    }
}
