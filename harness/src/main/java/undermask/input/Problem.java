package undermask.input;

import java.util.Comparator;
import java.util.Objects;
import undermask.unit.Place;

/**
 * What is wrong in an input file.
 *
 * @param place where
 * @param message what was read, in quotes, and what would be right
 */
public record Problem(Place place, String message) implements Comparable<Problem> {
    private static final Comparator<Problem> BY_PLACE =
            Comparator.comparing(Problem::place).thenComparing(Problem::message);

    /** Builds a problem. */
    public Problem {
        Objects.requireNonNull(place);
        Objects.requireNonNull(message);
    }

    /** {@code file:line:column: message}. */
    @Override
    public String toString() {
        return place + ": " + message;
    }

    @Override
    public int compareTo(Problem other) {
        return BY_PLACE.compare(this, other);
    }
}
