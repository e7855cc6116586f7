package undermask.network;

import undermask.unit.Worded;

/** The artificial mains networks that limits are written for. */
public enum MainsNetwork implements Worded {
    /** CISPR 16-1-2, 50 Ω ∥ (50 µH + 5 Ω), 9 kHz to 30 MHz. */
    CISPR_9_KHZ("cispr-50uh-5ohm"),
    /** CISPR 16-1-2, 50 Ω ∥ 50 µH, 150 kHz to 30 MHz. */
    CISPR_150_KHZ("cispr-50uh"),
    /** MIL-STD-461G figure 6, 50 µH, 10 kHz to 10 MHz. */
    MIL_STD_461("mil-std-461");

    private final String words;

    MainsNetwork(String words) {
        this.words = words;
    }

    @Override
    public String words() {
        return words;
    }
}
