package undermask.drive;

import undermask.unit.Worded;

/** When the reference is taken for comparison with the carrier. */
public enum CarrierSampling implements Worded {
    /** Continuously: the classic analogue comparison. */
    NATURAL("natural"),
    /** Once per carrier period, at the carrier's positive peak (symmetrical regular sampling). */
    ONCE("once"),
    /** Twice per carrier period, at both peaks (asymmetrical regular sampling). */
    TWICE("twice");

    private final String words;

    CarrierSampling(String words) {
        this.words = words;
    }

    @Override
    public String words() {
        return words;
    }
}
