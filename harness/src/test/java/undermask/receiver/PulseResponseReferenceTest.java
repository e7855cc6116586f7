package undermask.receiver;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.junit.jupiter.params.provider.CsvSource;
import undermask.unit.Decibels;

class PulseResponseReferenceTest {
    private static final double AREA = 0.158e-6;

    /** Long enough that even the discharge of band A, 500 ms, leaves nothing of the pulse before. */
    private static final double ISOLATED_RATE = 0.1;

    private static final Receiver RECEIVER = Receiver.of(ReceiverStandard.CISPR_16);

    // Source: the header of the data file, from memory. Half of the standard's tolerance, so that no more than half of
    // it
    // is used up before a real receiver comes into it; 80 % in band B at 1 and 2 Hz, where the standard's own table
    // does
    // not follow from its constants: the law gives 0.7 and 1.0 dB more. The relations of the detectors carry no
    // tolerance in the table; 1 dB is two thirds of what the standard allows for the amplitude relation, 1.5 dB.
    @ParameterizedTest(name = "{4} in band {0} at {1} Hz")
    @CsvFileSource(
            resources = "/undermask/receiver/pulse_response.csv",
            useHeadersInDisplayName = false,
            numLinesToSkip = 5)
    void followsTheTable(String band, String rate, double relative, String tolerance, String relation) {
        double hz = rate.equals("isolated") ? ISOLATED_RATE : Double.parseDouble(rate);
        Reading reading = read(band, hz);
        if (relation.equals("QP")) {
            double reference = read(band, band.equals("A") ? 25 : 100).quasiPeak();
            boolean slow = band.equals("B") && (hz == 1 || hz == 2);
            double allowed = tolerance.equals("reference") ? 1e-9 : Double.parseDouble(tolerance) * (slow ? 0.8 : 0.5);
            assertThat(Decibels.ofRatio(reference / reading.quasiPeak())).isCloseTo(relative, within(allowed));
        } else {
            double difference = switch (relation) {
                case "peak minus QP" -> Decibels.ofRatio(reading.peak() / reading.quasiPeak());
                case "QP minus average" -> Decibels.ofRatio(reading.quasiPeak() / reading.average());
                case "peak minus average" -> Decibels.ofRatio(reading.peak() / reading.average());
                default -> throw new IllegalArgumentException(relation);
            };
            assertThat(difference).isCloseTo(relative, within(1.0));
        }
    }

    // Source: pulse theory, 20·log10(impulse bandwidth / rate); the table's 9432 Hz are 1.048 · 9 kHz of two critically
    // coupled stages. A Gaussian of the same 6 dB bandwidth has 1.064, which is 0.135 dB more. The meter's own ripple
    // lowers the difference by 0.01 dB at 50 Hz.
    @ParameterizedTest
    @CsvSource({"50", "100", "200", "500", "1000"})
    void peakStandsAboveAverageByTheImpulseBandwidth(double rate) {
        Reading reading = read("B", rate);
        double difference = Decibels.ofRatio(reading.peak() / reading.average());
        assertThat(difference).isCloseTo(Decibels.ofRatio(9432 / rate), within(0.16));
        assertThat(difference).isCloseTo(Decibels.ofRatio(1.0645 * 9000 / rate), within(0.025));
    }

    // Source: theory; lines further apart than the bandwidth are read one by one, as sines.
    @ParameterizedTest
    @CsvSource({"20000", "40000"})
    void resolvedLinesReadEqualOnAllDetectors(double rate) {
        Reading reading = read("B", rate);
        assertThat(Decibels.ofRatio(reading.peak() / reading.average())).isCloseTo(0, within(0.05));
        assertThat(Decibels.ofRatio(reading.quasiPeak() / reading.average())).isCloseTo(0, within(0.05));
    }

    // Source: CISPR 16-1-1 clause 4.4.1, from memory: pulses of 13.5 µVs (band A, 25 Hz) and 0.316 µVs (band B, 100 Hz)
    // e.m.f. read like a sine of 2 mV e.m.f.; half of either falls across the matched input. The standard allows 1.5
    // dB.
    @ParameterizedTest
    @CsvSource({"A, 13.5e-6, 25, 1.0", "B, 0.316e-6, 100, 0.5"})
    void standardPulseReadsSixtyDbuvQuasiPeak(String band, double areaEmf, double rate, double toleranceDb) {
        double level = Receiver.levelDbuv(RECEIVER.at(frequency(band), new PulseTrain(areaEmf / 2, rate, 1))
                .quasiPeak());
        assertThat(level).isCloseTo(60, within(toleranceDb));
    }

    // Source: CISPR 16-1-1 average clause, from memory: 1.4/n mVs e.m.f. at n pulses a second, n = 25 in band A and 500
    // in band B, read like a sine of 2 mV e.m.f.; tolerance +2.5/−0.5 dB. The closed form is 59.91 dBµV.
    @ParameterizedTest
    @CsvSource({"A, 25", "B, 500"})
    void averageCalibrationReadsSixtyDbuv(String band, double rate) {
        PulseTrain pulses = new PulseTrain(1.4e-3 / rate / 2, rate, 1);
        double level = Receiver.levelDbuv(RECEIVER.at(frequency(band), pulses).average());
        assertThat(level).isCloseTo(60, within(0.15));
    }

    private static Reading read(String band, double rate) {
        return RECEIVER.at(frequency(band), new PulseTrain(AREA, rate, 1));
    }

    private static double frequency(String band) {
        return band.equals("A") ? 80e3 : 1e6;
    }
}
