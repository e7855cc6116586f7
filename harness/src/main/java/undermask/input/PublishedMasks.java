package undermask.input;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
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
    private static final CsvTable.Columns INDEX =
            new CsvTable.Columns(List.of("name", "title", "source", "evidence"), List.of(), 0);

    private PublishedMasks() {}

    /**
     * All of them by name.
     *
     * @throws IllegalStateException when a built-in table is not right
     */
    static Map<String, Mask> all() {
        return Holder.MASKS;
    }

    private static final class Holder {
        private static final Map<String, Mask> MASKS = read();
    }

    private static Map<String, Mask> read() {
        Problems faults = new Problems();
        Map<String, Mask> masks = new TreeMap<>();
        List<CsvTable.Row> index = SourceText.builtIn(FOLDER + "index.csv", faults)
                .flatMap(text -> CsvTable.read(text, INDEX, faults))
                .map(CsvTable::rows)
                .orElse(List.of());
        for (CsvTable.Row row : index) {
            String name = row.cell("name").text();
            String source =
                    row.cell("source").text() + " (" + row.cell("evidence").text() + ")";
            Optional<Mask> mask = SourceText.builtIn(FOLDER + name + ".csv", faults)
                    .flatMap(text -> MaskFile.read(text, name, row.cell("title").text(), source, faults));
            if (mask.isPresent() && masks.put(name, mask.get()) != null) {
                faults.add(row.first(), "given twice");
            }
        }
        if (!faults.none() || masks.isEmpty()) {
            throw new IllegalStateException("built-in masks are not right: " + faults.sorted());
        }
        return Map.copyOf(masks);
    }
}
