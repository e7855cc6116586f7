package undermask.gate;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class ProfilesGateTest {
    @TempDir
    private Path folder;

    @Test
    void aTestForEachDetectorWhoseNameTellsHowMuch() throws IOException {
        write("filter-3ph-16a");
        List<DynamicTest> tests = tests();
        assertThat(tests)
                .extracting(DynamicTest::getDisplayName)
                .satisfiesExactly(
                        name -> assertThat(name)
                                .matches("pump: quasi-peak clear by [0-9.]+ dB at .* \\(iec61800-3-c2\\)"),
                        name -> assertThat(name)
                                .matches("pump: average clear by [0-9.]+ dB at .* \\(iec61800-3-c2\\)"));
        for (DynamicTest test : tests) {
            org.assertj.core.api.Assertions.assertThatCode(
                            () -> test.getExecutable().execute())
                    .doesNotThrowAnyException();
        }
        assertThat(folder.resolve("reports/summary.csv")).isNotEmptyFile();
    }

    @Test
    void aProfileThatIsOverFailsWithItsPlaceAndNoStackTrace() throws IOException {
        write("none");
        for (DynamicTest test : tests()) {
            assertThat(test.getDisplayName()).contains(" over by ");
            assertThatThrownBy(() -> test.getExecutable().execute())
                    .isInstanceOf(AssertionError.class)
                    .hasMessageContaining("pump.csv:4:19: ")
                    .satisfies(failure -> assertThat(failure.getStackTrace()).isEmpty());
        }
    }

    @Test
    void nothingGoesGreenBySilence() throws IOException {
        Files.createDirectories(folder.resolve("profiles"));
        assertThat(tests())
                .singleElement()
                .satisfies(test -> assertThatThrownBy(() -> test.getExecutable().execute())
                        .hasMessageContaining("refused, no profile was checked"));
    }

    private List<DynamicTest> tests() throws IOException {
        System.setProperty("undermask.profiles", folder.resolve("profiles").toString());
        System.setProperty("undermask.reports", folder.resolve("reports").toString());
        try {
            return new ProfilesGate().profiles().toList();
        } finally {
            System.clearProperty("undermask.profiles");
            System.clearProperty("undermask.reports");
        }
    }

    private void write(String filter) throws IOException {
        undermask.SmallPlant.write(folder.resolve("profiles"), "pump", filter, "");
    }
}
