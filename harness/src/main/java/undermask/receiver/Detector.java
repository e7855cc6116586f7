package undermask.receiver;

import undermask.unit.Worded;

/** The detectors of a measuring receiver (CISPR 16-1-1). */
public enum Detector implements Worded {
    PEAK("peak"),
    QUASI_PEAK("quasi-peak"),
    AVERAGE("average");

    private final String words;

    Detector(String words) {
        this.words = words;
    }

    @Override
    public String words() {
        return words;
    }
}
