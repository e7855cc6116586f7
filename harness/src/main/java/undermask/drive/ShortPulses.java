package undermask.drive;

import undermask.unit.Worded;

/** What becomes of a pulse or a gap that is shorter than the minimum pulse width. */
public enum ShortPulses implements Worded {
    /** It is left out. */
    DROP("drop"),
    /** It is held for the minimum. */
    HOLD("hold");

    private final String words;

    ShortPulses(String words) {
        this.words = words;
    }

    @Override
    public String words() {
        return words;
    }
}
