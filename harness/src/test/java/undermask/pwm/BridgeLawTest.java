package undermask.pwm;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import undermask.drive.Carrier;
import undermask.drive.CarrierSampling;
import undermask.drive.DriveSettings;
import undermask.drive.EdgeForm;
import undermask.drive.Edges;
import undermask.drive.Modulation;
import undermask.drive.ModulationPlan;
import undermask.drive.OperatingPoint;
import undermask.drive.ReducedCarrier;
import undermask.drive.Spread;
import undermask.drive.Switching;
import undermask.drive.VoltageCurve;
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

    // Source: with an odd number of carrier periods the carrier is upside down half an output period later, and so is
    // the reference that clamps to the other rail.
    @ParameterizedTest
    @CsvSource({
        "SINE_TRIANGLE, SINE_TRIANGLE",
        "SPACE_VECTOR, SPACE_VECTOR",
        "CLAMP_60, CLAMP_60",
        "CLAMP_120_UPPER, CLAMP_120_LOWER"
    })
    void polarityTurnsWithHalfAPeriod(Modulation scheme, Modulation mirrored) {
        EdgeTrain leg = Bridges.without(scheme, CarrierSampling.TWICE, 63, 0.8).leg(0);
        EdgeTrain turned =
                Bridges.without(mirrored, CarrierSampling.TWICE, 63, 0.8).leg(0);
        assertThat(turned.size()).isEqualTo(leg.size());
        for (int e = 0; e < leg.size(); e++) {
            double shifted = (leg.time(e) + leg.period() / 2) % leg.period();
            assertThat(nearest(turned, shifted)).isCloseTo(0, within(1e-12));
        }
    }

    // Source: Kirchhoff; the three line-to-line voltages add up to nothing, line by line.
    @ParameterizedTest
    @EnumSource(Modulation.class)
    void lineToLineVoltagesAddUpToNothing(Modulation modulation) {
        Bridge bridge = Bridges.without(modulation, CarrierSampling.TWICE, 80, 0.9);
        List<EdgeTrain> legs = List.of(bridge.leg(0), bridge.leg(1), bridge.leg(2));
        double[] re = new double[2000];
        double[] im = new double[2000];
        double[] sumRe = new double[2000];
        double[] sumIm = new double[2000];
        for (int k = 0; k < 3; k++) {
            EdgeTrain.sum(List.of(legs.get(k), legs.get((k + 1) % 3)), 1, -1)
                    .lines()
                    .read(1, 2000, re, im);
            for (int i = 0; i < 2000; i++) {
                sumRe[i] += re[i];
                sumIm[i] += im[i];
            }
        }
        for (int i = 0; i < 2000; i++) {
            assertThat(Math.hypot(sumRe[i], sumIm[i])).isLessThan(1e-8);
        }
    }

    // Source: common practice; a carrier that is a multiple of the output leaves no lines between the output's
    // multiples.
    @Test
    void aSynchronousCarrierRepeatsWithTheOutput() {
        DriveSettings settings = new DriveSettings(
                new Carrier(
                        OptionalDouble.empty(),
                        OptionalInt.of(27),
                        Optional.empty(),
                        CarrierSampling.TWICE,
                        Spread.NONE),
                ModulationPlan.of(Modulation.SPACE_VECTOR),
                Switching.of(0),
                Edges.of(5e9, 5e9, EdgeForm.EXPONENTIAL),
                new VoltageCurve(300, 50, 0),
                OptionalDouble.of(Bridges.LINK));
        for (double output : new double[] {37.3, 91}) {
            AnalysisWindow window = Bridges.switched(settings, new OperatingPoint(output, 5, 0.8))
                    .window();
            assertThat(window.fundamentalPeriods()).isOne();
            assertThat(window.carrierPeriods()).isEqualTo(27);
        }
    }

    @ParameterizedTest(name = "{0} A at {1} Hz: {2} Hz")
    @CsvSource({"5, 50, 8000", "12, 50, 4000", "5, 4, 4000", "10, 10, 8000"})
    void theCarrierFallsBackWithLoadOrAtLowFrequency(double amperes, double output, double expected) {
        Carrier carrier = new Carrier(
                OptionalDouble.of(8000),
                OptionalInt.empty(),
                Optional.of(new ReducedCarrier(4000, OptionalDouble.of(10), OptionalDouble.of(10))),
                CarrierSampling.TWICE,
                Spread.NONE);
        assertThat(carrier.hzAt(new OperatingPoint(output, amperes, 0.8))).isEqualTo(expected);
    }

    @Test
    void carrierRippleDecidesAboutEdgesNearZeroCurrent() {
        DriveSettings settings = Bridges.settings(4000, Modulation.SPACE_VECTOR, CarrierSampling.TWICE, 2e-6, 0.8);
        OperatingPoint point = new OperatingPoint(Bridges.OUTPUT, 0.5, 0.3);
        LinkVoltage link = LinkVoltage.constant(Bridges.LINK);
        Bridge smooth = Bridge.switching(settings, point, link, OutputLoad.IDEAL);
        Bridge rippling = Bridge.switching(settings, point, link, new OutputLoad(5e-3, 0));
        // at half an ampere a ripple of volts times microseconds over 5 mH turns the current at every edge: what the
        // dead time takes from rising edges it takes from falling ones, too
        double lost = Math.abs(Bridges.peaks(smooth.leg(0), 1)[1] - 0.8 * Bridges.LINK / 2);
        double rest = Math.abs(Bridges.peaks(rippling.leg(0), 1)[1] - 0.8 * Bridges.LINK / 2);
        assertThat(rest).isLessThan(0.5 * lost);
        // Source: largest ripple of three legs switching together, V_dc·T/(8·L)-like bounds; common practice
        double highest = 0;
        for (int i = 0; i < 20_000; i++) {
            double time = i * 1e-6;
            highest = Math.max(highest, Math.abs(rippling.current(0, time) - smooth.current(0, time)));
        }
        assertThat(highest).isBetween(0.5, Bridges.LINK / (8 * 5e-3 * 4000));
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
