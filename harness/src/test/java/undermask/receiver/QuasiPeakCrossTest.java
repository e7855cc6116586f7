package undermask.receiver;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.function.DoubleUnaryOperator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import undermask.unit.Decibels;

/** The detectors against the same laws stepped through time in small steps, with the library's arccos. */
class QuasiPeakCrossTest {
    private static final double METER = 160e-3;

    @ParameterizedTest(name = "{0}: {2} pulses in {1} s, floor {3}")
    @CsvSource({
        "CISPR_B, 0.001, 1, 0",
        "CISPR_B, 0.01, 1, 0",
        "CISPR_B, 0.02, 7, 0.1",
        "CISPR_B, 0.05, 1, 0.02",
        "CISPR_B, 0.5, 1, 0",
        "CISPR_B, 0.25, 12, 0.03",
        "CISPR_A, 0.04, 1, 0",
        "CISPR_A, 0.2, 3, 0.1",
        "CISPR_A, 1, 1, 0"
    })
    void pulses(Band band, double period, int pulses, double floor) {
        double sigma = band.response().pulseSigma();
        // pulses of unlike height, one of them early: the ripple has every order
        DoubleUnaryOperator envelope = t -> {
            double sum = floor;
            for (int k = -1; k <= pulses; k++) {
                int pulse = Math.floorMod(k, pulses);
                double centre = (k + 0.5 + (pulse == 1 ? -0.3 : 0)) * period / pulses;
                double distance = (t - centre) / sigma;
                sum += (1 + 0.5 * (pulse % 3)) * Math.exp(-distance * distance / 2);
            }
            return sum;
        };
        agree(band, period, envelope, sigma);
    }

    @ParameterizedTest(name = "{0}: depth {2} over {1} s")
    @CsvSource({"CISPR_B, 0.02, 0.9", "CISPR_B, 0.3, 0.99", "CISPR_A, 0.1, 0.9", "CISPR_A, 1.5, 0.99"})
    void slowModulation(Band band, double period, double depth) {
        agree(
                band,
                period,
                t -> 1 + depth * Math.cos(2 * Math.PI * t / period + 0.7),
                band.response().pulseSigma());
    }

    private static void agree(Band band, double period, DoubleUnaryOperator envelope, double sigma) {
        int samples = (int) Math.ceil(period / (0.3 * sigma));
        double[] sampled = new double[samples];
        for (int n = 0; n < samples; n++) {
            sampled[n] = envelope.applyAsDouble(n * period / samples);
        }
        Reading reading = Detectors.of(band).read(sampled, period);
        double[] stepped = stepped(band.quasiPeak().orElseThrow(), period, envelope, 10 * samples);
        assertThat(Decibels.ofRatio(reading.quasiPeak() / stepped[0])).isCloseTo(0, within(0.03));
        assertThat(Decibels.ofRatio(reading.average() / stepped[1])).isCloseTo(0, within(0.01));
    }

    /** Highest deflection of the meter behind the quasi-peak detector and behind the average detector. */
    private static double[] stepped(QuasiPeakDetector law, double period, DoubleUnaryOperator envelope, int steps) {
        double[] amplitude = new double[steps];
        for (int n = 0; n < steps; n++) {
            amplitude[n] = envelope.applyAsDouble((n + 0.5) * period / steps);
        }
        double step = period / steps;
        double conduction = Math.PI * law.chargingConstant();
        double v = 0;
        double[] inner = new double[2];
        double[] outer = new double[2];
        double[] highest = new double[2];
        // after five seconds the slowest time constant, 500 ms, has left 0.005 %
        int periods = (int) Math.ceil(5 / period) + 1;
        for (int turn = 0; turn < periods; turn++) {
            for (int n = 0; n < steps; n++) {
                double middle = v + step / 2 * slope(law, v, amplitude[n], conduction);
                v += step * slope(law, middle, amplitude[n], conduction);
                for (int i = 0; i < 2; i++) {
                    double input = i == 0 ? v / law.sineGain() : amplitude[n];
                    double before = inner[i];
                    inner[i] += step / METER * (input - before);
                    outer[i] += step / METER * ((before + inner[i]) / 2 - outer[i]);
                    if (turn == periods - 1) {
                        highest[i] = Math.max(highest[i], outer[i]);
                    }
                }
            }
        }
        return highest;
    }

    private static double slope(QuasiPeakDetector law, double v, double amplitude, double conduction) {
        double ratio = v >= amplitude ? 1 : v / amplitude;
        double charged = amplitude * (Math.sqrt(1 - ratio * ratio) - ratio * Math.acos(ratio));
        return charged / conduction - v / law.dischargeTime();
    }

    // Source: the definition of the charge time constant; the law solved by small steps in time.
    @ParameterizedTest
    @EnumSource(names = {"CISPR_A", "CISPR_B"})
    void aSuddenSineReachesSixtyThreePercentAfterTheChargeConstant(Band band) {
        QuasiPeakDetector law = band.quasiPeak().orElseThrow();
        double chargeTime = band == Band.CISPR_A ? 45e-3 : 1e-3;
        double v = 0;
        int steps = 20_000;
        double step = chargeTime / steps;
        double conduction = Math.PI * law.chargingConstant();
        for (int n = 0; n < steps; n++) {
            double middle = v + step / 2 * slope(law, v, 1, conduction);
            v += step * slope(law, middle, 1, conduction);
        }
        assertThat(v / law.sineGain()).isCloseTo(1 - Math.exp(-1), within(1e-5));
    }

    // Source: computed beforehand from the same definition, S·C = τ_c/2.97 in band A and τ_c/3.94 in band B.
    @Test
    void chargingConstants() {
        assertThat(45e-3 / Band.CISPR_A.quasiPeak().orElseThrow().chargingConstant())
                .isCloseTo(2.97, within(0.01));
        assertThat(1e-3 / Band.CISPR_B.quasiPeak().orElseThrow().chargingConstant())
                .isCloseTo(3.94, within(0.01));
    }
}
