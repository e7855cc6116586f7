package undermask.input;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import undermask.mask.Mask;

/**
 * The published masks that are built in, each a table such as users write under a line of an index that tells its title,
 * its source and how the figures came here.
 *
 * <p>Left out, since no mains network measures them: limits for a voltage probe at load terminals, and the compatibility
 * levels of public networks, which are no emission limits.
 */
final class PublishedMasks {
    private static final String FOLDER = "/undermask/input/masks/";
    private static final CsvTable.Columns COLUMNS =
            new CsvTable.Columns(List.of("name", "title", "source", "evidence"), List.of(), 4);
    private static final Map<String, CsvTable.Row> INDEX = index();

    private PublishedMasks() {}

    private static Map<String, CsvTable.Row> index() {
        Problems faults = new Problems();
        List<CsvTable.Row> rows = SourceText.builtIn(FOLDER + "index.csv", faults)
                .flatMap(text -> CsvTable.read(text, COLUMNS, faults))
                .map(CsvTable::rows)
                .orElse(List.of());
        Map<String, CsvTable.Row> index = new LinkedHashMap<>();
        for (CsvTable.Row row : rows) {
            if (index.put(row.first().text(), row) != null) {
                faults.add(row.first(), "given twice");
            }
        }
        expectNone(faults);
        return index;
    }

    /** The names of all of them, sorted as in the index. */
    static Set<String> names() {
        return INDEX.keySet();
    }

    /**
     * Reads one of them.
     *
     * @param name one of {@link #names}
     * @throws IllegalStateException when the built-in table is not right
     */
    static Mask read(String name) {
        CsvTable.Row row = INDEX.get(name);
        String source = row.cell("source").text() + " (" + row.cell("evidence").text() + ")";
        Problems faults = new Problems();
        Optional<Mask> mask = SourceText.builtIn(FOLDER + name + ".csv", faults)
                .flatMap(text -> MaskFile.read(text, name, row.cell("title").text(), source, faults));
        expectNone(faults);
        return mask.orElseThrow();
    }

    private static void expectNone(Problems faults) {
        if (!faults.none()) {
            throw new IllegalStateException("built-in masks are not right: " + faults.sorted());
        }
    }
}
