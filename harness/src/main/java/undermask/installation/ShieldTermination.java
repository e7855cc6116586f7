package undermask.installation;

import undermask.unit.Worded;

/** How the shield of the motor lead is connected. */
public enum ShieldTermination implements Worded {
    /** A clamp around the whole shield at both ends. */
    ALL_ROUND("all-round"),
    /** A twisted tail at both ends. */
    PIGTAIL("pigtail"),
    /** At the drive only. */
    ONE_END("one-end"),
    /** Nowhere. */
    NONE("none");

    private final String words;

    ShieldTermination(String words) {
        this.words = words;
    }

    @Override
    public String words() {
        return words;
    }
}
