package undermask.pwm;

import undermask.drive.Modulation;
import undermask.drive.Overmodulation;
import undermask.unit.Figures;

/**
 * The reference of each leg over the angle of the output: gain·cos(θ − 2πk/3) plus the zero-sequence signal of the
 * scheme, clipped to the carrier's span.
 *
 * <p>Source: Holmes and Lipo, Pulse Width Modulation for Power Converters (IEEE Press 2003); Hava, Kerkman and Lipo,
 * IEEE Trans. Power Electron. 14 (1999); both from memory.
 *
 * @param gain peak of the sines over half the link voltage, before clipping; infinite in six-step
 * @param clipped whether it lies beyond the linear range
 */
record Reference(Modulation modulation, double gain, boolean clipped) {
    /** M of six-step operation, the most that a bridge can give. */
    static final double SIX_STEP = 4 / Math.PI;

    private static final double ROUNDING = 1e-9;
    private static final int ANGLES = 3600;
    private static final double LARGEST_GAIN = 1e4;
    /** So near to six-step it is six-step. */
    private static final double NEARLY = 1e-6;

    /** The triangle of the third harmonic with a quarter leaves the span at this M; Hava (1998), from memory. */
    private static final double LIMIT_OF_QUARTER = 1 / peakWithQuarter();

    /**
     * The reference for a modulation index.
     *
     * @param index M, peak of the phase fundamental over half the link voltage
     * @throws IllegalArgumentException when M is beyond six-step
     */
    static Reference of(Modulation modulation, Overmodulation overmodulation, double index) {
        if (!(index > 0)) {
            throw new IllegalArgumentException("modulation index is " + index);
        }
        if (index > SIX_STEP * (1 + ROUNDING)) {
            throw new IllegalArgumentException("the V/f curve asks for a modulation index of "
                    + Figures.fixed(index, 3) + "; six-step, the most a bridge can give, is "
                    + Figures.fixed(SIX_STEP, 3) + ": the link voltage is too low for this output voltage");
        }
        boolean clipped = index > linearLimit(modulation) * (1 + ROUNDING);
        boolean raised = clipped && overmodulation == Overmodulation.COMPENSATED;
        return new Reference(modulation, raised ? raised(modulation, index) : index, clipped);
    }

    /** The largest M without clipping. */
    static double linearLimit(Modulation modulation) {
        return switch (modulation) {
            case SINE_TRIANGLE -> 1;
            case THIRD_HARMONIC_QUARTER -> LIMIT_OF_QUARTER;
            default -> 2 / Math.sqrt(3);
        };
    }

    /** The largest value of cos θ − cos 3θ / 4. */
    private static double peakWithQuarter() {
        // its derivative vanishes where sin²θ = 5/12
        double sin = Math.sqrt(5.0 / 12);
        double angle = Math.asin(sin);
        return Math.cos(angle) - Math.cos(3 * angle) / 4;
    }

    /** The gain at which the clipped reference has the fundamental asked for. */
    private static double raised(Modulation modulation, double index) {
        double low = index;
        double high = LARGEST_GAIN;
        if (index >= SIX_STEP * (1 - NEARLY)) {
            return Double.POSITIVE_INFINITY;
        }
        while (high - low > 1e-12 * high) {
            double middle = Math.sqrt(low * high);
            if (middle <= low || middle >= high) {
                break;
            }
            if (new Reference(modulation, middle, true).fundamental() < index) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return (low + high) / 2;
    }

    /** Peak of the fundamental of leg 0's reference. */
    private double fundamental() {
        double cos = 0;
        double sin = 0;
        for (int i = 0; i < ANGLES; i++) {
            double angle = 2 * Math.PI * (i + 0.5) / ANGLES;
            double level = at(angle, 0);
            cos += level * Math.cos(angle);
            sin += level * Math.sin(angle);
        }
        return Math.hypot(cos, sin) * 2 / ANGLES;
    }

    /** Whether the legs switch once per half-wave, without regard to a carrier. */
    boolean sixStep() {
        return Double.isInfinite(gain);
    }

    /**
     * The reference of a leg, −1 to 1.
     *
     * @param angle θ of the output in rad
     * @param leg 0, 1 or 2
     */
    double at(double angle, int leg) {
        double shifted = gain * Math.cos(angle - leg * 2 * Math.PI / 3) + zeroSequence(angle);
        return Math.max(-1, Math.min(1, shifted));
    }

    private double zeroSequence(double angle) {
        switch (modulation) {
            case SINE_TRIANGLE:
                return 0;
            case THIRD_HARMONIC_SIXTH:
                return -gain / 6 * Math.cos(3 * angle);
            case THIRD_HARMONIC_QUARTER:
                return -gain / 4 * Math.cos(3 * angle);
            default:
        }
        double a = gain * Math.cos(angle);
        double b = gain * Math.cos(angle - 2 * Math.PI / 3);
        double c = -a - b;
        double highest = Math.max(a, Math.max(b, c));
        double lowest = Math.min(a, Math.min(b, c));
        double centring = -(highest + lowest) / 2;
        // once the references span the carrier, every scheme that clamps centres: there is nothing left to clamp
        boolean centred = modulation == Modulation.SPACE_VECTOR || highest - lowest >= 2;
        if (centred) {
            return centring;
        }
        double toUpper = 1 - highest;
        double toLower = -1 - lowest;
        return switch (modulation) {
            case CLAMP_60 -> peakIsPositive(angle) ? toUpper : toLower;
            case CLAMP_30 -> peakIsPositive(angle) ? toLower : toUpper;
            case CLAMP_60_LEAD -> peakIsPositive(angle + Math.PI / 6) ? toUpper : toLower;
            case CLAMP_60_LAG -> peakIsPositive(angle - Math.PI / 6) ? toUpper : toLower;
            case CLAMP_120_UPPER -> toUpper;
            case CLAMP_120_LOWER -> toLower;
            default -> throw new IllegalStateException(modulation.words());
        };
    }

    /** Whether the sine of largest modulus is positive, which is where cos 3θ is; where two are equal, for all legs alike. */
    private static boolean peakIsPositive(double angle) {
        return Math.cos(3 * angle) >= -ROUNDING;
    }
}
