package undermask.input;

import java.util.List;
import java.util.TreeSet;
import undermask.unit.Place;

/** Collects what is wrong, each problem once, so that a run can name all of it. */
final class Problems {
    private static final int LONGEST_QUOTE = 60;

    private final TreeSet<Problem> found = new TreeSet<>();

    void add(Place place, String message) {
        found.add(new Problem(place, message));
    }

    /** Adds a problem of a cell: its text as written, in quotes, then what would be right. */
    void add(Cell cell, String wanted) {
        add(cell.place(), quote(cell.text()) + ", " + wanted);
    }

    /** Adds a problem of a text that a cell holds or stands for. */
    void add(Place place, String written, String wanted) {
        add(place, quote(written) + ", " + wanted);
    }

    boolean none() {
        return found.isEmpty();
    }

    /** All problems, sorted by place. */
    List<Problem> sorted() {
        return List.copyOf(found);
    }

    /**
     * Ends reading.
     *
     * @throws Refused when anything is wrong
     */
    void refuseAny() throws Refused {
        if (!none()) {
            throw new Refused(sorted());
        }
    }

    /** A text as written, on one line and cut short when long. */
    private static String quote(String written) {
        String line = written.replaceAll("\\s+", " ");
        int length = line.codePointCount(0, line.length());
        String shown =
                length <= LONGEST_QUOTE ? line : line.substring(0, line.offsetByCodePoints(0, LONGEST_QUOTE)) + "…";
        return "\"" + shown + "\"";
    }
}
