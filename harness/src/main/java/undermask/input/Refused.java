package undermask.input;

import java.util.List;
import java.util.stream.Collectors;

/** Thrown when files cannot be used as they are; carries everything that is wrong with them. */
public final class Refused extends Exception {
    private static final long serialVersionUID = 1L;

    /** Not part of the serial form: a refusal is reported where it happens. */
    private final transient List<Problem> problems;

    /**
     * Refuses for so many reasons.
     *
     * @param problems at least one, sorted by place
     */
    Refused(List<Problem> problems) {
        super(problems.stream().map(Problem::toString).collect(Collectors.joining("\n")));
        if (problems.isEmpty()) {
            throw new IllegalArgumentException("nothing to refuse");
        }
        this.problems = List.copyOf(problems);
    }

    /** Every problem of every file that was read, sorted by file, line and column. */
    public List<Problem> problems() {
        return problems;
    }
}
