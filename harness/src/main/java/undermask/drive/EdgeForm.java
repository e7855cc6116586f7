package undermask.drive;

import undermask.unit.Worded;

/** The form of a voltage edge between the rails. */
public enum EdgeForm implements Worded {
    EXPONENTIAL("exponential"),
    RAMP("ramp"),
    RAISED_COSINE("raised-cosine");

    private final String words;

    EdgeForm(String words) {
        this.words = words;
    }

    @Override
    public String words() {
        return words;
    }
}
