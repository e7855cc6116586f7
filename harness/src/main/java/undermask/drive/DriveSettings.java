package undermask.drive;

import java.util.Objects;
import java.util.OptionalDouble;
import undermask.unit.Dimension;
import undermask.unit.Figures;
import undermask.unit.Range;

/**
 * What a drive keeps in its parameter memory.
 *
 * @param linkVoltage mean voltage of the DC link in V; empty: follows from supply and load
 */
public record DriveSettings(
        Carrier carrier,
        ModulationPlan modulation,
        Switching switching,
        Edges edges,
        VoltageCurve voltageCurve,
        OptionalDouble linkVoltage) {
    public static final Range LINK_VOLTAGE = new Range("link voltage", Dimension.VOLTAGE, 50, 1500);

    /** Builds settings; each value must lie in its range. */
    public DriveSettings {
        Objects.requireNonNull(carrier);
        Objects.requireNonNull(modulation);
        Objects.requireNonNull(switching);
        Objects.requireNonNull(edges);
        Objects.requireNonNull(voltageCurve);
        linkVoltage.ifPresent(LINK_VOLTAGE::check);
        carrier.frequency().ifPresent(hz -> refuseLongDeadTime(switching, carrier, hz));
    }

    /**
     * The carrier frequency at a point in Hz.
     *
     * @throws IllegalArgumentException when the carrier there is outside its range or too fast for the dead time
     */
    public double carrierHz(OperatingPoint point) {
        double hz = Carrier.FREQUENCY.check(carrier.hzAt(point));
        refuseLongDeadTime(switching, carrier, hz);
        return hz;
    }

    private static void refuseLongDeadTime(Switching switching, Carrier carrier, double hz) {
        double quarter = 0.25 / (hz + carrier.spread().deviationHz());
        if (switching.deadTime() > quarter) {
            throw new IllegalArgumentException("dead time must not exceed a quarter of the carrier period, "
                    + Figures.withUnit(quarter, Dimension.TIME, 4));
        }
    }
}
