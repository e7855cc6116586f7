package undermask.report;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class ReportFolderTest {
    @TempDir
    private Path folder;

    @Test
    void aFileIsReplacedWholeAndNothingElseIsLeft() throws IOException {
        ReportFolder reports = new ReportFolder(folder);
        reports.write("pump", "envelope.csv", "old");
        reports.write("pump", "envelope.csv", "new");
        assertThat(folder.resolve("pump/envelope.csv")).hasContent("new");
        try (Stream<Path> files = Files.list(folder.resolve("pump"))) {
            assertThat(files).hasSize(1);
        }
    }

    @Test
    void aFailedWriteLeavesWhatWasThere() throws IOException {
        Files.createDirectories(folder.resolve("pump/envelope.csv/in the way"));
        assertThatThrownBy(() -> new ReportFolder(folder).write("pump", "envelope.csv", "new"))
                .isInstanceOf(IOException.class)
                .hasMessageContaining("cannot write")
                .hasMessageContaining("envelope.csv");
        try (Stream<Path> files = Files.list(folder.resolve("pump"))) {
            assertThat(files).hasSize(1);
        }
    }

    @Test
    void namesThatLeaveTheFolderAreRefused() {
        assertThatThrownBy(() -> new ReportFolder(folder).write("..", "summary.csv", "x"))
                .hasMessageContaining("outside the report folder");
    }
}
