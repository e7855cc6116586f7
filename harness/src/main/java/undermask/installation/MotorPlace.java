package undermask.installation;

import java.util.Objects;
import undermask.unit.Dimension;
import undermask.unit.Range;

/**
 * Where a motor stands.
 *
 * @param ambientCelsius temperature of the air around it
 */
public record MotorPlace(MotorCooling cooling, double ambientCelsius) {
    public static final Range AMBIENT = new Range("motor ambient temperature", Dimension.TEMPERATURE, -50, 100);

    /** A fan on the shaft, 40 °C: what motors are rated for. */
    public static final MotorPlace RATED = new MotorPlace(MotorCooling.SHAFT_FAN, 40);

    /** Builds a place. */
    public MotorPlace {
        Objects.requireNonNull(cooling);
        AMBIENT.check(ambientCelsius);
    }
}
