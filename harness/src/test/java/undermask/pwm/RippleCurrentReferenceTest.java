package undermask.pwm;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.withinPercentage;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import undermask.drive.CarrierSampling;
import undermask.drive.Modulation;
import undermask.drive.OperatingPoint;

class RippleCurrentReferenceTest {
    private static final double INDUCTANCE = 10e-3;
    private static final int RATIO = 200;

    // Source: rms of the phase ripple, V_dc·T_s/(24·L)·√HDF with the distortion factor a·M² + b·M³ + c·M⁴; Hava,
    // Kerkman
    // and Lipo (1998, 1999), Holmes and Lipo (2003), from memory.
    @ParameterizedTest(name = "{0}, M = {1}")
    @CsvSource({
        "SINE_TRIANGLE, 0.5, 1.5, -2.205303, 1.125",
        "SINE_TRIANGLE, 0.9, 1.5, -2.205303, 1.125",
        "SPACE_VECTOR, 0.5, 1.5, -2.205303, 0.989724",
        "SPACE_VECTOR, 1.1, 1.5, -2.205303, 0.989724",
        "CLAMP_60, 0.9, 6, -9.367288, 3.840184",
    })
    void carrierRippleOfTheCurrent(Modulation scheme, double index, double a, double b, double c) {
        Bridge bridge = Bridge.switching(
                Bridges.settings(RATIO * Bridges.OUTPUT, scheme, CarrierSampling.TWICE, 0, index),
                new OperatingPoint(Bridges.OUTPUT, 8, 0.8),
                LinkVoltage.constant(Bridges.LINK),
                new OutputLoad(INDUCTANCE, 0));
        int samples = 400_003;
        double square = 0;
        for (int i = 0; i < samples; i++) {
            double time = i / (samples * Bridges.OUTPUT);
            double sine = Math.sqrt(2) * 8 * Math.cos(2 * Math.PI * Bridges.OUTPUT * time - Math.acos(0.8));
            square += Math.pow(bridge.current(0, time) - sine, 2) / samples;
        }
        double factor = a * index * index + b * Math.pow(index, 3) + c * Math.pow(index, 4);
        double expected = Bridges.LINK / (RATIO * Bridges.OUTPUT) / (24 * INDUCTANCE) * Math.sqrt(factor);
        assertThat(Math.sqrt(square)).isCloseTo(expected, withinPercentage(2));
    }
}
