package undermask.receiver;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import undermask.signal.Lines;

class ReceiverTest {
    private static final Lines SILENCE = new FewLines(1000, Map.of());

    @Test
    void cisprStepsHalfABandwidth() {
        Trace trace = Receiver.of(ReceiverStandard.CISPR_16).scan(SILENCE);
        assertThat(trace.size()).isEqualTo(1410 + 6634);
        assertThat(trace.frequency(0)).isEqualTo(9e3);
        assertThat(trace.frequency(1409)).isEqualTo(149.9e3);
        assertThat(trace.frequency(1410)).isEqualTo(150e3);
        assertThat(trace.frequency(trace.size() - 1)).isEqualTo(29.9985e6);
    }

    @Test
    void militaryStepsHalfABandwidthAndShowNoQuasiPeak() {
        Trace trace = Receiver.of(ReceiverStandard.MIL_STD_461).scan(SILENCE);
        assertThat(trace.size()).isEqualTo(280 + 5971);
        assertThat(trace.frequency(0)).isEqualTo(10e3);
        assertThat(trace.frequency(280)).isEqualTo(150e3);
        assertThat(trace.frequency(trace.size() - 1)).isEqualTo(30e6);
        for (int step = 0; step < trace.size(); step++) {
            assertThat(trace.levelDbuv(Detector.QUASI_PEAK, step)).isNaN();
            assertThat(trace.levelDbuv(Detector.PEAK, step)).isEqualTo(Receiver.FLOOR_DBUV);
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {1e-3, 7.7e-3, 0.02})
    void stepsDoNotDependOnTheWindow(double window) {
        Trace silence = Receiver.of(ReceiverStandard.CISPR_16).scan(SILENCE);
        Trace trace = Receiver.of(ReceiverStandard.CISPR_16).scan(new SeededLines(1 / window, 1, 0.1, 1));
        assertThat(trace.envelopeWith(silence).size()).isEqualTo(silence.size());
    }

    @Test
    void silenceReadsTheFloorOnAllDetectors() {
        Trace trace = Receiver.of(ReceiverStandard.CISPR_16).scan(SILENCE);
        for (Detector detector : Detector.values()) {
            for (int step = 0; step < trace.size(); step++) {
                assertThat(trace.levelDbuv(detector, step)).isEqualTo(Receiver.FLOOR_DBUV);
            }
        }
    }

    @Test
    void aSineShowsWithinReachOfTheFilterAndNowhereElse() {
        Trace trace = Receiver.of(ReceiverStandard.CISPR_16).scan(new FewLines(50, Map.of(20_000, 1.0)));
        for (int step = 0; step < trace.size(); step++) {
            double distance = Math.abs(trace.frequency(step) - 1e6);
            double level = trace.levelDbuv(Detector.AVERAGE, step);
            if (distance < 14e3) {
                assertThat(level).isGreaterThan(117 - 60);
            } else if (distance > 14.5e3) {
                assertThat(level).isEqualTo(Receiver.FLOOR_DBUV);
            }
        }
    }

    @Test
    void scanAndSingleReadingAgree() {
        Receiver receiver = Receiver.of(ReceiverStandard.CISPR_16);
        Lines lines = new SeededLines(1 / 0.0123, 5, 0.3, 1);
        Trace trace = receiver.scan(lines);
        for (int step : new int[] {0, 1, 700, 1409, 1410, 1411, 4000, trace.size() - 1}) {
            Reading reading = receiver.at(trace.frequency(step), lines);
            assertThat(trace.levelDbuv(Detector.PEAK, step))
                    .isCloseTo(Receiver.levelDbuv(reading.peak()), within(1e-9));
            assertThat(trace.levelDbuv(Detector.QUASI_PEAK, step))
                    .isCloseTo(Receiver.levelDbuv(reading.quasiPeak()), within(1e-9));
            assertThat(trace.levelDbuv(Detector.AVERAGE, step))
                    .isCloseTo(Receiver.levelDbuv(reading.average()), within(1e-9));
        }
    }

    @Test
    void readsEachLineOncePerBandAndNoneBelowTheFirst() {
        List<int[]> reads = new ArrayList<>();
        Lines lines = new Lines() {
            @Override
            public double spacing() {
                return 3000;
            }

            @Override
            public void read(int first, int count, double[] re, double[] im) {
                reads.add(new int[] {first, count});
            }
        };
        Receiver.of(ReceiverStandard.CISPR_16).scan(lines);
        assertThat(reads).hasSize(2);
        assertThat(reads.get(0)).containsExactly(2, 50);
        assertThat(reads.get(1)[0]).isEqualTo(45);
        assertThat(reads.get(1)[0] + reads.get(1)[1] - 1).isEqualTo(10_005);
    }

    @Test
    void bandBReadsTheCommonBoundary() {
        FewLines near = new FewLines(50, Map.of(3000 + 60, 1.0));
        double level = Receiver.levelDbuv(
                Receiver.of(ReceiverStandard.CISPR_16).at(150e3, near).peak());
        assertThat(level).isGreaterThan(110);
    }

    @Test
    void refusesAFrequencyOutsideItsBands() {
        assertThatThrownBy(() -> Receiver.of(ReceiverStandard.MIL_STD_461).at(9e3, SILENCE))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("9000");
    }

    @Test
    void detectorsRefuseWhatIsNoEnvelope() {
        Detectors detectors = Detectors.of(Band.CISPR_B);
        assertThatThrownBy(() -> detectors.read(new double[0], 1)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> detectors.read(new double[] {1, -1}, 1)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> detectors.read(new double[] {1, Double.NaN}, 1))
                .isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> detectors.read(new double[] {1}, 0)).isInstanceOf(IllegalArgumentException.class);
    }
}
