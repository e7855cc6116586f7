package undermask.pwm;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.OptionalDouble;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import undermask.drive.Carrier;
import undermask.drive.CarrierSampling;
import undermask.drive.DriveSettings;
import undermask.drive.EdgeForm;
import undermask.drive.Edges;
import undermask.drive.Modulation;
import undermask.drive.ModulationPlan;
import undermask.drive.OperatingPoint;
import undermask.drive.ShortPulses;
import undermask.drive.Switching;
import undermask.drive.VoltageCurve;

class DeadTimeCrossTest {
    private static final double CARRIER = 5100;
    private static final double DEAD_TIME = 3e-6;
    private static final double INDEX = 0.85;
    private static final int STEPS = 1_000_000;

    // Source: the other way is a gate logic stepped through one output period at 20 ns: each switch turns on dead time
    // after the comparison wants it, and while none is on the current's sign decides.
    @ParameterizedTest(name = "power factor {0}, compensated: {1}")
    @CsvSource({
        "1, false",
        "0.9, false",
        "0.7, false",
        "0.5, false",
        "0.25, false",
        "0, false",
        "1, true",
        "0.7, true",
        "0.05, true"
    })
    void lowHarmonicsAreThoseOfSteppedGates(double powerFactor, boolean compensated) {
        DriveSettings settings = new DriveSettings(
                Carrier.fixed(CARRIER, CarrierSampling.NATURAL),
                ModulationPlan.of(Modulation.SINE_TRIANGLE),
                new Switching(DEAD_TIME, compensated, 0, ShortPulses.DROP, 0, 0),
                Edges.of(Bridges.STEEP, Bridges.STEEP, EdgeForm.RAMP),
                new VoltageCurve(INDEX * Bridges.LINK / 2 * Math.sqrt(1.5), Bridges.OUTPUT, 0),
                OptionalDouble.of(Bridges.LINK));
        OperatingPoint point = new OperatingPoint(Bridges.OUTPUT, 8, powerFactor);
        double[] peaks = Bridges.peaks(Bridges.switched(settings, point).leg(0), 13);
        double[] stepped = stepped(Math.acos(powerFactor), compensated);
        for (int n : new int[] {1, 3, 5, 7, 11, 13}) {
            // a step of 20 ns in a carrier period is 0.06 V; it averages out over the edges
            assertThat(peaks[n]).as("line %d", n).isCloseTo(stepped[n], within(0.06));
        }
        if (compensated) {
            assertThat(peaks[1]).isCloseTo(INDEX * Bridges.LINK / 2, within(0.005 * Bridges.LINK / 2));
            // half of the 2.16 V that the dead time makes: a drive that samples the current's sign once per carrier
            // period corrects the period of its zero crossing wrongly
            assertThat(peaks[5]).isLessThan(1.08);
        }
    }

    private static double[] stepped(double lag, boolean compensated) {
        double step = 1 / (Bridges.OUTPUT * STEPS);
        int dead = (int) Math.round(DEAD_TIME / step);
        double[] cos = new double[14];
        double[] sin = new double[14];
        int wantedFor = dead + 1;
        boolean wanted = true;
        double correction = 0;
        for (int pass = 0; pass < 2; pass++) {
            for (int i = 0; i < STEPS; i++) {
                double time = (i + 0.5) * step;
                double current = Math.cos(2 * Math.PI * Bridges.OUTPUT * time - lag);
                double turns = time * CARRIER;
                double place = turns - Math.floor(turns);
                if (compensated && Math.floor((i - 0.5) * step * CARRIER) != Math.floor(turns)) {
                    correction = 2
                            * DEAD_TIME
                            * CARRIER
                            * Math.signum(Math.cos(2 * Math.PI * Bridges.OUTPUT * (i * step) - lag + 1e-9));
                }
                double carrier = place < 0.5 ? 1 - 4 * place : 4 * place - 3;
                boolean want = INDEX * Math.cos(2 * Math.PI * Bridges.OUTPUT * time) + correction > carrier;
                wantedFor = want == wanted ? wantedFor + 1 : 1;
                wanted = want;
                boolean on = wantedFor > dead;
                double level = on ? (wanted ? 1 : -1) : (current > 0 ? -1 : 1);
                for (int n = 1; pass == 1 && n < cos.length; n++) {
                    cos[n] += level * Math.cos(2 * Math.PI * n * (i + 0.5) / STEPS);
                    sin[n] += level * Math.sin(2 * Math.PI * n * (i + 0.5) / STEPS);
                }
            }
        }
        double[] peaks = new double[cos.length];
        for (int n = 1; n < cos.length; n++) {
            peaks[n] = Bridges.LINK / 2 * Math.hypot(cos[n], sin[n]) * 2 / STEPS;
        }
        return peaks;
    }
}
