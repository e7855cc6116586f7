package undermask.receiver;

/**
 * The selectivity of a receiver: a Gaussian over the distance from the tuned frequency, 1 at its centre. CISPR 16-1-1
 * fixes the 6 dB bandwidth; the Gaussian is the usual form of filters that do not ring.
 *
 * @param bandwidth 6 dB bandwidth in Hz, positive
 */
public record GaussianResponse(double bandwidth) {
    /** Distance in standard deviations beyond which a line counts for nothing: 59 dB down, a tail of 0.002 dB. */
    static final double REACH = 3.7;

    /** Builds a response; the bandwidth must be positive and finite. */
    public GaussianResponse {
        if (!(bandwidth > 0 && bandwidth < Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException("bandwidth is " + bandwidth + " Hz; allowed: above 0");
        }
    }

    /** Standard deviation over frequency in Hz: B₆ / (2·√(2·ln 2)). */
    public double sigma() {
        return bandwidth / (2 * Math.sqrt(2 * Math.log(2)));
    }

    /** Standard deviation in s of the envelope that an impulse leaves: 1/(2πσ). */
    public double pulseSigma() {
        return 1 / (2 * Math.PI * sigma());
    }

    /**
     * Amplitude factor of a line.
     *
     * @param offset distance from the tuned frequency in Hz
     */
    public double at(double offset) {
        double deviations = offset / sigma();
        return Math.exp(-deviations * deviations / 2);
    }

    /** Impulse bandwidth in Hz, the integral of the response: σ·√(2π), 1.064 times the 6 dB bandwidth. */
    public double impulseBandwidth() {
        return sigma() * Math.sqrt(2 * Math.PI);
    }
}
