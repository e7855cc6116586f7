package undermask.input;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.function.Supplier;
import java.util.stream.Collectors;
import undermask.unit.Place;
import undermask.unit.Range;
import undermask.unit.Worded;

/**
 * A quantity file: {@code quantity,value,unit,note}, a row per quantity.
 *
 * <p>What is asked for is what is known: after the last question {@link #rejectUnknown} names every row that nobody asked
 * for. A question that finds something wrong reports it and answers with a stand-in (NaN, null or an empty list);
 * {@link #record} sees to it that no stand-in gets into anything that is used.
 */
final class QuantityTable {
    private static final int MOST_LISTED = 12;

    private static final CsvTable.Columns COLUMNS =
            new CsvTable.Columns(List.of("quantity", "value", "unit", "note"), List.of(), 3);

    private final String file;
    private final String about;
    private final Problems problems;
    private final Numbers numbers;
    private final Map<String, CsvTable.Row> rows = new LinkedHashMap<>();
    private final Set<String> asked = new LinkedHashSet<>();
    private int standIns;

    /**
     * Holds the rows of a table.
     *
     * @param about what the file describes, with its article: {@code a profile}
     */
    private QuantityTable(CsvTable table, String about, Problems problems) {
        this.file = table.file();
        this.about = about;
        this.problems = problems;
        this.numbers = new Numbers(problems);
        for (CsvTable.Row row : table.rows()) {
            CsvTable.Row first = rows.putIfAbsent(row.first().text(), row);
            if (first != null) {
                problems.add(
                        row.first(),
                        "given twice, first in line " + first.first().place().line());
            }
        }
    }

    /** Reads a file; empty when there are no rows to ask, which the problems explain. */
    static Optional<QuantityTable> read(SourceText source, String about, Problems problems) {
        return CsvTable.read(source, COLUMNS, problems).map(table -> new QuantityTable(table, about, problems));
    }

    /** A number in SI that must be given, NaN when it is not right. */
    double number(Range range) {
        if (!has(range.quantity())) {
            missing(range.quantity(), "must be " + range.text());
        }
        return optional(range).orElse(Double.NaN);
    }

    /** A number in SI, or a stand-by when the file does not give it. */
    double number(Range range, double otherwise) {
        return has(range.quantity()) ? number(range) : otherwise;
    }

    /** A number in SI when the file gives it; empty also when it is not right. */
    OptionalDouble optional(Range range) {
        if (!has(range.quantity())) {
            return OptionalDouble.empty();
        }
        CsvTable.Row row = rows.get(range.quantity());
        OptionalDouble value =
                row.whole() ? numbers.number(row.cell("value"), row.cell("unit"), range) : OptionalDouble.empty();
        if (value.isEmpty()) {
            standIns++;
        }
        return value;
    }

    /** One number or several with semicolons between them, all in the unit of the row; empty when one is not right. */
    List<Double> numbers(Range range) {
        if (!has(range.quantity())) {
            missing(range.quantity(), "must be " + range.text() + ", one value or several with semicolons");
            return List.of();
        }
        CsvTable.Row row = rows.get(range.quantity());
        List<Double> values = new ArrayList<>();
        boolean right = row.whole();
        if (right) {
            Cell all = row.cell("value");
            Map<String, OptionalDouble> read = new HashMap<>();
            for (String part : all.text().split(";", -1)) {
                // a unit that is wrong is wrong for all parts alike: the problems keep one of equals
                Cell written = new Cell(part.strip(), all.place());
                OptionalDouble value =
                        read.computeIfAbsent(written.text(), text -> numbers.number(written, row.cell("unit"), range));
                right &= value.isPresent();
                values.add(value.orElse(Double.NaN));
            }
        }
        if (!right) {
            standIns++;
        }
        return right ? values : List.of();
    }

    /** A count without unit that must be one of a few. */
    int count(String quantity, int... allowed) {
        String wanted =
                "must be " + Arrays.stream(allowed).mapToObj(Integer::toString).collect(Collectors.joining(" or "));
        Optional<Cell> cell = word(quantity, wanted);
        for (int value : allowed) {
            if (cell.isPresent() && cell.get().text().equals(Integer.toString(value))) {
                return value;
            }
        }
        cell.ifPresent(written -> refuse(written, quantity + " " + wanted));
        return 0;
    }

    /** A choice that must be given. */
    <T extends Enum<T> & Worded> T choice(String quantity, Class<T> choices) {
        List<T> all = List.of(choices.getEnumConstants());
        String wanted =
                "must be " + String.join(" or ", all.stream().map(Worded::words).toList());
        Optional<Cell> cell = word(quantity, wanted);
        Optional<T> chosen = cell.flatMap(written ->
                all.stream().filter(one -> one.words().equals(written.text())).findFirst());
        if (cell.isPresent() && chosen.isEmpty()) {
            refuse(cell.get(), quantity + " " + wanted);
        }
        return chosen.orElse(null);
    }

    /** A choice, or a stand-by when the file does not make it. */
    <T extends Enum<T> & Worded> T choice(String quantity, Class<T> choices, T otherwise) {
        return has(quantity) ? choice(quantity, choices) : otherwise;
    }

    /** Yes or no, or a stand-by when the file says neither. */
    boolean yes(String quantity, boolean otherwise) {
        if (!has(quantity)) {
            return otherwise;
        }
        Optional<Cell> cell = word(quantity, "must be yes or no");
        boolean yes = cell.isPresent() && cell.get().text().equals("yes");
        if (cell.isPresent() && !yes && !cell.get().text().equals("no")) {
            refuse(cell.get(), quantity + " must be yes or no");
        }
        return yes;
    }

    /**
     * A word without unit that must be given.
     *
     * @param wanted what it must be, for the message
     * @return empty when it is missing, which is reported
     */
    Optional<Cell> word(String quantity, String wanted) {
        if (!has(quantity)) {
            missing(quantity, wanted);
            return Optional.empty();
        }
        CsvTable.Row row = rows.get(quantity);
        if (!row.whole()) {
            standIns++;
            return Optional.empty();
        }
        if (!row.cell("unit").empty()) {
            refuse(row.cell("unit"), quantity + " takes no unit");
        }
        if (row.cell("value").empty()) {
            refuse(row.cell("value"), quantity + " " + wanted);
            return Optional.empty();
        }
        return Optional.of(row.cell("value"));
    }

    /**
     * Builds something out of answers of this table.
     *
     * @param telling the quantity whose row a contradiction points at
     * @param build asks the questions and builds; what it throws when it was given a stand-in is no matter
     * @return empty when an answer was not right or the answers contradict each other; the problems say so
     */
    <T> Optional<T> record(String telling, Supplier<T> build) {
        int before = standIns;
        T built = null;
        try {
            built = build.get();
        } catch (IllegalArgumentException | NullPointerException contradiction) {
            if (standIns == before) {
                if (contradiction instanceof NullPointerException) {
                    throw contradiction;
                }
                refuse(written(telling), contradiction.getMessage());
            }
        }
        return standIns == before ? Optional.of(built) : Optional.empty();
    }

    /** Something built before, or a stand-in where it could not be built. */
    <T> T built(Optional<T> part) {
        if (part.isEmpty()) {
            standIns++;
        }
        return part.orElse(null);
    }

    /** Reports a value that is not right. */
    void refuse(Cell cell, String wanted) {
        standIns++;
        problems.add(cell, wanted);
    }

    /** The value of a quantity as written, with its unit; the file as a whole when it is not given. */
    Cell written(String quantity) {
        if (!has(quantity)) {
            return new Cell(quantity, Place.of(file));
        }
        Cell value = rows.get(quantity).cell("value");
        String unit = rows.get(quantity).cell("unit").text();
        return new Cell((value.text() + " " + unit).strip(), value.place());
    }

    /** Where the value of each quantity stands. */
    Map<String, Place> places() {
        return rows.entrySet().stream()
                .collect(Collectors.toMap(
                        Map.Entry::getKey, row -> row.getValue().cell("value").place()));
    }

    /** Reports every row that no question was about. */
    void rejectUnknown() {
        for (Map.Entry<String, CsvTable.Row> row : rows.entrySet()) {
            if (!asked.contains(row.getKey()) && row.getValue().whole()) {
                Optional<String> nearest = NearestName.of(row.getKey(), asked);
                problems.add(
                        row.getValue().first(),
                        "not a quantity of " + about
                                + nearest.map(name -> "; nearest: " + name)
                                        .orElseGet(() -> asked.size() > MOST_LISTED
                                                ? "; the README lists them"
                                                : "; known are "
                                                        + asked.stream()
                                                                .sorted()
                                                                .collect(Collectors.joining(", "))));
            }
        }
    }

    /** Every quantity that was asked for. */
    Set<String> asked() {
        return Set.copyOf(asked);
    }

    /** Whether the file has a row for a quantity, right or wrong. */
    boolean gives(String quantity) {
        return has(quantity);
    }

    private boolean has(String quantity) {
        asked.add(quantity);
        return rows.containsKey(quantity);
    }

    private void missing(String quantity, String wanted) {
        standIns++;
        problems.add(Place.of(file), quantity, "this quantity is missing; " + wanted);
    }
}
