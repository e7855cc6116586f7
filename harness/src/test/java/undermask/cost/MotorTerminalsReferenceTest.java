package undermask.cost;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import undermask.installation.CablePart;
import undermask.installation.Capacitor;
import undermask.installation.DriveOptions;
import undermask.installation.Installation;
import undermask.installation.LeadFitting;
import undermask.installation.Link;
import undermask.installation.MainsLead;
import undermask.installation.MotorPart;
import undermask.installation.MotorPlace;
import undermask.installation.OutputFilter;
import undermask.installation.OutputFilterKind;
import undermask.installation.Supply;

class MotorTerminalsReferenceTest {
    private static Installation installation(double length, double power, Optional<OutputFilter> output) {
        return new Installation(
                "plant",
                new Supply(3, 400, 50),
                new MainsLead(2, 0.7e-6, 0.8e-6),
                Optional.empty(),
                0.1,
                new Link(new Capacitor(500e-6, 0.1, 40e-9), new Capacitor(0, 0, 0)),
                100e-12,
                new CablePart("lead", 400e-12, 110e-9, 0.04, 1e6, 0.02, true, "generic"),
                length,
                new MotorPart("motor", power, 0.3e-9, 3e-9, 1e-3, 800, 5, 22e-3, "generic"),
                OptionalDouble.empty(),
                LeadFitting.PLAIN,
                new DriveOptions(true, 0, 0, output),
                List.of(),
                Map.of(),
                MotorPlace.RATED);
    }

    // Source: critical lengths v·t_r/2 with about 150 m/µs: 0.1 µs 7.5 m, 0.2 µs 15 m, 1 µs 75 m; Persson (1992), from
    // memory.
    @ParameterizedTest
    @CsvSource({"0.1e-6, 7.5", "0.2e-6, 15", "1e-6, 75"})
    void criticalLength(double transition, double metres) {
        assertThat(MotorTerminals.of(installation(10, 4e3, Optional.empty()), 560, transition)
                        .criticalLength())
                .isCloseTo(metres, within(0.01 * metres));
    }

    // Source: reflection 0.92 to 0.97 up to 3.7 kW, 0.82 at 90 kW, 0.60 at 355 kW; Persson (1992) and trade guides,
    // from
    // memory. Beyond the critical length the peak is V_dc·(1 + reflection), near twice the link for a small motor.
    @ParameterizedTest
    @CsvSource({
        "750, 0.92, 0.97",
        "3700, 0.92, 0.97",
        "90000, 0.815, 0.825",
        "355000, 0.595, 0.605",
        "15000, 0.85, 0.94"
    })
    void longLeadsNearlyDoubleTheLink(double power, double low, double high) {
        MotorTerminals terminals = MotorTerminals.of(installation(60, power, Optional.empty()), 560, 0.2e-6);
        assertThat(terminals.peak()).isBetween(560 * (1 + low), 560 * (1 + high));
    }

    // Source: common practice; a short lead adds in proportion, a dv/dt filter slows the edge, a sine filter ends it.
    @Test
    void filtersAndShortLeadsTakeTheEchoAway() {
        double plain = MotorTerminals.of(installation(60, 4e3, Optional.empty()), 560, 0.2e-6)
                .peak();
        double close = MotorTerminals.of(installation(5, 4e3, Optional.empty()), 560, 0.2e-6)
                .peak();
        assertThat(close).isCloseTo(560 * (1 + 0.945 / 3), within(10.0));
        OutputFilter slow = new OutputFilter(OutputFilterKind.DV_DT, 100e-6, 0.05, 10e-9, 30);
        MotorTerminals slowed = MotorTerminals.of(installation(60, 4e3, Optional.of(slow)), 560, 0.2e-6);
        assertThat(slowed.riseTime()).isGreaterThan(2e-6);
        assertThat(slowed.peak()).isLessThan(0.75 * plain);
        OutputFilter sine = new OutputFilter(OutputFilterKind.SINE, 4e-3, 0.05, 3e-6, 1);
        assertThat(MotorTerminals.of(installation(60, 4e3, Optional.of(sine)), 560, 0.2e-6)
                        .peak())
                .isEqualTo(560);
    }
}
