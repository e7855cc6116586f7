package undermask.input;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import undermask.unit.Place;

/** The rows of a CSV file under a known header. */
final class CsvTable {
    private final String file;
    private final List<Row> rows;

    private CsvTable(String file, List<Row> rows) {
        this.file = file;
        this.rows = List.copyOf(rows);
    }

    /**
     * The columns of a table, in order.
     *
     * @param needed columns that the header must have
     * @param optional columns that may follow them
     * @param least how many cells a row must have; the rest may be left out at its end
     */
    record Columns(List<String> needed, List<String> optional, int least) {
        private boolean match(List<String> header) {
            if (header.size() < needed.size()
                    || !header.subList(0, needed.size()).equals(needed)) {
                return false;
            }
            List<String> further = header.subList(needed.size(), header.size());
            return further.stream().distinct().count() == further.size() && optional.containsAll(further);
        }

        private String text() {
            String text = String.join(",", needed);
            return optional.isEmpty() ? text : text + "[," + String.join("][,", optional) + "]";
        }
    }

    /**
     * A row.
     *
     * @param whole false when something is wrong with the row as such, which the problems name already
     */
    record Row(List<String> header, List<Cell> cells, boolean whole) {
        /** The cell of a column, empty where the row or the table does not have it. */
        Cell cell(String column) {
            int index = header.indexOf(column);
            if (index >= 0 && index < cells.size()) {
                return cells.get(index);
            }
            Place last = cells.get(cells.size() - 1).place();
            return new Cell("", new Place(last.file(), last.line(), 0));
        }

        /** What the row is about: its first cell. */
        Cell first() {
            return cells.get(0);
        }
    }

    /**
     * Takes a text apart.
     *
     * @return the table with every row, or empty when there is no usable header; what is wrong is among the problems
     */
    static Optional<CsvTable> read(SourceText source, Columns columns, Problems problems) {
        List<CsvRecords.Line> lines = CsvRecords.of(source, problems);
        if (lines.isEmpty()) {
            problems.add(Place.of(source.file()), "the file is empty; it must begin with the header " + columns.text());
            return Optional.empty();
        }
        CsvRecords.Line first = lines.get(0);
        List<String> header =
                new ArrayList<>(first.cells().stream().map(Cell::text).toList());
        while (!header.isEmpty() && header.get(header.size() - 1).isEmpty()) {
            header.remove(header.size() - 1);
        }
        if (!columns.match(header)) {
            problems.add(
                    first.cells().get(0).place(),
                    String.join(String.valueOf(first.separator()), header),
                    "the header must be " + columns.text() + " (all separated by commas, or all by semicolons)");
            return Optional.empty();
        }
        List<Row> rows = new ArrayList<>();
        for (CsvRecords.Line line : lines.subList(1, lines.size())) {
            boolean whole = line.whole() && fits(line, header, columns.least(), problems);
            rows.add(new Row(List.copyOf(header), line.cells(), whole));
        }
        return Optional.of(new CsvTable(source.file(), rows));
    }

    private static boolean fits(CsvRecords.Line line, List<String> header, int least, Problems problems) {
        List<Cell> cells = line.cells();
        for (Cell extra : cells.subList(Math.min(header.size(), cells.size()), cells.size())) {
            if (!extra.empty()) {
                problems.add(
                        extra,
                        "one cell too many, the header has " + header.size() + "; a cell that holds a "
                                + (line.separator() == ',' ? "comma" : "semicolon")
                                + " needs quotes, a number takes a decimal point");
                return false;
            }
        }
        if (cells.size() < least) {
            problems.add(
                    cells.get(0),
                    "the row has " + cells.size() + (cells.size() == 1 ? " cell" : " cells") + ", wanted are "
                            + String.join(String.valueOf(line.separator()), header));
            return false;
        }
        return true;
    }

    String file() {
        return file;
    }

    List<Row> rows() {
        return rows;
    }
}
