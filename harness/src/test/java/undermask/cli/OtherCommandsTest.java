package undermask.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import undermask.SmallPlant;

class OtherCommandsTest {
    @TempDir
    private Path folder;

    @Test
    void waveformWritesStepsLinesAndACharts() throws IOException {
        SmallPlant.write(folder.resolve("profiles"), "pump", "filter-3ph-16a", "");
        Run run = Run.in(folder, "waveform", "pump");
        assertThat(run.err()).isEmpty();
        assertThat(run.status()).isZero();
        List<String> steps = Files.readAllLines(folder.resolve("reports/pump/waveform.csv"));
        assertThat(steps.get(0))
                .isEqualTo(
                        "time_s,leg_a_v,leg_b_v,leg_c_v,line_to_line_v,common_mode_v,current_a_a,current_b_a,current_c_a,link_current_a");
        for (String row : steps.subList(1, steps.size())) {
            double[] cells = Arrays.stream(row.split(","))
                    .mapToDouble(Double::parseDouble)
                    .toArray();
            assertThat(cells[4]).isCloseTo(cells[1] - cells[2], within(2e-3));
            assertThat(cells[5]).isCloseTo((cells[1] + cells[2] + cells[3]) / 3, within(2e-3));
        }
        List<String> lines = Files.readAllLines(folder.resolve("reports/pump/lines.csv"));
        assertThat(lines.get(0)).isEqualTo("frequency_hz,leg_v,line_to_line_v,common_mode_v,link_current_a");
        // 400 V asked for at 200 Hz, less the dead time's share
        double[] first = lines.stream()
                .filter(line -> line.startsWith("200,"))
                .findFirst()
                .map(line -> Arrays.stream(line.split(","))
                        .mapToDouble(Double::parseDouble)
                        .toArray())
                .orElseThrow();
        assertThat(first[0]).isEqualTo(200);
        assertThat(first[2]).isBetween(385.0, 400.0);
        assertThat(folder.resolve("reports/pump/waveform.png")).isNotEmptyFile();
    }

    @Test
    void waveformRefusesAPointThatIsNotThere() throws IOException {
        SmallPlant.write(folder.resolve("profiles"), "pump", "filter-3ph-16a", "");
        Run run = Run.in(folder, "waveform", "pump", "--point", "2");
        assertThat(run.status()).isEqualTo(2);
        assertThat(run.err()).contains("--point is 2; pump has points 1 to 1");
    }

    @Test
    void masksAreListedWithTheirSourceInEightyColumns() {
        Run run = Run.of("masks");
        assertThat(run.status()).isZero();
        assertThat(run.out()).contains("iec61800-3-c2").contains("cispr11-b").contains("fcc15-b");
        assertThat(run.out().lines())
                .allSatisfy(line -> assertThat(line.length()).isLessThanOrEqualTo(80));
    }

    @Test
    void partsAreListedWithTheirSourceInEightyColumns() {
        Run run = Run.of("parts");
        assertThat(run.status()).isZero();
        assertThat(run.out())
                .contains("filter-3ph-16a-2st")
                .contains("ring-36-nizn")
                .contains("nanocrystalline-25000")
                .contains("unshielded-4x2.5")
                .contains("motor-75kw")
                .contains("(generic)");
        assertThat(run.out().lines())
                .allSatisfy(line -> assertThat(line.length()).isLessThanOrEqualTo(80));
    }

    @Test
    void helpNamesCommandsAndExitStatuses() {
        Run run = Run.of("--help");
        assertThat(run.status()).isZero();
        assertThat(run.out())
                .contains("check")
                .contains("waveform")
                .contains("masks")
                .contains("Exit status");
        assertThat(run.out().lines())
                .allSatisfy(line -> assertThat(line.length()).isLessThanOrEqualTo(80));
    }
}
