package undermask.pwm;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Optional;
import java.util.OptionalDouble;
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
import undermask.drive.Overmodulation;
import undermask.drive.Switching;
import undermask.drive.VoltageCurve;

class OvermodulationReferenceTest {
    // Source: linear limits, theory: 1, 2/√3 and, where the third harmonic is a quarter, 1.122263.
    @ParameterizedTest(name = "{0}")
    @CsvSource({
        "SINE_TRIANGLE, 1",
        "THIRD_HARMONIC_SIXTH, 1.154701",
        "THIRD_HARMONIC_QUARTER, 1.122263",
        "SPACE_VECTOR, 1.154701",
        "CLAMP_60, 1.154701",
        "CLAMP_60_LEAD, 1.154701",
        "CLAMP_60_LAG, 1.154701",
        "CLAMP_30, 1.154701",
        "CLAMP_120_UPPER, 1.154701",
        "CLAMP_120_LOWER, 1.154701"
    })
    void linearRangeEndsWhereTheoryHasIt(Modulation scheme, double limit) {
        assertThat(Reference.linearLimit(scheme)).isCloseTo(limit, within(0.6e-6));
        Reference inside = Reference.of(scheme, Overmodulation.COMPENSATED, limit - 1e-6);
        assertThat(inside.clipped()).isFalse();
        double highest = 0;
        for (int i = 0; i < 36_000; i++) {
            // what is not clipped still adds up to the sines asked for
            double angle = 2 * Math.PI * i / 36_000;
            double difference = inside.at(angle, 0) - inside.at(angle, 1);
            double asked = inside.gain() * (Math.cos(angle) - Math.cos(angle - 2 * Math.PI / 3));
            assertThat(difference).isCloseTo(asked, within(1e-12));
            highest = Math.max(highest, Math.abs(inside.at(angle, 0)));
        }
        assertThat(highest).isCloseTo(1, within(2e-5));
        assertThat(Reference.of(scheme, Overmodulation.COMPENSATED, limit + 1e-5)
                        .clipped())
                .isTrue();
    }

    // Source: six-step, 4/π; theory.
    @ParameterizedTest
    @EnumSource(Modulation.class)
    void sixStepGivesFourOverPi(Modulation scheme) {
        Bridge bridge = Bridges.without(scheme, CarrierSampling.TWICE, 80, 4 / Math.PI);
        double[] peaks = Bridges.peaks(bridge.leg(0), 20);
        assertThat(peaks[1]).isCloseTo(4 / Math.PI * Bridges.LINK / 2, within(1e-6));
        assertThat(peaks[5]).isCloseTo(4 / Math.PI / 5 * Bridges.LINK / 2, within(1e-6));
        assertThat(peaks[2]).isLessThan(1e-6);
        assertThat(bridge.leg(0).size()).isEqualTo(2);
        assertThat(bridge.remarks()).anyMatch(remark -> remark.startsWith("six-step"));
    }

    @ParameterizedTest
    @EnumSource(Modulation.class)
    void compensatedOvermodulationGivesWhatIsAskedFor(Modulation scheme) {
        for (double index : new double[] {1.17, 1.22, 1.26}) {
            Bridge bridge = Bridges.without(scheme, CarrierSampling.NATURAL, 401, index);
            double given = Bridges.peaks(bridge.leg(0), 1)[1] / (Bridges.LINK / 2);
            // the carrier turns gently clipped corners into steps: a few parts in ten thousand at this ratio
            assertThat(given).as("M = %s", index).isCloseTo(index, within(2e-3));
        }
    }

    // Source: fundamental of a clipped sine, M·(1/2 + ...): (2/π)·(M·asin(1/M) + √(1 − 1/M²)); standard integral.
    @Test
    void clippedSineFallsShortByTheClosedForm() {
        double index = 1.2;
        DriveSettings settings = settings(index, Overmodulation.CLIPPED);
        Bridge bridge = Bridges.switched(settings, new OperatingPoint(Bridges.OUTPUT, 5, 0.8));
        double expected = 2 / Math.PI * (index * Math.asin(1 / index) + Math.sqrt(1 - 1 / (index * index)));
        assertThat(Bridges.peaks(bridge.leg(0), 1)[1] / (Bridges.LINK / 2)).isCloseTo(expected, within(1e-3));
        assertThat(bridge.remarks()).anyMatch(remark -> remark.contains("falls short"));
    }

    @Test
    void switchesOverByFrequencyOrVoltage() {
        ModulationPlan plan = new ModulationPlan(
                Modulation.SPACE_VECTOR,
                Overmodulation.COMPENSATED,
                Optional.of(Modulation.CLAMP_60),
                OptionalDouble.of(30),
                OptionalDouble.of(200));
        assertThat(plan.at(29, 199)).isEqualTo(Modulation.SPACE_VECTOR);
        assertThat(plan.at(30, 100)).isEqualTo(Modulation.CLAMP_60);
        assertThat(plan.at(10, 200)).isEqualTo(Modulation.CLAMP_60);
    }

    private static DriveSettings settings(double index, Overmodulation overmodulation) {
        return new DriveSettings(
                Carrier.fixed(401 * Bridges.OUTPUT, CarrierSampling.NATURAL),
                new ModulationPlan(
                        Modulation.SINE_TRIANGLE,
                        overmodulation,
                        Optional.empty(),
                        OptionalDouble.empty(),
                        OptionalDouble.empty()),
                Switching.of(0),
                Edges.of(Bridges.STEEP, Bridges.STEEP, EdgeForm.RAMP),
                new VoltageCurve(index * Bridges.LINK / 2 * Math.sqrt(1.5), Bridges.OUTPUT, 0),
                OptionalDouble.of(Bridges.LINK));
    }
}
