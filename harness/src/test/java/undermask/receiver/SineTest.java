package undermask.receiver;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import undermask.unit.Decibels;

class SineTest {
    private static final Receiver RECEIVER = Receiver.of(ReceiverStandard.CISPR_16);

    @ParameterizedTest(name = "line {1} of window {0} s, tuned {2} Hz beside it")
    @CsvSource({
        "0.001, 1000, 0", "0.001, 1000, 400", "0.02, 20000, 0", "0.02, 20000, 4500", "0.02, 20000, -17.3",
        "0.02, 1000, 60", "0.02, 1000, 0", "0.3, 30000, 13.37", "2, 200001, 0", "2, 2000001, 2222.2"
    })
    void readsTheSameOnAllDetectors(double window, int line, double offset) {
        double amplitude = 1e-3;
        double frequency = line / window + offset;
        Reading reading = RECEIVER.at(frequency, new FewLines(1 / window, Map.of(line, amplitude)));
        GaussianResponse response = (frequency < 150e3 ? Band.CISPR_A : Band.CISPR_B).response();
        double expected = Receiver.levelDbuv(amplitude / Math.sqrt(2) * response.at(offset));
        assertThat(Receiver.levelDbuv(reading.peak())).isCloseTo(expected, within(1e-3));
        assertThat(Receiver.levelDbuv(reading.average())).isCloseTo(expected, within(1e-3));
        assertThat(Receiver.levelDbuv(reading.quasiPeak())).isCloseTo(expected, within(1e-3));
    }

    @ParameterizedTest
    @CsvSource({"CISPR_16, 80e3, 200", "CISPR_16, 5e6, 9e3", "MIL_STD_461, 80e3, 1e3", "MIL_STD_461, 5e6, 10e3"})
    void halfTheBandwidthAwayItReadsSixDecibelsLess(ReceiverStandard standard, double frequency, double bandwidth) {
        FewLines sine = new FewLines(50, Map.of((int) Math.round(frequency / 50), 1.0));
        Receiver receiver = Receiver.of(standard);
        double centre = receiver.at(frequency, sine).peak();
        for (double side : new double[] {-1, 1}) {
            double edge = receiver.at(frequency + side * bandwidth / 2, sine).peak();
            assertThat(Decibels.ofRatio(edge / centre)).isCloseTo(Decibels.ofRatio(0.5), within(1e-6));
        }
    }

    @Test
    void twoHalvesOfAMillivoltReadSixtyDbuv() {
        double peak = 1e-3 * Math.sqrt(2);
        assertThat(Receiver.levelDbuv(RECEIVER.at(1e6, new FewLines(100, Map.of(10_000, peak)))
                        .quasiPeak()))
                .isCloseTo(60, within(1e-3));
    }
}
