package undermask.drive;

import undermask.unit.Worded;

/**
 * How the three references are shaped before they meet the carrier: which zero-sequence signal is added to three sines.
 */
public enum Modulation implements Worded {
    /** Three sines, no zero-sequence signal. */
    SINE_TRIANGLE("sine-triangle"),
    /** A third harmonic of a sixth of the fundamental: the widest linear range. */
    THIRD_HARMONIC_SIXTH("third-harmonic-1/6"),
    /** A third harmonic of a quarter of the fundamental: the least current ripple. */
    THIRD_HARMONIC_QUARTER("third-harmonic-1/4"),
    /** Space-vector: the zero-sequence signal −(max + min)/2 centres the active vectors. */
    SPACE_VECTOR("space-vector"),
    /** Each leg rests for 60° around each of its voltage peaks. */
    CLAMP_60("clamp-60"),
    /** The same, 30° earlier: for currents that lead. */
    CLAMP_60_LEAD("clamp-60-lead"),
    /** The same, 30° later: for currents that lag. */
    CLAMP_60_LAG("clamp-60-lag"),
    /** Each leg rests four times a period for 30°. */
    CLAMP_30("clamp-30"),
    /** Each leg rests for 120° at the upper rail. */
    CLAMP_120_UPPER("clamp-120-upper"),
    /** Each leg rests for 120° at the lower rail. */
    CLAMP_120_LOWER("clamp-120-lower");

    private final String words;

    Modulation(String words) {
        this.words = words;
    }

    @Override
    public String words() {
        return words;
    }
}
