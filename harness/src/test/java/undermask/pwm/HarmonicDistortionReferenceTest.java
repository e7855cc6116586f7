package undermask.pwm;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import undermask.drive.CarrierSampling;
import undermask.drive.Modulation;
import undermask.signal.EdgeTrain;

class HarmonicDistortionReferenceTest {
    private static final int RATIO = 300;

    // Source: Hava, Kerkman and Lipo, IEEE Trans. Ind. Appl. (1998, 1999), and Holmes and Lipo (2003), from memory: the
    // distortion factor of a scheme is a·M² + b·M³ + c·M⁴, and the mean square of the volt-seconds of the phase ripple
    // is
    // that times (V_dc·T_s)²/576.
    @ParameterizedTest(name = "{0}")
    @CsvSource({
        "SINE_TRIANGLE, 1.5, -2.205303, 1.125000, 1",
        "THIRD_HARMONIC_SIXTH, 1.5, -2.205303, 1.000000, 1.15",
        "THIRD_HARMONIC_QUARTER, 1.5, -2.205303, 0.984375, 1.12",
        "SPACE_VECTOR, 1.5, -2.205303, 0.989724, 1.15",
        "CLAMP_120_UPPER, 6, -9.648256, 4.072776, 1.15",
        "CLAMP_120_LOWER, 6, -9.648256, 4.072776, 1.15",
        "CLAMP_60_LEAD, 6, -9.648256, 4.072776, 1.15",
        "CLAMP_60_LAG, 6, -9.648256, 4.072776, 1.15",
        "CLAMP_60, 6, -9.367288, 3.840184, 1.15",
        "CLAMP_30, 6, -9.929223, 4.305368, 1.15"
    })
    void everySchemeHasItsPolynomial(Modulation scheme, double a, double b, double c, double highest) {
        for (double index : new double[] {0.3, 0.6, 0.9, highest}) {
            Bridge bridge = Bridges.without(scheme, CarrierSampling.TWICE, RATIO, index);
            EdgeTrain phase = EdgeTrain.sum(List.of(bridge.leg(0), bridge.commonMode()), 1, -1);
            double square = 0;
            double[] peaks = Bridges.peaks(phase, 60 * RATIO);
            for (int n = RATIO / 2; n < peaks.length; n++) {
                double voltSeconds = peaks[n] / (2 * Math.PI * n * Bridges.OUTPUT);
                square += voltSeconds * voltSeconds / 2;
            }
            double unit = Bridges.LINK / (RATIO * Bridges.OUTPUT);
            double factor = 576 * square / (unit * unit);
            double polynomial = a * index * index + b * Math.pow(index, 3) + c * Math.pow(index, 4);
            assertThat(factor).as("M = %s", index).isCloseTo(polynomial, withinPercentage(1));
        }
    }
}
