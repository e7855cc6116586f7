package undermask.input;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import undermask.unit.Dimension;
import undermask.unit.Range;

/** A row of a part table: number and unit share a cell. */
final class PartRow {
    private final CsvTable.Row row;
    private final Problems problems;
    private final Numbers numbers;
    private boolean right = true;

    PartRow(CsvTable.Row row, Problems problems) {
        this.row = row;
        this.problems = problems;
        this.numbers = new Numbers(problems);
    }

    /** The part of this row; empty when anything is wrong, which the problems say. */
    <T> Optional<T> make(PartTable.Maker<T> maker) {
        try {
            T part = maker.make(this);
            return right ? Optional.of(part) : Optional.empty();
        } catch (IllegalArgumentException contradiction) {
            if (right) {
                problems.add(row.first(), contradiction.getMessage());
            }
            return Optional.empty();
        }
    }

    String text(String column) {
        return row.cell(column).text();
    }

    /** A number in SI; NaN when it is not right, which is reported. */
    double number(String column, Dimension dimension, double low, double high) {
        OptionalDouble value = numbers.withUnit(row.cell(column), new Range(column, dimension, low, high));
        right &= value.isPresent();
        return value.orElse(Double.NaN);
    }

    /** One number or several with semicolons between them; empty when one is not right, which is reported. */
    List<Double> numbers(String column, Dimension dimension, double low, double high) {
        Cell all = row.cell(column);
        List<Double> values = new ArrayList<>();
        for (String part : all.text().split(";", -1)) {
            OptionalDouble value =
                    numbers.withUnit(new Cell(part.strip(), all.place()), new Range(column, dimension, low, high));
            right &= value.isPresent();
            values.add(value.orElse(Double.NaN));
        }
        return values;
    }

    /** Whether a column is there and filled. */
    boolean gives(String column) {
        return !row.cell(column).empty();
    }

    /** Yes or no, or a stand-by when the column is not filled. */
    boolean yes(String column, boolean otherwise) {
        if (!gives(column)) {
            return otherwise;
        }
        Cell cell = row.cell(column);
        if (!cell.text().equals("yes") && !cell.text().equals("no")) {
            right = false;
            problems.add(cell, column + " must be yes or no");
        }
        return cell.text().equals("yes");
    }

    /** A part of another table; empty when it is unknown, which is reported. */
    <T> Optional<T> part(String column, PartTable<T> table) {
        Optional<T> part = table.named(row.cell(column));
        right &= part.isPresent();
        return part;
    }

    /** One of two counts; 0 when it is neither, which is reported. */
    int count(String column, int one, int other) {
        Cell cell = row.cell(column);
        for (int value : new int[] {one, other}) {
            if (cell.text().equals(Integer.toString(value))) {
                return value;
            }
        }
        right = false;
        problems.add(cell, column + " must be " + one + " or " + other);
        return 0;
    }
}
