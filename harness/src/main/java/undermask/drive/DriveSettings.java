package undermask.drive;

import java.util.Objects;
import java.util.OptionalDouble;
import undermask.unit.Dimension;
import undermask.unit.Figures;
import undermask.unit.Range;

/**
 * What a drive keeps in its parameter memory.
 *
 * @param carrierHz carrier frequency
 * @param modulation scheme
 * @param sampling when the reference is sampled
 * @param deadTime between the two switches of a leg, s
 * @param slewRising dv/dt of an edge that raises the output, V/s
 * @param slewFalling dv/dt of an edge that lowers it, V/s
 * @param edgeForm shape of both
 * @param voltageCurve V/f curve
 * @param linkVoltage mean voltage of the DC link in V; empty: follows from the supply
 */
public record DriveSettings(
        double carrierHz,
        Modulation modulation,
        CarrierSampling sampling,
        double deadTime,
        double slewRising,
        double slewFalling,
        EdgeForm edgeForm,
        VoltageCurve voltageCurve,
        OptionalDouble linkVoltage) {
    public static final Range CARRIER = new Range("carrier frequency", Dimension.FREQUENCY, 500, 40e3);
    public static final Range DEAD_TIME = new Range("dead time", Dimension.TIME, 0, 20e-6);
    public static final Range SLEW_RISING = new Range("dv/dt rising", Dimension.SLEW, 0.05e9, 200e9);
    public static final Range SLEW_FALLING = new Range("dv/dt falling", Dimension.SLEW, 0.05e9, 200e9);
    public static final Range LINK_VOLTAGE = new Range("link voltage", Dimension.VOLTAGE, 50, 1500);

    /** Builds settings; each value must lie in its range. */
    public DriveSettings {
        CARRIER.check(carrierHz);
        Objects.requireNonNull(modulation);
        Objects.requireNonNull(sampling);
        DEAD_TIME.check(deadTime);
        SLEW_RISING.check(slewRising);
        SLEW_FALLING.check(slewFalling);
        Objects.requireNonNull(edgeForm);
        Objects.requireNonNull(voltageCurve);
        linkVoltage.ifPresent(LINK_VOLTAGE::check);
        if (deadTime > 0.25 / carrierHz) {
            throw new IllegalArgumentException("dead time must not exceed a quarter of the carrier period, "
                    + Figures.withUnit(0.25 / carrierHz, Dimension.TIME, 4));
        }
    }
}
