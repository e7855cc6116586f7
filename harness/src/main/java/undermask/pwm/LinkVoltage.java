package undermask.pwm;

/**
 * The voltage of the DC link in steady state: its mean and the ripple that rectifier, capacitor and load leave on it.
 */
public final class LinkVoltage {
    private static final int HARMONICS = 12;
    private static final int ANGLES = 1440;

    private final double mean;
    private final double rippleHz;
    private final double peakToPeak;
    /** Cosine and sine amplitudes of the ripple's harmonics in V, from the first on. */
    private final double[] cosines;

    private final double[] sines;

    private LinkVoltage(double mean, double rippleHz, double peakToPeak, double[] cosines, double[] sines) {
        this.mean = mean;
        this.rippleHz = rippleHz;
        this.peakToPeak = peakToPeak;
        this.cosines = cosines;
        this.sines = sines;
    }

    /** A voltage without ripple. */
    public static LinkVoltage constant(double volts) {
        if (!(volts > 0)) {
            throw new IllegalArgumentException("link voltage is " + volts + " V");
        }
        return new LinkVoltage(volts, 0, 0, new double[0], new double[0]);
    }

    /**
     * The link behind an uncontrolled bridge on stiff mains. The capacitor follows the rectified mains while these charge
     * it and else feeds a load of constant power: v² falls evenly.
     *
     * @param pulses rectified half-waves per mains period, 2 or 6
     * @param peak of the rectified mains in V
     * @param mainsHz mains frequency
     * @param capacitance of the link in F
     * @param power that the load takes, W; 0 or more
     */
    public static LinkVoltage rectified(int pulses, double peak, double mainsHz, double capacitance, double power) {
        if (!(power > 0)) {
            return constant(peak);
        }
        double span = 2 * Math.PI / pulses;
        double fall = 2 * power / (2 * Math.PI * mainsHz * capacitance);
        // the mains fall faster than the load discharges the capacitor from this angle on
        double share = fall / (peak * peak);
        double release = share >= 1 ? Math.PI / 4 : Math.asin(share) / 2;
        double left = Math.min(release, span / 2);
        double sum = 0;
        double low = peak;
        double[] cosines = new double[HARMONICS];
        double[] sines = new double[HARMONICS];
        for (int i = 0; i < ANGLES; i++) {
            double angle = span * (i + 0.5) / ANGLES;
            double mains = peak * Math.max(Math.abs(Math.cos(angle)), Math.abs(Math.cos(angle - span)));
            double held = Math.sqrt(Math.max(0, Math.pow(peak * Math.cos(left), 2) - fall * (angle - left)));
            double volts = angle > left ? Math.max(mains, held) : mains;
            sum += volts;
            low = Math.min(low, volts);
            for (int h = 1; h <= HARMONICS; h++) {
                double place = 2 * Math.PI * h * (i + 0.5) / ANGLES;
                cosines[h - 1] += volts * Math.cos(place) * 2 / ANGLES;
                sines[h - 1] += volts * Math.sin(place) * 2 / ANGLES;
            }
        }
        return new LinkVoltage(sum / ANGLES, pulses * mainsHz, peak - low, cosines, sines);
    }

    /** This voltage with its ripple moved to a frequency. */
    LinkVoltage withRippleAt(double hz) {
        return new LinkVoltage(mean, hz, peakToPeak, cosines, sines);
    }

    /** Mean in V. */
    public double mean() {
        return mean;
    }

    /** Frequency of the ripple in Hz; 0 without ripple. */
    public double rippleHz() {
        return rippleHz;
    }

    /** Ripple from lowest to highest voltage, V. */
    public double peakToPeak() {
        return peakToPeak;
    }

    /** The voltage at a time in V; the mains stand at a peak at t = 0. */
    double at(double time) {
        double volts = mean;
        if (rippleHz > 0) {
            double angle = 2 * Math.PI * rippleHz * time;
            for (int h = 1; h <= HARMONICS; h++) {
                volts += cosines[h - 1] * Math.cos(h * angle) + sines[h - 1] * Math.sin(h * angle);
            }
        }
        return volts;
    }

    /** The highest frequency of the ripple's harmonics, Hz. */
    double highestHz() {
        return HARMONICS * rippleHz;
    }
}
