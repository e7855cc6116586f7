package undermask.drive;

import undermask.unit.Worded;

/** How the three references are shaped before they meet the carrier. */
public enum Modulation implements Worded {
    /** Three sines, no zero-sequence signal. */
    SINE_TRIANGLE("sine-triangle"),
    /** Space-vector: the zero-sequence signal −(max + min)/2 centres the active vectors. */
    SPACE_VECTOR("space-vector");

    private final String words;

    Modulation(String words) {
        this.words = words;
    }

    @Override
    public String words() {
        return words;
    }
}
