package undermask.input;

import java.io.IOException;
import java.nio.file.DirectoryIteratorException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import undermask.unit.Place;

/** The CSV files that stand directly in a folder, by name. */
final class CsvFolder {
    private static final String ENDING = ".csv";

    private CsvFolder() {}

    /**
     * Lists a folder.
     *
     * @return file name without its ending to path, sorted by name; empty when there is no such folder
     */
    static Map<String, Path> list(Path folder, Problems problems) {
        Map<String, Path> files = new TreeMap<>();
        if (!Files.isDirectory(folder)) {
            return files;
        }
        try (DirectoryStream<Path> entries = Files.newDirectoryStream(folder)) {
            for (Path entry : entries) {
                if (isCsv(entry) && !Files.isDirectory(entry)) {
                    Path same = files.put(name(entry), entry);
                    if (same != null) {
                        problems.add(Place.of(folder.toString()), "two files are named " + name(entry) + ENDING);
                    }
                }
            }
        } catch (IOException | DirectoryIteratorException e) {
            problems.add(Place.of(folder.toString()), "this folder cannot be listed: " + e.getMessage());
        }
        return files;
    }

    static boolean isCsv(Path file) {
        return file.getFileName() != null
                && file.getFileName().toString().toLowerCase(Locale.ROOT).endsWith(ENDING);
    }

    /** The name of a file without its ending. */
    static String name(Path file) {
        String name = file.getFileName() == null ? "" : file.getFileName().toString();
        return isCsv(file) ? name.substring(0, name.length() - ENDING.length()) : name;
    }
}
