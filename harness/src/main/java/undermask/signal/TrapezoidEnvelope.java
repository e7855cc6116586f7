package undermask.signal;

/**
 * The published envelope of the lines of a train of equal trapezoidal pulses: flat, from 1/(πτ_pulse) on falling by 20 dB
 * per decade, from 1/(πτ) on by 40 dB.
 *
 * <p>Source: standard theory, e.g. Paul, Introduction to Electromagnetic Compatibility, from memory.
 *
 * @param height of the pulses in V
 * @param rate pulses per second
 * @param pulseWidth τ_pulse, between the middles of the edges, s
 * @param transition τ, s
 */
public record TrapezoidEnvelope(double height, double rate, double pulseWidth, double transition) {
    /** The corner from which on the width of the pulses no longer matters, Hz. */
    public double pulseCorner() {
        return 1 / (Math.PI * pulseWidth);
    }

    /** The corner from which on the edges take off, Hz. */
    public double edgeCorner() {
        return 1 / (Math.PI * transition);
    }

    /** Peak amplitude of a line at a frequency at most, V. */
    public double peak(double frequency) {
        return 2
                * height
                * pulseWidth
                * rate
                * Math.min(1, pulseCorner() / frequency)
                * Math.min(1, edgeCorner() / frequency);
    }
}
