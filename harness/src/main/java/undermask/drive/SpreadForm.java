package undermask.drive;

import undermask.unit.Worded;

/** How a spread carrier moves about its set frequency. */
public enum SpreadForm implements Worded {
    NONE("none"),
    /** A new frequency for each carrier period, uniform within the deviation, from a seed. */
    RANDOM("random"),
    /** Up and down in straight lines. */
    TRIANGLE("triangle"),
    SINE("sine");

    private final String words;

    SpreadForm(String words) {
        this.words = words;
    }

    @Override
    public String words() {
        return words;
    }
}
