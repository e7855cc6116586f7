package undermask.report;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class ChartMakerTest {
    @TempDir
    private Path folder;

    @Test
    void aRuntimeThatCannotDrawIsWarnedAboutOnce() throws IOException {
        List<String> warnings = new ArrayList<>();
        ChartMaker charts = new ChartMaker(true, warnings::add);
        for (int chart = 0; chart < 3; chart++) {
            charts.draw(new ReportFolder(folder), "pump", "spectrum", () -> {
                throw new UnsatisfiedLinkError("no font library");
            });
        }
        assertThat(warnings)
                .singleElement()
                .asString()
                .contains("charts are left out")
                .contains("no font library");
        assertThat(folder).isEmptyDirectory();
    }

    @Test
    void unwantedChartsAreNotDrawn() throws IOException {
        new ChartMaker(false, warning -> {}).draw(new ReportFolder(folder), "pump", "spectrum", () -> {
            throw new AssertionError("drawn");
        });
        assertThat(folder).isEmptyDirectory();
    }
}
