package undermask.receiver;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import org.hipparchus.special.elliptic.legendre.LegendreEllipticIntegral;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import undermask.signal.Lines;
import undermask.unit.Decibels;

/** The envelope and its peak and mean against closed forms and against direct summation on a fine grid. */
class EnvelopeCrossTest {
    /** dB; the parabola through the top is exact for pulses and sines, for a beat it runs 0.02 dB high. */
    private static final double PARABOLA = 0.025;

    private static final Receiver RECEIVER = Receiver.of(ReceiverStandard.CISPR_16);

    // Source: the envelope of two sines a and b is |a + b·exp(jωt)|; its mean is (2/π)·(a + b)·E(m), m = 4ab/(a + b)².
    @ParameterizedTest(name = "{0} and {1} lines of {3} Hz away, second line {2} times the first")
    @CsvSource({
        "-20, 60, 1, 50",
        "-20, 60, 0.3, 50",
        "-100, 100, 0.999, 50",
        "-41, 80, 0.9, 50",
        "0, 97, 1, 50",
        "-1, 1, 0.999, 200",
        "-3, 10, 0.5, 500"
    })
    void twoSinesBeat(int firstLine, int secondLine, double ratio, double spacing) {
        double frequency = 2e6;
        int centre = (int) (frequency / spacing);
        Lines lines = new FewLines(spacing, Map.of(centre + firstLine, 1.0, centre + secondLine, ratio));
        GaussianResponse response = Band.CISPR_B.response();
        double a = response.at(firstLine * spacing) / Math.sqrt(2);
        double b = ratio * response.at(secondLine * spacing) / Math.sqrt(2);
        Reading reading = RECEIVER.at(frequency, lines);
        assertThat(Decibels.ofRatio(reading.peak() / (a + b))).isCloseTo(0, within(PARABOLA));
        double mean = 2 / Math.PI * (a + b) * LegendreEllipticIntegral.bigE(4 * a * b / ((a + b) * (a + b)));
        assertThat(Decibels.ofRatio(reading.average() / mean)).isCloseTo(0, within(0.05));
    }

    @ParameterizedTest(name = "window {0} s, share of lines {1}, seed {2}")
    @CsvSource({
        "0.001, 1, 1",
        "0.003, 1, 2",
        "0.013, 1, 3",
        "0.013, 0.01, 4",
        "0.02, 1, 5",
        "0.02, 0.1, 6",
        "0.02, 0.01, 7",
        "0.017, 0.02, 8"
    })
    void peakAndMeanAgreeWithDirectSummation(double window, double share, long seed) {
        Lines lines = new SeededLines(1 / window, seed, share, 1);
        for (int i = 0; i < 6; i++) {
            double frequency = 150e3 + 12_345.6 + i * 234_567.8;
            double[] envelope = summed(lines, frequency, 3000);
            double highest = 0;
            double mean = 0;
            for (double amplitude : envelope) {
                highest = Math.max(highest, amplitude);
                mean += amplitude / envelope.length;
            }
            Reading reading = RECEIVER.at(frequency, lines);
            assertThat(Decibels.ofRatio(reading.peak() / highest)).isCloseTo(0, within(0.05));
            assertThat(Decibels.ofRatio(reading.average() / mean)).isCloseTo(0, within(0.03));
        }
    }

    private static double[] summed(Lines lines, double frequency, int samples) {
        GaussianResponse response = Band.CISPR_B.response();
        int lowest = (int) Math.max(1, Math.ceil((frequency - 4.5 * response.sigma()) / lines.spacing()));
        int count = (int) Math.floor((frequency + 4.5 * response.sigma()) / lines.spacing()) - lowest + 1;
        double[] re = new double[count];
        double[] im = new double[count];
        lines.read(lowest, count, re, im);
        double[] cos = new double[samples];
        for (int n = 0; n < samples; n++) {
            cos[n] = Math.cos(2 * Math.PI * n / samples);
        }
        for (int k = 0; k < count; k++) {
            double weight = Math.sqrt(2) * response.at((lowest + k) * lines.spacing() - frequency);
            re[k] *= weight;
            im[k] *= weight;
        }
        double[] envelope = new double[samples];
        for (int n = 0; n < samples; n++) {
            double sumRe = 0;
            double sumIm = 0;
            for (int k = 0; k < count; k++) {
                double c = cos[k * n % samples];
                double s = cos[(k * n + 3 * samples / 4) % samples];
                sumRe += re[k] * c - im[k] * s;
                sumIm += re[k] * s + im[k] * c;
            }
            envelope[n] = Math.hypot(sumRe, sumIm);
        }
        return envelope;
    }

    // Source: an impulse leaves the envelope √2·area·impulse bandwidth, wherever it falls between two samples.
    @ParameterizedTest(name = "pulse {0} of a window late")
    @CsvSource({"0", "0.000244", "0.00031", "0.00049", "0.31415"})
    void peakOfAPulseDoesNotDependOnWhereItFalls(double late) {
        Lines centred = new PulseTrain(1e-6, 50, 1);
        Lines shifted = centred.through((spacing, first, count, re, im) -> {
            for (int i = 0; i < count; i++) {
                double angle = -2 * Math.PI * ((first + i) * late % 1);
                double real = re[i];
                re[i] = real * Math.cos(angle) - im[i] * Math.sin(angle);
                im[i] = real * Math.sin(angle) + im[i] * Math.cos(angle);
            }
        });
        double expected = Math.sqrt(2) * 1e-6 * Band.CISPR_B.response().impulseBandwidth();
        assertThat(Decibels.ofRatio(RECEIVER.at(1e6, shifted).peak() / expected))
                .isCloseTo(0, within(0.01));
    }
}
