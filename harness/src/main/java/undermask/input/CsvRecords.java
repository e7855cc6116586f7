package undermask.input;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.List;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;

/**
 * Finds where records and cells stand and has Commons CSV read them, one record at a time: the parser knows no place of a
 * cell, and a single bad quote would end its reading.
 */
final class CsvRecords {
    private static final char QUOTE = '"';
    private static final CSVFormat COMMAS = CSVFormat.Builder.create()
            .setDelimiter(',')
            .setQuote(QUOTE)
            .setIgnoreSurroundingSpaces(true)
            .setIgnoreEmptyLines(false)
            .get();
    private static final CSVFormat SEMICOLONS =
            CSVFormat.Builder.create(COMMAS).setDelimiter(';').get();

    private CsvRecords() {}

    /**
     * A record that is neither blank nor a comment.
     *
     * @param cells at least one
     * @param separator comma or semicolon
     * @param whole false when the record is damaged; the problems say how
     */
    record Line(List<Cell> cells, char separator, boolean whole) {}

    /**
     * Where the cells of a record stand.
     *
     * @param starts offset of the first character of each, the quote of a quoted one
     * @param end offset of the line feed that ends it, or the end of the text
     * @param fault offset of a quote that is never closed as it should be, or -1
     */
    private record Spans(List<Integer> starts, int end, int fault) {}

    /** All records; the first one, which is the header, tells the separator. */
    static List<Line> of(SourceText source, Problems problems) {
        String text = source.text();
        List<Line> lines = new ArrayList<>();
        char separator = 0;
        int from = 0;
        while (from < text.length()) {
            int lineEnd = source.lineEnd(from);
            String line = text.substring(from, lineEnd);
            if (line.isBlank() || line.stripLeading().startsWith("#")) {
                from = lineEnd + 1;
                continue;
            }
            if (separator == 0) {
                separator = separatorOf(line);
            }
            int end = lineEnd;
            Spans spans = spans(text, from, separator);
            if (spans.fault() >= 0) {
                // what follows may be sound: give up this line alone
                end = source.lineEnd(spans.fault());
                String mark = separator == ',' ? "comma" : "semicolon";
                problems.add(
                        source.place(spans.fault()),
                        text.substring(spans.fault(), end),
                        "the quotes around this cell must close right before the next " + mark
                                + " or the line's end, a quote inside is doubled; a cell of several lines may hold no "
                                + mark + " after its first");
                lines.add(new Line(List.of(firstCell(source, from, lineEnd, separator)), separator, false));
            } else {
                end = spans.end();
                List<Cell> cells = cells(source, from, spans, separator);
                boolean blank = cells.stream().allMatch(Cell::empty);
                if (!blank && !cells.get(0).text().startsWith("#")) {
                    boolean damaged =
                            cells.stream().anyMatch(cell -> cell.text().indexOf(SourceText.DAMAGED) >= 0);
                    lines.add(new Line(cells, separator, !damaged));
                }
            }
            from = end + 1;
        }
        return lines;
    }

    private static char separatorOf(String header) {
        int commas = header.length() - header.replace(",", "").length();
        int semicolons = header.length() - header.replace(";", "").length();
        return semicolons > commas ? ';' : ',';
    }

    private static Cell firstCell(SourceText source, int from, int lineEnd, char separator) {
        String line = source.text().substring(from, lineEnd);
        int end = line.indexOf(separator);
        String text = end < 0 ? line : line.substring(0, end);
        return new Cell(strip(text), source.place(from));
    }

    private static Spans spans(String text, int recordStart, char separator) {
        List<Integer> starts = new ArrayList<>();
        int i = recordStart;
        while (true) {
            i = afterSpaces(text, i);
            int from = i;
            if (i < text.length() && text.charAt(i) == QUOTE) {
                int closed = afterClosingQuote(text, from, separator);
                i = closed < 0 ? closed : afterSpaces(text, closed);
                if (i < 0 || (i < text.length() && text.charAt(i) != separator && text.charAt(i) != '\n')) {
                    return new Spans(starts, -1, from);
                }
            } else {
                while (i < text.length() && text.charAt(i) != separator && text.charAt(i) != '\n') {
                    i++;
                }
            }
            starts.add(from);
            if (i >= text.length() || text.charAt(i) == '\n') {
                return new Spans(starts, i, -1);
            }
            i++;
        }
    }

    private static int afterSpaces(String text, int from) {
        int i = from;
        while (i < text.length() && Character.isWhitespace(text.charAt(i)) && text.charAt(i) != '\n') {
            i++;
        }
        return i;
    }

    /**
     * The offset behind the quote that closes the one at an offset, or -1 when none does. A separator in a further line
     * of the cell counts as none: a quote forgotten in one row must not swallow other rows up to the next quote.
     */
    private static int afterClosingQuote(String text, int opening, char separator) {
        int i = text.indexOf(QUOTE, opening + 1);
        while (i >= 0 && i + 1 < text.length() && text.charAt(i + 1) == QUOTE) {
            i = text.indexOf(QUOTE, i + 2);
        }
        if (i < 0) {
            return -1;
        }
        int lineEnd = text.indexOf('\n', opening);
        boolean swallows =
                lineEnd >= 0 && lineEnd < i && text.substring(lineEnd, i).indexOf(separator) >= 0;
        return swallows ? -1 : i + 1;
    }

    private static List<Cell> cells(SourceText source, int from, Spans spans, char separator) {
        CSVRecord values = parse(source.text().substring(from, spans.end()), separator);
        if (values.size() != spans.starts().size()) {
            throw new IllegalStateException("a record of " + source.file() + " was taken apart in two ways");
        }
        List<Cell> cells = new ArrayList<>();
        for (int i = 0; i < values.size(); i++) {
            cells.add(new Cell(strip(values.get(i)), source.place(spans.starts().get(i))));
        }
        return cells;
    }

    private static CSVRecord parse(String text, char separator) {
        try (CSVParser parser = CSVParser.parse(text, separator == ',' ? COMMAS : SEMICOLONS)) {
            return parser.iterator().next();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** Without spaces around it, no-break spaces of text processors included. */
    private static String strip(String text) {
        int from = 0;
        int to = text.length();
        while (from < to && isAnySpace(text.charAt(from))) {
            from++;
        }
        while (to > from && isAnySpace(text.charAt(to - 1))) {
            to--;
        }
        return text.substring(from, to);
    }

    private static boolean isAnySpace(char c) {
        return Character.isWhitespace(c) || Character.isSpaceChar(c);
    }
}
