package undermask.receiver;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.SplittableRandom;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import undermask.signal.Lines;

class DetectorLawTest {
    private static final double ROUNDING = 1e-6;

    /**
     * Behind a burst of half a second the meter of the average has come closer to the burst's level than the meter of the
     * quasi-peak, whose capacitor lags: in band A by up to 0.031 dB, as stepping the laws through time shows as well.
     */
    private static final double LAG = 0.0046;

    /** V; silence reads 0 on the peak detector and not quite 0 on the others. */
    private static final double NOTHING = 1e-50;

    @ParameterizedTest(name = "window {0} s, share of lines {1}, seed {2}")
    @CsvSource({
        "1e-3, 1, 1",
        "1e-3, 0.1, 2",
        "5e-3, 0.3, 3",
        "0.02, 1, 4",
        "0.02, 0.02, 5",
        "0.02, 0.005, 6",
        "0.0213, 0.2, 7",
        "0.04, 0.002, 8"
    })
    void peakIsNotBelowQuasiPeakIsNotBelowAverage(double window, double share, long seed) {
        Trace trace = Receiver.of(ReceiverStandard.CISPR_16).scan(new SeededLines(1 / window, seed, share, 1));
        for (int step = 0; step < trace.size(); step++) {
            double peak = trace.levelDbuv(Detector.PEAK, step);
            double quasiPeak = trace.levelDbuv(Detector.QUASI_PEAK, step);
            double average = trace.levelDbuv(Detector.AVERAGE, step);
            assertThat(quasiPeak).as("at %s Hz", trace.frequency(step)).isLessThanOrEqualTo(peak + ROUNDING);
            assertThat(average).as("at %s Hz", trace.frequency(step)).isLessThanOrEqualTo(quasiPeak + ROUNDING);
        }
    }

    @ParameterizedTest(name = "{0}, window {1} s, seed {2}")
    @CsvSource({
        "CISPR_A, 0.5, 1",
        "CISPR_A, 3, 2",
        "CISPR_B, 0.3, 3",
        "CISPR_B, 0.5, 4",
        "CISPR_A, 1, 5",
        "CISPR_B, 0.1, 6"
    })
    void theOrderHoldsForEnvelopesInBursts(Band band, double period, long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        int samples = (int) Math.ceil(period / (0.6 * band.response().pulseSigma()));
        for (int trial = 0; trial < 25; trial++) {
            double[] envelope = new double[samples];
            double level = 0;
            double duty = random.nextDouble();
            double length = Math.pow(samples, random.nextDouble());
            for (int i = 0; i < samples; i++) {
                if (random.nextDouble() < 1 / length) {
                    level = random.nextDouble() < duty ? Math.pow(10, -2 * random.nextDouble()) : 0;
                }
                envelope[i] = level;
            }
            Reading reading = Detectors.of(band).read(envelope, period);
            assertThat(reading.quasiPeak()).isLessThanOrEqualTo(reading.peak() * (1 + ROUNDING) + NOTHING);
            double lag = band == Band.CISPR_A ? LAG : ROUNDING;
            assertThat(reading.average()).isLessThanOrEqualTo(reading.quasiPeak() * (1 + lag) + NOTHING);
        }
    }

    @ParameterizedTest(name = "{0} times")
    @CsvSource({"1e-3", "0.37", "2", "5e3"})
    void allLevelsShiftWithTheLines(double factor) {
        Receiver receiver = Receiver.of(ReceiverStandard.CISPR_16);
        Lines lines = new SeededLines(200, 11, 0.5, 1);
        Lines scaled = new SeededLines(200, 11, 0.5, factor);
        Trace before = receiver.scan(lines);
        Trace after = receiver.scan(scaled);
        for (Detector detector : Detector.values()) {
            for (int step = 0; step < before.size(); step++) {
                double level = before.levelDbuv(detector, step);
                if (level > Receiver.FLOOR_DBUV) {
                    double shifted = Math.max(Receiver.FLOOR_DBUV, level + 20 * Math.log10(factor));
                    assertThat(after.levelDbuv(detector, step)).isCloseTo(shifted, within(1e-9));
                }
            }
        }
    }
}
