package undermask.cost;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.junit.jupiter.params.provider.CsvSource;
import undermask.drive.Carrier;
import undermask.drive.CarrierSampling;
import undermask.drive.DriveSettings;
import undermask.drive.EdgeForm;
import undermask.drive.Edges;
import undermask.drive.Modulation;
import undermask.drive.ModulationPlan;
import undermask.drive.OperatingPoint;
import undermask.drive.Switching;
import undermask.drive.VoltageCurve;
import undermask.installation.CablePart;
import undermask.installation.Capacitor;
import undermask.installation.DriveOptions;
import undermask.installation.Installation;
import undermask.installation.LeadFitting;
import undermask.installation.Link;
import undermask.installation.MainsLead;
import undermask.installation.MotorCooling;
import undermask.installation.MotorPart;
import undermask.installation.MotorPlace;
import undermask.installation.Supply;
import undermask.pwm.Bridge;
import undermask.pwm.LinkVoltage;
import undermask.pwm.OutputLoad;

class CostReferenceTest {
    private static final double LINK = 600;

    // Source: machine design textbooks (Richter, Alger, Pyrhönen), from memory; digits as printed.
    @ParameterizedTest
    @CsvSource({"0.5, 1.006, 0.001", "1, 1.086, 0.001", "2, 1.898, 0.001", "3, 3.010, 0.001"})
    void resistanceOfADeepBar(double xi, double factor, double digits) {
        assertThat(DeepBar.resistance(xi)).isCloseTo(factor, within(digits));
    }

    // Source: the same
    @ParameterizedTest
    @CsvSource({"1, 0.976", "2, 0.752", "3, 0.503"})
    void leakageOfADeepBar(double xi, double factor) {
        assertThat(DeepBar.leakage(xi)).isCloseTo(factor, within(0.001));
        assertThat(DeepBar.leakage(18.1)).isCloseTo(DeepBar.leakage(17.9), withinPercentage(1.5));
    }

    // Source: a 25 mm bar at 4 kHz, 15.7 for hot cast aluminium; computed from the same formula.
    @Test
    void aBarOfTwentyFiveMillimetresAtFourKilohertz() {
        double xi = DeepBar.reducedHeight(0.025, 4000, 25e6);
        assertThat(DeepBar.resistance(xi)).isCloseTo(15.7, within(0.05));
    }

    // Source: header of the data file; 0.1 dB
    @ParameterizedTest
    @CsvFileSource(resources = "/undermask/cost/aweight.csv", numLinesToSkip = 2)
    void curveA(double frequency, double weight) {
        assertThat(Sound.weightDb(frequency)).isCloseTo(weight, within(0.1));
    }

    // Source: IEC 60034-30-1:2014 nominal efficiencies IE3, P·(1/η − 1): 159, 515, 1287 and 3947 W.
    @ParameterizedTest
    @CsvSource({"750, 159", "4000, 515", "15000, 1287", "75000, 3947"})
    void ratedLossesAreThoseOfTheEfficiencyClass(double power, double watts) {
        assertThat(MotorModel.estimated(power, 400, 20e-3).ratedLoss()).isCloseTo(watts, withinPercentage(0.5));
    }

    // Source: common practice; catalogue currents of four-pole motors at 400 V: 1.7, 7.8 and 27.5 A.
    @ParameterizedTest
    @CsvSource({"750, 1.7", "4000, 7.8", "15000, 27.5"})
    void ratedCurrentsAreThoseOfCatalogues(double power, double amperes) {
        assertThat(MotorModel.estimated(power, 400, 20e-3).ratedCurrent()).isCloseTo(amperes, withinPercentage(8));
    }

    // Source: conduction of a switch, ½(V0·Î/π + r·Î²/4) + M·cosφ·(V0·Î/8 + r·Î²/3π), of its diode with minus;
    // Casanellas,
    // IEE Proc. Electr. Power Appl. 141 (1994), from memory. For sine-triangle.
    @ParameterizedTest(name = "M = {0}, power factor {1}")
    @CsvSource({"0.4, 0.9", "0.8, 0.85", "1, 0.5"})
    void conductionFollowsTheClosedForm(double index, double powerFactor) {
        double rms = 10;
        double peak = Math.sqrt(2) * rms;
        double rated = 25;
        double cross = index * powerFactor;
        double switches = half(0.9, 0.95 / rated, peak) + cross * crossed(0.9, 0.95 / rated, peak);
        double diodes = half(0.9, 0.8 / rated, peak) - cross * crossed(0.9, 0.8 / rated, peak);
        DriveLoss loss = DriveLoss.of(bridge(Modulation.SINE_TRIANGLE, index, powerFactor, 8000), rated);
        assertThat(loss.conduction()).isCloseTo(6 * (switches + diodes), withinPercentage(1));
    }

    private static double half(double drop, double slope, double peak) {
        return (drop * peak / Math.PI + slope * peak * peak / 4) / 2;
    }

    private static double crossed(double drop, double slope, double peak) {
        return drop * peak / 8 + slope * peak * peak / (3 * Math.PI);
    }

    // Source: derived: a leg that rests for 60° around its voltage peaks leaves out the current of that time, so that
    // switching falls by half the integral of |cos(θ − φ)| from −30° to 30°.
    @ParameterizedTest
    @CsvSource({"1, 0.5", "0.866, 0.567", "0.5, 0.75"})
    void restingLegsSaveTheirShareOfSwitching(double powerFactor, double ratio) {
        double phi = Math.acos(powerFactor);
        double saved = 0;
        int steps = 10_000;
        for (int i = 0; i < steps; i++) {
            double angle = -Math.PI / 6 + (i + 0.5) * Math.PI / 3 / steps;
            saved += Math.abs(Math.cos(angle - phi)) * Math.PI / 3 / steps / 2;
        }
        assertThat(1 - saved).isCloseTo(ratio, within(0.001));
        double continuous = DriveLoss.of(bridge(Modulation.SPACE_VECTOR, 0.9, powerFactor, 8000), 25)
                .switching();
        double resting = DriveLoss.of(bridge(Modulation.CLAMP_60, 0.9, powerFactor, 8000), 25)
                .switching();
        assertThat(resting / continuous).isCloseTo(ratio, within(0.02));
    }

    // Source: common practice: from 4 to 16 kHz the ripple loss falls by more than half, switching rises fourfold and
    // the
    // strongest tone leaves the ear's best range.
    @Test
    void fourAgainstSixteenKilohertz() {
        Bridge slow = bridge(Modulation.SPACE_VECTOR, 0.9, 0.8, 4000);
        Bridge fast = bridge(Modulation.SPACE_VECTOR, 0.9, 0.8, 16000);
        MotorModel motor = MotorModel.estimated(4000, 400, 22e-3);
        assertThat(MotorHeat.harmonics(motor, fast)[0]).isLessThan(0.5 * MotorHeat.harmonics(motor, slow)[0]);
        assertThat(DriveLoss.of(fast, 25).switching() / DriveLoss.of(slow, 25).switching())
                .isCloseTo(4, within(0.1));
        assertThat(Sound.of(slow).toneHz()).isBetween(3500.0, 4500.0);
        assertThat(Sound.of(slow).level() - Sound.of(fast).level()).isGreaterThan(6);
    }

    // Source: common practice: a fan on the shaft stands still with it, 10 K halve the life, and a motor at its rated
    // load
    // on a good drive stays below its class.
    @Test
    void aSlowMotorNeedsAFanOfItsOwn() {
        Bridge bridge = bridge(Modulation.SPACE_VECTOR, 0.9, 0.8, 4000, 10, 7.5);
        MotorHeat own = MotorHeat.of(installation(MotorCooling.SHAFT_FAN), bridge);
        MotorHeat forced = MotorHeat.of(installation(MotorCooling.FORCED), bridge);
        assertThat(own.windingCelsius()).isGreaterThan(forced.windingCelsius() + 30);
        assertThat(forced.lifeFactor() / own.lifeFactor())
                .isCloseTo(Math.pow(2, (own.windingCelsius() - forced.windingCelsius()) / 10), within(1e-6));
        Bridge rated = bridge(Modulation.SPACE_VECTOR, 1.1, 0.82, 4000, 50, 7.95);
        MotorHeat heat = MotorHeat.of(installation(MotorCooling.SHAFT_FAN), rated);
        assertThat(heat.windingCelsius()).isBetween(110.0, MotorHeat.CLASS_CELSIUS);
        assertThat(heat.loss() / heat.ratedLoss()).isBetween(1.0, 1.25);
    }

    private static Installation installation(MotorCooling cooling) {
        return new Installation(
                "plant",
                new Supply(3, 400, 50),
                new MainsLead(2, 0.7e-6, 0.8e-6),
                Optional.empty(),
                0.1,
                new Link(new Capacitor(500e-6, 0.1, 40e-9), new Capacitor(0, 0, 0)),
                100e-12,
                new CablePart("lead", 400e-12, 110e-9, 0.04, 1e6, 0.02, true, "test"),
                10,
                new MotorPart("motor", 4000, 3e-10, 3e-9, 1e-3, 800, 5, 22e-3, "test"),
                OptionalDouble.empty(),
                LeadFitting.PLAIN,
                DriveOptions.PLAIN,
                List.of(),
                Map.of(),
                new MotorPlace(cooling, 40));
    }

    private static Bridge bridge(Modulation scheme, double index, double powerFactor, double carrier) {
        return bridge(scheme, index, powerFactor, carrier, 50, 10);
    }

    private static Bridge bridge(
            Modulation scheme, double index, double powerFactor, double carrier, double output, double amperes) {
        DriveSettings settings = new DriveSettings(
                Carrier.fixed(carrier, CarrierSampling.TWICE),
                ModulationPlan.of(scheme),
                Switching.of(0),
                Edges.of(5e9, 5e9, EdgeForm.RAMP),
                new VoltageCurve(index * LINK / 2 * Math.sqrt(1.5), 50, 0),
                OptionalDouble.of(LINK));
        return Bridge.switching(
                settings,
                new OperatingPoint(output, amperes, powerFactor),
                LinkVoltage.constant(LINK),
                OutputLoad.IDEAL);
    }
}
