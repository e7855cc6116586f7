package undermask.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import undermask.SmallPlant;

class SweepCommandTest {
    @TempDir
    private Path folder;

    @BeforeEach
    void write() throws IOException {
        SmallPlant.write(folder.resolve("profiles"), "pump", "filter-3ph-16a", "required margin,3,dB,");
        // a motor for 50 Hz at the speed that it is made for
        Path pump = folder.resolve("profiles/pump.csv");
        Files.writeString(
                pump, Files.readString(pump).replace("200,Hz", "50,Hz").replace("400,V", "380,V"));
    }

    private Run sweep(String... arguments) {
        String[] all = new String[arguments.length + 1];
        all[0] = "pump";
        System.arraycopy(arguments, 0, all, 1, arguments.length);
        return Run.in(folder, "sweep", all);
    }

    @Test
    void weighsEverySettingAndRecommendsOneWithItsReason() throws IOException {
        Run run = sweep("--vary", "carrier=4..12 by 4 kHz");
        assertThat(run.err()).isEmpty();
        assertThat(run.status()).isZero();
        assertThat(run.out()).contains("take ").contains("adds the least heat");
        assertThat(run.out().lines().filter(line -> !line.startsWith("reports:")))
                .allSatisfy(line -> assertThat(line.length()).isLessThanOrEqualTo(80));
        List<String> rows = Files.readAllLines(folder.resolve("reports/pump/tradeoff.csv"));
        assertThat(rows).hasSize(4);
        assertThat(rows.get(0))
                .isEqualTo("carrier frequency in kHz,margin_db,passes,winding_celsius,harmonic_loss_w,drive_loss_w,"
                        + "sound_dba,tone_hz,motor_peak_v,unbeaten");
        assertThat(rows.get(1)).startsWith("4,").contains(",0.0,");
        assertThat(folder.resolve("reports/pump/tradeoff.png")).isNotEmptyFile();
    }

    @Test
    void takesWordsSeveralQuantitiesAndRowsOfTheInstallation() throws IOException {
        Run run = sweep(
                "--vary",
                "modulation=space-vector,clamp-60",
                "--vary",
                "motor lead length=5,20 m",
                "--vary",
                "dv/dt=1,2 kV/us",
                "--no-charts");
        assertThat(run.err()).isEmpty();
        List<String> rows = Files.readAllLines(folder.resolve("reports/pump/tradeoff.csv"));
        assertThat(rows).hasSize(9);
        assertThat(rows.get(8)).startsWith("clamp-60,20,2,");
        assertThat(rows.stream().map(row -> row.split(",")[3]).distinct().count())
                .isGreaterThan(4);
    }

    @Test
    void savesTheRecommendedSettingAndReplacesNone() throws IOException {
        Run run = sweep("--vary", "carrier=4,6 kHz", "--no-charts", "--write", "pump-swept");
        assertThat(run.status()).isZero();
        assertThat(folder.resolve("profiles/pump-swept.csv")).content().contains("carrier frequency,\"");
        assertThat(Run.in(folder, "check", "--no-charts", "pump-swept").status())
                .isZero();
        Run again = sweep("--vary", "carrier=4,6 kHz", "--no-charts", "--write", "pump-swept");
        assertThat(again.status()).isEqualTo(2);
        assertThat(again.err()).contains("is there already");
    }

    @ParameterizedTest(name = "{0}")
    @CsvSource(
            delimiter = '|',
            value = {
                "carrier=16..2 by 2 kHz | runs backwards",
                "carrier=4 kHz | one value is no sweep",
                "carrier= | one value is no sweep",
                "carrier=4..8 by 0 kHz | stands still",
                "carrier=4..8 kHz | wanted is QUANTITY=FROM..TO by STEP UNIT",
                "carrier=four..8 by 1 kHz | is no number",
                "4..8 | wanted is QUANTITY=",
                "carrier=2..16 by 0.001 kHz | give --yes to go on",
                "carier frequency=4,8 kHz | nearest: carrier frequency",
                "carrier=4,800 kHz | carrier frequency must be 500 Hz to 40 kHz",
            })
    void refusesWhatIsNoSweep(String vary, String message) {
        Run run = sweep("--vary", vary, "--no-charts");
        assertThat(run.status()).isEqualTo(2);
        assertThat(run.err()).contains(message);
        assertThat(folder.resolve("reports")).doesNotExist();
    }
}
