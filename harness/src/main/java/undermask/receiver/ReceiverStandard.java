package undermask.receiver;

import undermask.unit.Worded;

/** The standard whose bandwidths and detectors a receiver follows. */
public enum ReceiverStandard implements Worded {
    /** CISPR 16-1-1: 200 Hz below 150 kHz, 9 kHz above; peak, quasi-peak, average. */
    CISPR_16("cispr-16"),
    /** MIL-STD-461G Table II: 1 kHz from 10 kHz to 150 kHz, 10 kHz above; peak and average shown, no quasi-peak. */
    MIL_STD_461("mil-std-461");

    private final String words;

    ReceiverStandard(String words) {
        this.words = words;
    }

    @Override
    public String words() {
        return words;
    }
}
