package undermask.input;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Holds every file of {@code refused/} against the messages that it expects: lines {@code # expect: line:column: message},
 * or {@code # expect: message} for the file as a whole, in the file itself or beside it in {@code NAME.expect}.
 */
class RefusedFilesTest {
    private static final String EXPECT = "# expect: ";

    @TempDir
    Path folder;

    static List<Path> refused() throws IOException {
        Path refused = GoodFolder.resource("refused");
        try (Stream<Path> files = Files.walk(refused)) {
            return files.filter(file -> file.toString().endsWith(".csv"))
                    .map(refused::relativize)
                    .sorted()
                    .toList();
        }
    }

    @Test
    void everyKindOfFileHasSomethingRefused() throws IOException {
        assertThat(refused().stream().map(file -> file.getParent().toString()).distinct())
                .containsExactlyInAnyOrder(
                        "cables", "filters", "installations", "masks", "motors", "policy", "profiles");
    }

    @ParameterizedTest
    @MethodSource("refused")
    void namesEveryFaultAtItsPlaceAndNothingElse(Path file) throws IOException {
        Path spoilt = GoodFolder.resource("refused").resolve(file);
        GoodFolder.copyTo(folder);
        String name = CsvFolder.name(file);
        Path copy;
        switch (file.getParent().toString()) {
            case "profiles" -> copy = folder.resolve("brine-pump.csv");
            case "installations" -> {
                copy = folder.resolve("installations").resolve(name + ".csv");
                GoodFolder.writeBrinePump(folder, "installation,plant", "installation," + name);
            }
            case "masks" -> {
                copy = folder.resolve("masks").resolve(name + ".csv");
                GoodFolder.writeBrinePump(folder, "mask,iec61800-3-c2", "mask," + name);
            }
            case "policy" -> copy = folder.resolve("policy.csv");
            default -> copy = folder.resolve("parts").resolve(file.getParent() + ".csv");
        }
        Files.deleteIfExists(copy);
        Files.copy(spoilt, copy);

        List<String> told = GoodFolder.problems(folder, "brine-pump").stream()
                .map(problem -> withoutFile(problem, copy))
                .toList();

        assertThat(told).isNotEmpty().containsExactlyElementsOf(expected(spoilt));
    }

    private static String withoutFile(Problem problem, Path file) {
        assertThat(problem.place().file()).isEqualTo(file.toString());
        return problem.toString()
                .substring(file.toString().length() + 1)
                .strip()
                .replace(file.getParent().toString(), "FOLDER");
    }

    private static List<String> expected(Path file) throws IOException {
        Path beside = file.resolveSibling(CsvFolder.name(file) + ".expect");
        List<String> lines = new ArrayList<>(Files.readAllLines(file));
        if (Files.exists(beside)) {
            lines.addAll(Files.readAllLines(beside));
        }
        return lines.stream()
                .filter(line -> line.startsWith(EXPECT))
                .map(line -> line.substring(EXPECT.length()))
                .toList();
    }
}
