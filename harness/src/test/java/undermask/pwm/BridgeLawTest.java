package undermask.pwm;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import undermask.drive.CarrierSampling;
import undermask.drive.Modulation;
import undermask.drive.OperatingPoint;
import undermask.signal.EdgeTrain;

class BridgeLawTest {
    // Source: linear limits 1 and 2/√3, Holmes and Lipo (2003), from memory.
    @ParameterizedTest(name = "{0} up to {1}")
    @CsvSource({"SINE_TRIANGLE, 1", "SPACE_VECTOR, 1.1547005"})
    void givesTheFundamentalAskedForUpToTheLinearLimit(Modulation modulation, double limit) {
        for (double share : new double[] {0.2, 0.5, 0.95, 1}) {
            Bridge bridge = Bridges.without(modulation, CarrierSampling.NATURAL, 201, share * limit);
            assertThat(bridge.overmodulated()).isFalse();
            assertThat(Bridges.peaks(bridge.leg(0), 1)[1])
                    .isCloseTo(share * limit * Bridges.LINK / 2, within(1e-4 * Bridges.LINK));
        }
        assertThat(Bridges.without(modulation, CarrierSampling.NATURAL, 201, 1.001 * limit)
                        .overmodulated())
                .isTrue();
    }

    @ParameterizedTest
    @EnumSource(Modulation.class)
    void lineToLineHasNoTriplenBaseband(Modulation modulation) {
        Bridge bridge = Bridges.without(modulation, CarrierSampling.NATURAL, 201, 0.9);
        double[] peaks = Bridges.peaks(bridge.lineToLine(), 30);
        for (int n = 3; n <= 30; n += 3) {
            assertThat(peaks[n]).as("line %d", n).isLessThan(1e-9 * Bridges.LINK);
        }
    }

    // Source: the three references differ by a third of a period each; with a ratio divisible by three so do the legs.
    @ParameterizedTest
    @EnumSource(Modulation.class)
    void legsFollowEachOtherByAThirdOfAPeriod(Modulation modulation) {
        Bridge bridge = Bridges.without(modulation, CarrierSampling.TWICE, 60, 0.7);
        for (int k = 1; k < 3; k++) {
            EdgeTrain first = bridge.leg(0);
            EdgeTrain leg = bridge.leg(k);
            assertThat(leg.size()).isEqualTo(first.size());
            for (int e = 0; e < leg.size(); e++) {
                double shifted = (first.time(e) + k * first.period() / 3) % first.period();
                assertThat(nearest(leg, shifted)).isCloseTo(0, within(1e-12));
            }
        }
    }

    private static double nearest(EdgeTrain train, double time) {
        double best = Double.MAX_VALUE;
        for (int e = 0; e < train.size(); e++) {
            double apart = Math.abs(train.time(e) - time);
            best = Math.min(best, Math.min(apart, train.period() - apart));
        }
        return best;
    }

    @Test
    void legsStayBetweenTheRails() {
        for (double index : new double[] {0.15, 0.6, 1.1, 1.27}) {
            for (CarrierSampling sampling : CarrierSampling.values()) {
                Bridge bridge = Bridges.switched(
                        Bridges.settings(4000, Modulation.SPACE_VECTOR, sampling, 3e-6, index),
                        new OperatingPoint(Bridges.OUTPUT, 4, 0.4));
                for (int k = 0; k < 3; k++) {
                    EdgeTrain leg = bridge.leg(k);
                    double level = leg.initialLevel();
                    for (int e = 0; e < leg.size(); e++) {
                        assertThat(Math.abs(level)).isCloseTo(Bridges.LINK / 2, within(1e-9));
                        level += leg.step(e);
                    }
                    assertThat(level).isCloseTo(leg.initialLevel(), within(1e-6));
                }
            }
        }
    }

    @ParameterizedTest(name = "{0} Hz carrier at {1} Hz output")
    @CsvSource({"4000, 50", "4000, 47", "8000, 33.3", "2000, 7"})
    void windowHoldsWholePeriodsAndNudgesLittle(double carrier, double output) {
        AnalysisWindow window = AnalysisWindow.of(carrier, output, 0);
        assertThat(Math.abs(window.nudgePpm())).isLessThanOrEqualTo(100);
        assertThat(window.carrierHz() * window.seconds()).isCloseTo(window.carrierPeriods(), within(1e-6));
        assertThat(window.seconds() * output).isCloseTo(window.fundamentalPeriods(), within(1e-9));
        assertThat(1e6 * (window.carrierHz() / carrier - 1)).isCloseTo(window.nudgePpm(), within(1e-6));
        for (int shorter = 1; shorter < window.fundamentalPeriods(); shorter++) {
            double ratio = shorter * carrier / output;
            assertThat(Math.abs(Math.rint(ratio) / ratio - 1)).isGreaterThan(1e-4);
        }
    }

    @Test
    void refusesWhatNoBridgeCanDo() {
        assertThatThrownBy(() -> AnalysisWindow.refuseSlowCarrier(4000, 700))
                .hasMessageContaining("below six times the output frequency");
        assertThatThrownBy(() -> Bridges.without(Modulation.SPACE_VECTOR, CarrierSampling.TWICE, 80, 1.3))
                .hasMessageContaining("six-step");
    }
}
