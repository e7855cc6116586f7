package undermask.input;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/**
 * The parts of one kind that installations may name: built-in ones, and those of the folders, which add to them or
 * override them.
 *
 * @param <T> the kind of part
 */
final class PartTable<T> {
    private final String kind;
    private final Problems problems;
    /** An empty part is one whose row is wrong: it is known, and its problems are told. */
    private final Map<String, Optional<T>> parts = new TreeMap<>();

    /** How a row becomes a part. */
    interface Maker<T> {
        /** Builds a part; an exception of an illegal argument counts as a problem of the row. */
        T make(PartRow row);
    }

    /**
     * An empty table.
     *
     * @param kind what its parts are called: {@code filter}
     */
    PartTable(String kind, Problems problems) {
        this.kind = kind;
        this.problems = problems;
    }

    /** Takes the parts of a file; a name that is there already is overridden. */
    void add(SourceText source, CsvTable.Columns columns, Maker<T> maker) {
        Optional<CsvTable> table = CsvTable.read(source, columns, problems);
        Map<String, Cell> names = new LinkedHashMap<>();
        for (CsvTable.Row row : table.map(CsvTable::rows).orElse(List.of())) {
            Cell name = row.first();
            Cell first = names.putIfAbsent(name.text(), name);
            if (first != null) {
                problems.add(name, "given twice, first in line " + first.place().line());
            } else if (name.empty()) {
                problems.add(name, "this " + kind + " needs a name");
            } else {
                parts.put(name.text(), row.whole() ? new PartRow(row, problems).make(maker) : Optional.empty());
            }
        }
    }

    /** The parts that are right, by name. */
    Map<String, T> all() {
        Map<String, T> all = new TreeMap<>();
        parts.forEach((name, part) -> part.ifPresent(right -> all.put(name, right)));
        return all;
    }

    /** The part that a cell names; empty when it is unknown or its own row is wrong, which the problems say. */
    Optional<T> named(Cell cell) {
        Optional<T> part = parts.get(cell.text());
        if (part == null) {
            problems.add(
                    cell,
                    "no such " + kind
                            + NearestName.hint(
                                    cell.text(), parts.keySet(), "the command \"parts\" lists what is known"));
            return Optional.empty();
        }
        return part;
    }
}
