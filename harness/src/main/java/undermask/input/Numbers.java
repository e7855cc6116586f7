package undermask.input;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import undermask.unit.Dimension;
import undermask.unit.Place;
import undermask.unit.Range;

/** Takes numbers out of cells, plain or with a unit, and says what is wrong with them. */
final class Numbers {
    /** Digits with a decimal point and an exponent, and nothing else that Java would take: no hex, no NaN, no suffix. */
    private static final Pattern DECIMAL = Pattern.compile("[+-]?(\\d+(\\.\\d*)?|\\.\\d+)([eE][+-]?\\d{1,3})?");

    private static final Pattern DECIMAL_COMMA =
            Pattern.compile("[+-]?\\d*(\\.\\d{3})*,\\d[\\d,]*([eE][+-]?\\d{1,3})?");
    private static final Pattern WITH_UNIT =
            Pattern.compile("([+-]?[\\d.]+(?:[eE][+-]?\\d{1,3})?)\\s*([^\\d.,;\\s][^,;\\s]*)");

    /** Prefix factors are powers of ten and 60, 3600; this rounds off what binary fractions added to them. */
    private static final MathContext FACTOR_DIGITS = new MathContext(12);

    private final Problems problems;

    Numbers(Problems problems) {
        this.problems = problems;
    }

    /**
     * A number with the unit in a cell of its own.
     *
     * @param written the number as written, a part of the value cell when that holds a list
     * @return in SI, inside the range; empty when something is wrong
     */
    OptionalDouble number(Cell written, Cell unit, Range range) {
        if (written.empty()) {
            problems.add(written, range.quantity() + " needs a value from " + range.text());
            return OptionalDouble.empty();
        }
        if (unit.empty() && refusedForUnitInside(written, range)) {
            return OptionalDouble.empty();
        }
        Optional<BigDecimal> value = decimal(written, range);
        Optional<BigDecimal> factor = factor(written, unit, range);
        if (value.isEmpty() || factor.isEmpty()) {
            return OptionalDouble.empty();
        }
        String both = unit.empty() ? written.text() : written.text() + " " + unit.text();
        return inside(value.get().multiply(factor.get()), written.place(), both, range);
    }

    /**
     * A number and its unit in one cell, one space between them: {@code 1.5 mH}; a pure number stands alone.
     *
     * @return in SI, inside the range; empty when something is wrong
     */
    OptionalDouble withUnit(Cell cell, Range range) {
        int space = cell.text().indexOf(' ');
        if (space >= 0) {
            Cell number = new Cell(cell.text().substring(0, space), cell.place());
            Cell unit = new Cell(cell.text().substring(space + 1).strip(), cell.place());
            return number(number, unit, range);
        }
        Matcher glued = WITH_UNIT.matcher(cell.text());
        if (range.dimension() != Dimension.NUMBER && !isDecimal(cell) && glued.matches()) {
            problems.add(cell, "one space goes between number and unit: " + glued.group(1) + " " + glued.group(2));
            return OptionalDouble.empty();
        }
        return number(cell, new Cell("", cell.place()), range);
    }

    /**
     * A number without unit in a column whose name tells the unit.
     *
     * @return inside the range; empty when something is wrong
     */
    OptionalDouble plain(Cell cell, Range range) {
        if (cell.empty()) {
            problems.add(cell, range.quantity() + " needs a value from " + range.text());
            return OptionalDouble.empty();
        }
        if (!isDecimal(cell) && WITH_UNIT.matcher(cell.text()).matches()) {
            problems.add(
                    cell,
                    range.quantity() + " is written as a number without unit, in "
                            + range.dimension().siSymbol());
            return OptionalDouble.empty();
        }
        Optional<BigDecimal> value = decimal(cell, range);
        return value.isPresent()
                ? inside(
                        value.get(),
                        cell.place(),
                        cell.text() + " " + range.dimension().siSymbol(),
                        range)
                : OptionalDouble.empty();
    }

    private boolean refusedForUnitInside(Cell written, Range range) {
        Matcher both = WITH_UNIT.matcher(written.text());
        boolean inside = both.matches() && Dimension.of(both.group(2)).isPresent();
        if (inside) {
            problems.add(
                    written,
                    range.quantity() + " needs its unit in a place of its own: " + both.group(1) + " as value, "
                            + both.group(2) + " as unit");
        }
        return inside;
    }

    private static boolean isDecimal(Cell cell) {
        return DECIMAL.matcher(cell.text()).matches();
    }

    private Optional<BigDecimal> decimal(Cell written, Range range) {
        String text = written.text();
        if (isDecimal(written)) {
            return Optional.of(new BigDecimal(text));
        }
        if (DECIMAL_COMMA.matcher(text).matches()) {
            problems.add(
                    written,
                    "a number takes a decimal point, no comma: " + withPoint(text)
                            + " (and no mark between thousands)");
        } else if (text.contains(";")) {
            problems.add(written, range.quantity() + " takes one value");
        } else {
            problems.add(written, range.quantity() + " must be a number with digits such as 4 or 4.5 or 2e-6");
        }
        return Optional.empty();
    }

    /** What a number with a comma means, as far as can be told: several commas stand between thousands. */
    private static String withPoint(String text) {
        boolean thousands = text.indexOf(',') != text.lastIndexOf(',');
        return thousands ? text.replace(",", "") : text.replace(".", "").replace(',', '.');
    }

    private Optional<BigDecimal> factor(Cell written, Cell unit, Range range) {
        Dimension wanted = range.dimension();
        Optional<Double> factor = wanted.factor(unit.text());
        if (factor.isPresent()) {
            return Optional.of(new BigDecimal(factor.get()).round(FACTOR_DIGITS));
        }
        Optional<Dimension> read = Dimension.of(unit.text());
        boolean digits = unit.text().chars().allMatch(c -> c >= '0' && c <= '9');
        if (unit.empty()) {
            problems.add(
                    unit.place(),
                    written.text(),
                    range.quantity() + " needs a unit of " + wanted.words() + ": " + wanted.examples());
        } else if (digits) {
            problems.add(
                    unit,
                    "not a unit; a number takes a decimal point, no comma: " + written.text() + "." + unit.text());
        } else if (wanted == Dimension.NUMBER) {
            problems.add(unit, range.quantity() + " is a pure number; the unit is left empty or is %");
        } else if (read.filter(dimension -> dimension != Dimension.NUMBER).isPresent()) {
            problems.add(
                    unit,
                    "a unit of " + read.get().words() + "; " + range.quantity() + " takes a unit of " + wanted.words()
                            + ": " + wanted.examples());
        } else {
            problems.add(
                    unit, "not a unit of " + wanted.words() + "; " + range.quantity() + " takes " + wanted.examples());
        }
        return Optional.empty();
    }

    private OptionalDouble inside(BigDecimal si, Place place, String written, Range range) {
        double value = si.doubleValue();
        if (!range.contains(value)) {
            problems.add(place, written, range.quantity() + " must be " + range.text());
            return OptionalDouble.empty();
        }
        return OptionalDouble.of(value);
    }
}
