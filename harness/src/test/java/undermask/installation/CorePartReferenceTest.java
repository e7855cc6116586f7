package undermask.installation;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

class CorePartReferenceTest {
    private static final Material FERRITE = new Material(
            "ferrite", List.of(1e5, 1e6, 1e7), List.of(800.0, 800.0, 200.0), List.of(8.0, 80.0, 400.0), 0.3, "test");

    private static final CorePart RING = new CorePart("ring", FERRITE, 0.036, 0.023, 0.015, 0, "test");

    // Source: inductance of a ring of rectangular section, µ0·µ·N²·h·ln(D/d)/(2π); standard.
    @Test
    void ringHasTheInductanceOfTheClosedForm() {
        double inductance = 4e-7 * Math.PI * 800 * 0.015 * Math.log(36.0 / 23) / (2 * Math.PI);
        double[] z = new double[2];
        RING.impedance(1e5, 1, z);
        assertThat(z[1]).isCloseTo(2 * Math.PI * 1e5 * inductance, within(1e-6));
        assertThat(z[0] / z[1]).isCloseTo(0.01, within(1e-9));
        new RingCores(RING, 4, 3, CorePlace.AROUND_ALL).impedance(1e5, 1, z);
        assertThat(z[1]).isCloseTo(36 * 2 * Math.PI * 1e5 * inductance, within(1e-4));
        new RingCores(RING, 4, 3, CorePlace.ON_EACH).impedance(1e5, 1, z);
        assertThat(z[1]).isCloseTo(12 * 2 * Math.PI * 1e5 * inductance, within(1e-4));
    }

    // Source: permeability of a ring with a gap, µ/(1 + µ·g/l); standard.
    @Test
    void aGapLowersThePermeability() {
        CorePart clamp = new CorePart("clamp", FERRITE, 0.036, 0.023, 0.015, 1e-4, "test");
        double expected = 800 / (1 + 800 * 1e-4 / clamp.length());
        assertThat(clamp.effectiveInitial()).isCloseTo(expected, within(1e-9));
        double[] plain = new double[2];
        double[] gapped = new double[2];
        RING.impedance(1e5, 1, plain);
        clamp.impedance(1e5, 1, gapped);
        assertThat(gapped[1] / plain[1]).isCloseTo(expected / 800, within(1e-3));
    }

    // Source: Ampere, H = N·i/l, against H = B/(µ0·µ); on all conductors together the load currents cancel.
    @Test
    void aLoadCurrentSaturatesCoresOnSingleConductors() {
        RingCores each = new RingCores(RING, 1, 1, CorePlace.ON_EACH);
        RingCores all = new RingCores(RING, 1, 1, CorePlace.AROUND_ALL);
        double field = 0.3 / (4e-7 * Math.PI * 800);
        assertThat(RING.saturationField()).isCloseTo(field, within(1e-6));
        assertThat(each.unsaturated(0.9 * field * RING.length())).isEqualTo(1);
        assertThat(each.unsaturated(2 * field * RING.length())).isCloseTo(0.5, within(1e-9));
        assertThat(all.unsaturated(1000)).isEqualTo(1);
    }

    @Test
    void permeabilityRunsStraightInLogarithmsAndFallsOnBeyondItsPoints() {
        double[] mu = new double[2];
        FERRITE.permeability(Math.sqrt(1e6 * 1e7), mu);
        assertThat(mu[0]).isCloseTo(400, within(1e-6));
        assertThat(-mu[1]).isCloseTo(Math.sqrt(80 * 400), within(1e-6));
        FERRITE.permeability(1e8, mu);
        assertThat(mu[0]).isCloseTo(50, within(1e-6));
        FERRITE.permeability(1e3, mu);
        assertThat(mu[0]).isEqualTo(800);
        assertThatThrownBy(() -> new Material("m", List.of(1e6, 1e5), List.of(1.0, 1.0), List.of(0.0, 0.0), 0.3, "x"))
                .hasMessageContaining("rising frequencies");
    }

    // Source: 3.5 mA at 230 V and 50 Hz are 48 nF per line, I/(2πfU); derived.
    @Test
    void leakageCurrentOfFortyEightNanofarads() {
        FilterStage stage = new FilterStage(
                1e-3, 1e-5, 1e-11, 1e4, Optional.empty(), new Capacitor(0, 0, 0), new Capacitor(48e-9, 0, 0));
        Installation installation = new Installation(
                "plant",
                new Supply(1, 230, 50),
                new MainsLead(2, 0.7e-6, 0.8e-6),
                Optional.of(new FilterPart(
                        "filter", 1, 10, new Capacitor(0, 0, 0), List.of(stage), Double.POSITIVE_INFINITY, "test")),
                0.1,
                new Link(new Capacitor(500e-6, 0.1, 40e-9), new Capacitor(0, 0, 0)),
                100e-12,
                new CablePart("lead", 400e-12, 110e-9, 0.04, 1e6, 0.02, true, "test"),
                10,
                new MotorPart("motor", 750, 1e-10, 1e-9, 3e-3, 2e3, 10, 0.1, "test"),
                OptionalDouble.empty());
        assertThat(installation.leakageCurrent()).isCloseTo(3.5e-3, within(0.05e-3));
    }
}
