package undermask.drive;

import undermask.unit.Dimension;
import undermask.unit.Figures;
import undermask.unit.Range;

/**
 * One steady working point of the drive.
 *
 * @param outputHz frequency of the fundamental
 * @param loadCurrentRms rms of the fundamental phase current in A
 * @param displacementPowerFactor cosine of the lag of current behind voltage, 0 to 1
 */
public record OperatingPoint(double outputHz, double loadCurrentRms, double displacementPowerFactor) {
    public static final Range OUTPUT = new Range("output frequency", Dimension.FREQUENCY, 0.5, 590);
    public static final Range CURRENT = new Range("load current", Dimension.CURRENT, 0, 2000);
    public static final Range POWER_FACTOR = new Range("displacement power factor", Dimension.NUMBER, 0, 1);

    /** Builds a point; each value must lie in its range. */
    public OperatingPoint {
        OUTPUT.check(outputHz);
        CURRENT.check(loadCurrentRms);
        POWER_FACTOR.check(displacementPowerFactor);
    }

    /** The lag of the current behind the voltage in rad, 0 to π/2. */
    public double lag() {
        return Math.acos(displacementPowerFactor);
    }

    /** A short name for tables: {@code 50 Hz 8.2 A 0.82}. */
    public String label() {
        return Figures.withUnit(outputHz, Dimension.FREQUENCY, 6) + " "
                + Figures.withUnit(loadCurrentRms, Dimension.CURRENT, 6) + " "
                + Figures.significant(displacementPowerFactor, 6);
    }
}
