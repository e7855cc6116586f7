package undermask.check;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.jtransforms.fft.DoubleFFT_1D;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import undermask.SmallPlant;
import undermask.input.ProfileFolder;
import undermask.input.Refused;
import undermask.network.Circuit;
import undermask.network.CircuitSolver;
import undermask.network.InstallationNetwork;
import undermask.network.MainsNetwork;
import undermask.network.Phasor;
import undermask.pwm.Bridge;
import undermask.receiver.Detector;
import undermask.receiver.Trace;
import undermask.signal.Lines;
import undermask.signal.TabulatedTransfer;
import undermask.signal.Transfer;

/** What integrators see when they change something on site. Source throughout: common practice. */
class FieldPracticeReferenceTest {
    @TempDir
    private Path folder;

    private String profileRows = "";

    private Profile plant(String filter, String... rows) throws IOException, Refused {
        SmallPlant.write(folder, "pump", filter, profileRows);
        Path installation = folder.resolve("installations/plant-" + filter + ".csv");
        StringBuilder text = new StringBuilder();
        for (String line : Files.readAllLines(installation)) {
            String quantity = line.split(",")[0];
            boolean replaced = List.of(rows).stream().anyMatch(row -> row.split(",")[0].equals(quantity));
            text.append(replaced ? "" : line + "\n");
        }
        text.append(String.join("\n", rows)).append('\n');
        Files.writeString(installation, text);
        return new ProfileFolder(folder).read(List.of("pump")).get(0);
    }

    /** The highest quasi-peak level of a range, dBµV. */
    private static double highest(Profile profile, double from, double to) {
        Trace trace = Check.of(profile).envelope();
        double highest = Double.NEGATIVE_INFINITY;
        for (int step = 0; step < trace.size(); step++) {
            if (trace.frequency(step) >= from && trace.frequency(step) <= to) {
                highest = Math.max(highest, trace.levelDbuv(Detector.QUASI_PEAK, step));
            }
        }
        return highest;
    }

    @ParameterizedTest(name = "{0} with {1} moves it by {4} dB and more")
    @CsvSource({
        // a filter taken out
        "none, 'mains lead length,2,m,', 0.15e6, 30e6, 30",
        // a test lead for the filter's earth instead of its flat case
        "filter-3ph-16a, 'filter earth lead length,1,m,', 1e6, 30e6, 6",
        // the drive's capacitors to PE were connected before; now they are not
        "filter-3ph-16a, 'link to earth capacitance,100,nF,;link to earth connection,removed,,', 0.15e6, 1e6, 3",
        "filter-3ph-16a, 'motor lead length,20,m,', 0.15e6, 0.5e6, 2",
        // on a motor that stands on the earthed structure
        "filter-3ph-16a, 'motor frame bond inductance,0.5,uH,;shield termination,pigtail,,;pigtail length,0.3,m,', 1e6, 30e6, 2",
        "filter-3ph-16a, 'motors in parallel,3,,', 0.15e6, 0.5e6, 4",
    })
    void badChangesRaiseTheReading(String filter, String rows, double from, double to, double least)
            throws IOException, Refused {
        String[] changes = rows.split(";");
        String[] before = rows.contains("removed")
                ? new String[] {"link to earth capacitance,100,nF,"}
                : new String[] {rows.contains("frame bond") ? changes[0] : "motor,motor-4kw,,"};
        double good = highest(
                plant(filter.equals("none") && rows.contains("mains lead") ? "filter-3ph-16a" : filter, before),
                from,
                to);
        double bad = highest(plant(filter, changes), from, to);
        assertThat(bad - good).isGreaterThanOrEqualTo(least);
    }

    @ParameterizedTest(name = "{0} lowers it by {3} dB and more")
    @CsvSource({
        // a shield is a capacitance, too
        "'motor lead,unshielded-4x2.5,,', 0.15e6, 0.5e6, 3",
        "'mains filter,filter-3ph-16a-2st,,', 0.15e6, 1e6, 10",
        "'ring core,ring-63-tape,,;ring core count,4,,;ring core turns,2,,', 1e6, 10e6, 6",
        "'output filter,choke,,;output filter inductance,2,mH,;output filter common-mode share,1,,', 0.5e6, 10e6, 10",
    })
    void goodChangesLowerTheReading(String rows, double from, double to, double least) throws IOException, Refused {
        double plain = highest(plant("filter-3ph-16a", "motor,motor-4kw,,"), from, to);
        double better = highest(plant("filter-3ph-16a", rows.split(";")), from, to);
        assertThat(plain - better).isGreaterThanOrEqualTo(least);
    }

    // what an oscilloscope shows of a clamp: peak to peak of the common-mode current up to 10 MHz
    @Test
    void filterWithPoorEarthAndCoresOnTheMotorLead() throws IOException, Refused {
        String inside = "link to earth capacitance,10,nF,";
        String noCores = "ring core,air,,";
        String cores = "ring core,ring-36-nizn,,;ring core count,10,,";
        String poor = "filter earth lead length,0.5,m,";
        writeAirCore();
        double[] bare = peakToPeak(plant("none", noCores, inside));
        double[] filtered = peakToPeak(plant("filter-3ph-16a-2st", noCores, poor, inside));
        double[] both = peakToPeak(plant("filter-3ph-16a-2st", (cores + ";" + poor + ";" + inside).split(";")));
        double[] coresOnly = peakToPeak(plant("none", (cores + ";" + inside).split(";")));
        assertThat(filtered[0]).as("mains side with filter").isLessThan(0.6 * bare[0]);
        assertThat(filtered[1] / bare[1]).as("motor side with filter").isBetween(0.8, 1.2);
        assertThat(both[1]).as("motor side with cores").isLessThan(0.67 * filtered[1]);
        assertThat(both[0]).as("mains side with both").isLessThan(filtered[0]);
        assertThat(coresOnly[1]).as("motor side with cores alone").isLessThan(0.67 * bare[1]);
    }

    /** A ring of no permeability, so that the current has a place to be read at in every state. */
    private void writeAirCore() throws IOException {
        Files.createDirectories(folder.resolve("parts"));
        Files.writeString(
                folder.resolve("parts/materials.csv"),
                "name,frequencies,mu real,mu loss,saturation,source\nair,1 MHz,1,0,1,test\n");
        Files.writeString(
                folder.resolve("parts/cores.csv"),
                "name,material,outer,inner,height,gap,source\nair,air,36 mm,23 mm,15 mm,0 mm,test\n");
    }

    /** Common-mode current of the mains lead and of the motor lead at the drive, A peak to peak. */
    private static double[] peakToPeak(Profile profile) {
        InstallationNetwork network = InstallationNetwork.of(profile.installation(), MainsNetwork.CISPR_9_KHZ);
        Circuit circuit = network.circuit();
        Bridge bridge = Bridge.switching(
                profile.settings(),
                profile.points().get(0),
                profile.link(profile.points().get(0)),
                profile.load());
        CircuitSolver solver = circuit.solver();
        String end = profile.installation().filter().isPresent() ? " lead end" : " drive input";
        double inductance = profile.installation().mainsLead().lineInductance()
                * profile.installation().mainsLead().length();
        double[] core = new double[2];
        return new double[] {
            peakToPeak(bridge, frequency -> {
                double re = 0;
                double im = 0;
                for (String line : List.of("L1", "L2", "L3")) {
                    Phasor drop = solver.tune(frequency)
                            .excite("common mode of the bridge")
                            .voltage(MainsNetwork.terminal(line))
                            .minus(solver.voltage(line + end));
                    re += drop.im() / (2 * Math.PI * frequency * inductance);
                    im -= drop.re() / (2 * Math.PI * frequency * inductance);
                }
                return new double[] {re, im};
            }),
            peakToPeak(bridge, frequency -> {
                Phasor drop = solver.tune(frequency)
                        .excite("common mode of the bridge")
                        .voltage("drive output")
                        .minus(solver.voltage("motor lead start"));
                profile.installation().fitting().cores().orElseThrow().impedance(frequency, 1, core);
                double square = core[0] * core[0] + core[1] * core[1];
                return new double[] {
                    (drop.re() * core[0] + drop.im() * core[1]) / square,
                    (drop.im() * core[0] - drop.re() * core[1]) / square
                };
            })
        };
    }

    private interface Current {
        double[] at(double frequency);
    }

    private static double peakToPeak(Bridge bridge, Current current) {
        Transfer transfer = TabulatedTransfer.of(
                (frequency, out) -> System.arraycopy(current.at(frequency), 0, out, 0, 2), 1e3, 10e6, 2e6, 1e-3);
        Lines lines = bridge.commonMode().lines().through(transfer);
        int size = 1 << 19;
        int count = (int) (10e6 / lines.spacing());
        double[] re = new double[count];
        double[] im = new double[count];
        lines.read(1, count, re, im);
        double[] samples = new double[2 * size];
        for (int n = (int) Math.ceil(1e3 / lines.spacing()); n <= count; n++) {
            samples[2 * n] = 2 * re[n - 1];
            samples[2 * n + 1] = 2 * im[n - 1];
        }
        new DoubleFFT_1D(size).complexInverse(samples, false);
        double high = 0;
        double low = 0;
        for (int i = 0; i < size; i++) {
            high = Math.max(high, samples[2 * i]);
            low = Math.min(low, samples[2 * i]);
        }
        return high - low;
    }

    // all that a clamp around both conductors of a single-phase supply sees is common mode
    @Test
    void aClampAroundBothConductorsSeesNoDifferentialCurrent() throws IOException, Refused {
        profileRows = "link voltage,565,V,";
        Profile profile = plant("none", "supply phases,1,,", "supply voltage,230,V,", "motor,motor-0.75kw,,");
        CircuitSolver solver = InstallationNetwork.of(profile.installation(), MainsNetwork.CISPR_9_KHZ)
                .circuit()
                .solver()
                .tune(150e3)
                .excite("current of the bridge from the link");
        Phasor line = solver.voltage(MainsNetwork.terminal("L")).minus(solver.voltage("L drive input"));
        Phasor neutral = solver.voltage(MainsNetwork.terminal("N")).minus(solver.voltage("N drive input"));
        double sum = Math.hypot(line.re() + neutral.re(), line.im() + neutral.im());
        assertThat(sum / line.modulus()).isCloseTo(0, within(1e-6));
    }
}
