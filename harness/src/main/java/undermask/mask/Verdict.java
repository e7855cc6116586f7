package undermask.mask;

import undermask.unit.Worded;

/** How a level stands to its limit. */
public enum Verdict implements Worded {
    /** The required margin is kept. */
    CLEAR("clear"),
    /** Under the limit, but the required margin is not kept. */
    TIGHT("tight"),
    /** Above the limit. */
    OVER("over");

    private final String words;

    Verdict(String words) {
        this.words = words;
    }

    @Override
    public String words() {
        return words;
    }

    /** The verdict on an unrounded margin; a level exactly on the limit is under it. */
    public static Verdict of(double marginDb, double requiredDb) {
        if (!(marginDb >= 0)) {
            return OVER;
        }
        return marginDb >= requiredDb ? CLEAR : TIGHT;
    }

    /** The worse of two verdicts. */
    public Verdict worse(Verdict other) {
        return compareTo(other) >= 0 ? this : other;
    }
}
