package undermask.receiver;

import java.util.List;
import undermask.unit.Worded;

/** The standard whose bandwidths and detectors a receiver follows. */
public enum ReceiverStandard implements Worded {
    /** CISPR 16-1-1: 200 Hz below 150 kHz, 9 kHz above; peak, quasi-peak, average. */
    CISPR_16("cispr-16", Band.CISPR_A, Band.CISPR_B),
    /** MIL-STD-461G Table II: 1 kHz from 10 kHz to 150 kHz, 10 kHz above; peak and average shown, no quasi-peak. */
    MIL_STD_461("mil-std-461", Band.MIL_LOW, Band.MIL_HIGH);

    private final String words;
    private final Band low;
    private final Band high;

    ReceiverStandard(String words, Band low, Band high) {
        this.words = words;
        this.low = low;
        this.high = high;
    }

    /** The bands from low to high, the second beginning where the first ends. */
    public List<Band> bands() {
        return List.of(low, high);
    }

    @Override
    public String words() {
        return words;
    }
}
