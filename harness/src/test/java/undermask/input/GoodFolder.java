package undermask.input;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.net.URISyntaxException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;

/** Copies of a sound folder of profiles, for tests that spoil or vary one file of it. */
final class GoodFolder {
    private GoodFolder() {}

    /** The folder of test files of this package. */
    static Path resource(String name) {
        try {
            return Path.of(
                    GoodFolder.class.getResource("/undermask/input/" + name).toURI());
        } catch (URISyntaxException e) {
            throw new IllegalStateException(e);
        }
    }

    /** Copies the sound folder into an empty one. */
    static void copyTo(Path folder) {
        Path good = resource("good");
        try (Stream<Path> files = Files.walk(good)) {
            for (Path file : files.filter(Files::isRegularFile).toList()) {
                Path copy = folder.resolve(good.relativize(file).toString());
                Files.createDirectories(copy.getParent());
                Files.copy(file, copy);
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** The profile {@code brine-pump} with one row replaced. */
    static void writeBrinePump(Path folder, String row, String replacement) throws IOException {
        String sound = Files.readString(resource("good").resolve("brine-pump.csv"));
        if (!sound.contains(row)) {
            throw new IllegalArgumentException("no such row: " + row);
        }
        Files.writeString(folder.resolve("brine-pump.csv"), sound.replace(row, replacement));
    }

    /** The problems of reading some profiles of a folder, none when they are read. */
    static List<Problem> problems(Path folder, String... profiles) {
        try {
            new ProfileFolder(folder).read(List.of(profiles));
            return List.of();
        } catch (Refused refused) {
            return refused.problems();
        }
    }
}
