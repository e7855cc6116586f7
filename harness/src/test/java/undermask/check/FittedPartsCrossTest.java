package undermask.check;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.IntStream;
import org.jtransforms.fft.DoubleFFT_1D;
import org.junit.jupiter.api.Test;
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
import undermask.installation.CorePart;
import undermask.installation.CorePlace;
import undermask.installation.DriveOptions;
import undermask.installation.FilterPart;
import undermask.installation.FilterStage;
import undermask.installation.Installation;
import undermask.installation.LeadFitting;
import undermask.installation.Link;
import undermask.installation.MainsLead;
import undermask.installation.Material;
import undermask.installation.MotorPart;
import undermask.installation.MotorPlace;
import undermask.installation.RingCores;
import undermask.installation.ShieldTermination;
import undermask.installation.Supply;
import undermask.network.InstallationNetwork;
import undermask.network.MainsNetwork;
import undermask.pwm.Bridge;
import undermask.pwm.LinkVoltage;
import undermask.pwm.OutputLoad;
import undermask.signal.EdgeTrain;
import undermask.signal.Lines;
import undermask.signal.ShapedLevel;

/**
 * Installations with fitted parts by two ways: exact lines through the solved network, and a netlist written by hand,
 * line by line and stepped in time with the waveform as source.
 */
class FittedPartsCrossTest {
    private static final double CARRIER = 16e3;
    private static final double OUTPUT = 500;
    private static final int STEPS = 1 << 19;
    private static final int SECTIONS = 10;
    private static final double LEAD = 3;

    private static final Capacitor X = new Capacitor(330e-9, 30e-3, 15e-9);
    private static final Capacitor Y = new Capacitor(10e-9, 60e-3, 12e-9);
    private static final Capacitor LINK = new Capacitor(470e-6, 150e-3, 40e-9);
    private static final Capacitor LINK_TO_EARTH = new Capacitor(4.7e-9, 100e-3, 10e-9);
    /** Of one permeability at all frequencies, without loss. */
    private static final Material MATERIAL =
            new Material("constant", List.of(1e6), List.of(600.0), List.of(0.0), 0.4, "test");

    private static final CorePart CORE = new CorePart("ring", MATERIAL, 0.036, 0.023, 0.015, 0, "test");

    private static FilterStage stage(double choke) {
        return new FilterStage(choke, choke / 100, 12e-12, 12e3, Optional.empty(), X, Y);
    }

    private static Installation installation(int stages, int cores) {
        return new Installation(
                "bench",
                new Supply(1, 230, 50),
                new MainsLead(1.5, 0.6e-6, 0.7e-6),
                stages == 0
                        ? Optional.empty()
                        : Optional.of(new FilterPart(
                                "test",
                                1,
                                10,
                                X,
                                IntStream.range(0, stages)
                                        .mapToObj(i -> stage(6e-3 / (i + 1)))
                                        .toList(),
                                1e6,
                                "test")),
                0.1,
                new Link(LINK, LINK_TO_EARTH),
                80e-12,
                new CablePart("low loss", 380e-12, 135e-9, 1e-3, 1e6, 1e-5, true, "test"),
                LEAD,
                new MotorPart("motor", 750, 111e-12, 996e-12, 3.14e-3, 2270, 11.5, 0.113, "test"),
                OptionalDouble.of(1e-6),
                new LeadFitting(
                        ShieldTermination.PIGTAIL,
                        0.2,
                        cores == 0
                                ? Optional.empty()
                                : Optional.of(new RingCores(CORE, cores, 2, CorePlace.AROUND_ALL)),
                        1),
                DriveOptions.PLAIN,
                List.of(),
                Map.of(),
                MotorPlace.RATED);
    }

    /** The same, written down element by element. */
    private static TimeCircuit netlist(int stages, int cores) {
        TimeCircuit circuit = new TimeCircuit();
        for (String line : List.of("L", "N")) {
            circuit.branch(line + "a", "ground", 5, 0, 4e-6);
            circuit.inductor(line + "a", line + "b", 250e-6);
            circuit.branch(line + "b", "ground", 5, 0, 8e-6);
            circuit.inductor(line + "b", line + "t", 50e-6);
            circuit.branch(line + "t", line + "r", 50 - 1 / (1 / 50.0 + 1 / 1000.0), 0, 2.2e-6);
            circuit.resistor(line + "r", "ground", 50);
            circuit.resistor(line + "r", "ground", 1000);
            circuit.inductor(line + "t", line + "0", 0.9e-6);
        }
        circuit.inductor("ground", "pe", 1.05e-6);
        if (stages > 0) {
            circuit.branch("L0", "N0", 30e-3, 15e-9, 330e-9);
            circuit.resistor("L0", "N0", 1e6);
            circuit.inductor("case", "pe", 0.8e-6 * 0.1);
        }
        for (int s = 1; s <= stages; s++) {
            double choke = 6e-3 / s;
            double shared = choke - choke / 100 / 2;
            int[] windings = new int[3];
            windings[0] = circuit.inductor("L" + (s - 1), "L" + s, shared + choke / 100);
            windings[1] = circuit.inductor("N" + (s - 1), "N" + s, shared + choke / 100);
            windings[2] = circuit.inductor("core" + s, "ground", shared);
            for (int i = 0; i < 3; i++) {
                for (int j = 0; j < i; j++) {
                    circuit.coupled(windings[i], windings[j], shared);
                }
            }
            circuit.resistor("core" + s, "ground", 12e3);
            for (String line : List.of("L", "N")) {
                circuit.capacitor(line + (s - 1), line + s, 12e-12);
                circuit.branch(line + s, "case", 60e-3, 12e-9, 10e-9);
            }
            circuit.branch("L" + s, "N" + s, 30e-3, 15e-9, 330e-9);
        }
        circuit.resistor("L" + stages, "plus", 50e-3);
        circuit.resistor("N" + stages, "minus", 50e-3);
        for (String rail : List.of("plus", "minus")) {
            circuit.branch(rail, "middle", 75e-3, 20e-9, 940e-6);
            circuit.branch(rail, "pe", 100e-3, 10e-9, 4.7e-9);
        }
        circuit.capacitor("out", "pe", 3 * 80e-12);
        String from = "out";
        if (cores > 0) {
            double inductance = cores * 4 * 4e-7 * Math.PI * 600 * 0.015 * Math.log(36.0 / 23) / (2 * Math.PI);
            circuit.inductor("out", "c0", inductance);
            from = "c0";
        }
        circuit.inductor("pe", "s0", 0.8e-6 * 0.2);
        circuit.capacitor("s0", "ground", 60e-12 * LEAD / 2);
        circuit.capacitor("s" + SECTIONS, "ground", 60e-12 * LEAD / 2);
        lead(circuit, from);
        circuit.inductor("frame", "s" + SECTIONS, 0.8e-6 * 0.2);
        circuit.coil("pe", "frame", 10e-3 * LEAD, 0.9e-6 * LEAD);
        circuit.branch("c" + SECTIONS, "frame", 11.5, 0, 3 * 111e-12);
        circuit.inductor("c" + SECTIONS, "star", 3.14e-3);
        circuit.resistor("c" + SECTIONS, "star", 2270);
        circuit.capacitor("star", "frame", 996e-12);
        circuit.inductor("frame", "ground", 1e-6);
        return circuit;
    }

    /** A chain of sections; half of each section's inductance lies in the core, half in the shield, fully coupled back. */
    private static void lead(TimeCircuit circuit, String from) {
        double inductance = 135e-9 * LEAD / SECTIONS;
        double capacitance = 380e-12 * LEAD / SECTIONS;
        for (int s = 1; s <= SECTIONS; s++) {
            String near = s == 1 ? from : "c" + (s - 1);
            // what enters the core leaves the shield: two coils coupled so tightly that only the loop has inductance
            double large = 1e5 * inductance;
            int core = circuit.inductor(near, "c" + s, large + inductance / 2);
            int shield = circuit.inductor("s" + (s - 1), "s" + s, large + inductance / 2);
            circuit.coupled(core, shield, large);
            circuit.capacitor("c" + s, "s" + s, s == SECTIONS ? capacitance / 2 : capacitance);
        }
        circuit.capacitor(from, "s0", capacitance / 2);
    }

    private static Bridge bridge() {
        DriveSettings settings = new DriveSettings(
                Carrier.fixed(CARRIER, CarrierSampling.TWICE),
                ModulationPlan.of(Modulation.SPACE_VECTOR),
                Switching.of(1e-6),
                Edges.of(4e9, 3e9, EdgeForm.RAMP),
                new VoltageCurve(180, 50, 10),
                OptionalDouble.of(325));
        return Bridge.switching(
                settings, new OperatingPoint(OUTPUT, 2.5, 0.8), LinkVoltage.constant(325), OutputLoad.IDEAL);
    }

    // Source: none needed, the two ways share no code; 0.3 dB
    @Test
    void filterOfTwoStages() {
        commonModeAgrees(2, 0);
    }

    // Source: as above
    @Test
    void ringCoresOnTheMotorLead() {
        commonModeAgrees(1, 3);
    }

    // Source: as above
    @Test
    void differentialMode() {
        Bridge bridge = bridge();
        TimeCircuit circuit = netlist(0, 0);
        circuit.currentSource("minus", "plus");
        EdgeTrain current = bridge.linkCurrent().train();
        ShapedLevel shaped = new ShapedLevel(current);
        Lines lines = bridge.linkCurrent()
                .lines()
                .through(InstallationNetwork.of(installation(0, 0), MainsNetwork.CISPR_9_KHZ)
                        .ports()
                        .get(0)
                        .linkCurrent());
        agree(lines, circuit.steadyState("Lt", shaped::at, current.period(), STEPS));
    }

    private static void commonModeAgrees(int stages, int cores) {
        EdgeTrain edges = bridge().commonMode();
        TimeCircuit circuit = netlist(stages, cores);
        circuit.voltageSource("out", "middle");
        ShapedLevel shaped = new ShapedLevel(edges);
        Lines lines = edges.lines()
                .through(InstallationNetwork.of(installation(stages, cores), MainsNetwork.CISPR_9_KHZ)
                        .ports()
                        .get(0)
                        .commonMode());
        agree(lines, circuit.steadyState("Lt", shaped::at, edges.period(), STEPS));
    }

    /** Each carrier multiple from 150 kHz to 5 MHz, all its lines together. */
    private static void agree(Lines lines, double[] inTime) {
        double[] spectrum = new double[2 * STEPS];
        System.arraycopy(inTime, 0, spectrum, 0, STEPS);
        new DoubleFFT_1D(STEPS).realForwardFull(spectrum);
        int perCarrier = (int) Math.round(CARRIER / lines.spacing());
        int count = (int) (5.1e6 / lines.spacing());
        double[] re = new double[count];
        double[] im = new double[count];
        lines.read(1, count, re, im);
        for (int m = (int) Math.ceil(150e3 / CARRIER); m * CARRIER <= 5e6; m++) {
            double byLines = 0;
            double byTime = 0;
            for (int n = m * perCarrier - perCarrier / 2; n < m * perCarrier + perCarrier / 2; n++) {
                byLines += re[n - 1] * re[n - 1] + im[n - 1] * im[n - 1];
                byTime +=
                        (spectrum[2 * n] * spectrum[2 * n] + spectrum[2 * n + 1] * spectrum[2 * n + 1]) / STEPS / STEPS;
            }
            assertThat(10 * Math.log10(byTime))
                    .as("carrier multiple %d", m)
                    .isCloseTo(10 * Math.log10(byLines), within(0.3));
        }
    }
}
