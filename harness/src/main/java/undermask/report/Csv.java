package undermask.report;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.List;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVPrinter;
import undermask.unit.Figures;

/** A table on its way to a file: header first, a point as decimal mark, line feeds, the same bytes everywhere. */
final class Csv {
    private static final CSVFormat FORMAT =
            CSVFormat.DEFAULT.builder().setRecordSeparator('\n').get();
    /** A spreadsheet takes a text that begins so for a formula. */
    private static final String FORMULA_SIGNS = "=+-@\t\r";

    private final StringBuilder text = new StringBuilder();
    private final CSVPrinter printer;

    Csv(List<String> header) {
        try {
            printer = new CSVPrinter(text, FORMAT);
            printer.printRecord(header);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    void row(Object... cells) {
        try {
            printer.printRecord(cells);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    @Override
    public String toString() {
        return text.toString();
    }

    /** A text of the user's as a cell: what a spreadsheet would take for a formula gets an apostrophe in front. */
    static String text(String value) {
        return !value.isEmpty() && FORMULA_SIGNS.indexOf(value.charAt(0)) >= 0 ? "'" + value : value;
    }

    /** A frequency in Hz. */
    static String frequency(double hertz) {
        return Figures.significant(hertz, 10);
    }

    /** A level or margin in dB with two decimals; empty for NaN. */
    static String level(double decibels) {
        return Double.isNaN(decibels) ? "" : Figures.fixed(decibels, 2);
    }
}
