package undermask.drive;

import java.util.Objects;
import java.util.Optional;
import java.util.OptionalDouble;
import undermask.unit.Dimension;
import undermask.unit.Range;

/**
 * Which scheme a drive uses where.
 *
 * @param scheme the scheme, up to the switch-over if there is one
 * @param overmodulation what happens beyond the linear range
 * @param switchOver the scheme beyond the switch-over; empty when there is none
 * @param switchOverHz output frequency from which it is used; empty when frequency does not decide
 * @param switchOverVoltage line-to-line rms output voltage from which it is used, V; empty when voltage does not decide
 */
public record ModulationPlan(
        Modulation scheme,
        Overmodulation overmodulation,
        Optional<Modulation> switchOver,
        OptionalDouble switchOverHz,
        OptionalDouble switchOverVoltage) {
    public static final String SWITCH_OVER = "switch-over modulation";
    public static final Range SWITCH_OVER_HZ = new Range("switch-over output frequency", Dimension.FREQUENCY, 0.5, 590);
    public static final Range SWITCH_OVER_VOLTAGE = new Range("switch-over output voltage", Dimension.VOLTAGE, 1, 1000);

    /** Builds a plan; a second scheme and a place where it begins belong together. */
    public ModulationPlan {
        Objects.requireNonNull(scheme);
        Objects.requireNonNull(overmodulation);
        switchOverHz.ifPresent(SWITCH_OVER_HZ::check);
        switchOverVoltage.ifPresent(SWITCH_OVER_VOLTAGE::check);
        if (switchOver.isPresent() != (switchOverHz.isPresent() || switchOverVoltage.isPresent())) {
            throw new IllegalArgumentException(SWITCH_OVER + " and " + SWITCH_OVER_HZ.quantity() + " or "
                    + SWITCH_OVER_VOLTAGE.quantity() + " belong together");
        }
    }

    /** One scheme throughout. */
    public static ModulationPlan of(Modulation scheme) {
        return new ModulationPlan(
                scheme, Overmodulation.COMPENSATED, Optional.empty(), OptionalDouble.empty(), OptionalDouble.empty());
    }

    /**
     * The scheme at an output frequency and a line-to-line rms voltage: the second one from either switch-over on.
     */
    public Modulation at(double outputHz, double lineVoltage) {
        boolean over = outputHz >= switchOverHz.orElse(Double.POSITIVE_INFINITY)
                || lineVoltage >= switchOverVoltage.orElse(Double.POSITIVE_INFINITY);
        return over ? switchOver.orElseThrow() : scheme;
    }
}
