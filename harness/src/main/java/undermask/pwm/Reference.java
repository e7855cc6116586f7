package undermask.pwm;

import undermask.drive.Modulation;
import undermask.unit.Figures;

/**
 * The reference of each leg over the angle of the output: M·cos(θ − 2πk/3) plus the zero-sequence signal of the scheme,
 * clipped to the carrier's span.
 *
 * <p>Source: Holmes and Lipo, Pulse Width Modulation for Power Converters (IEEE Press 2003), from memory.
 *
 * @param index modulation index M, peak of the phase fundamental over half the link voltage
 */
record Reference(Modulation modulation, double index) {
    /** M of six-step operation, the most that a bridge can give. */
    static final double SIX_STEP = 4 / Math.PI;

    private static final double ROUNDING = 1e-9;

    Reference {
        if (!(index > 0)) {
            throw new IllegalArgumentException("modulation index is " + index);
        }
        if (index > SIX_STEP * (1 + ROUNDING)) {
            throw new IllegalArgumentException("the V/f curve asks for a modulation index of "
                    + Figures.fixed(index, 3) + "; six-step, the most a bridge can give, is "
                    + Figures.fixed(SIX_STEP, 3) + ": the link voltage is too low for this output voltage");
        }
    }

    /** The largest M without clipping. */
    double linearLimit() {
        return switch (modulation) {
            case SINE_TRIANGLE -> 1;
            case SPACE_VECTOR -> 2 / Math.sqrt(3);
        };
    }

    boolean clipped() {
        return index > linearLimit() * (1 + ROUNDING);
    }

    /**
     * The reference of a leg, −1 to 1.
     *
     * @param angle θ of the output in rad
     * @param leg 0, 1 or 2
     */
    double at(double angle, int leg) {
        double own = index * Math.cos(angle - leg * 2 * Math.PI / 3);
        double shifted = switch (modulation) {
            case SINE_TRIANGLE -> own;
            case SPACE_VECTOR -> own + centring(angle);
        };
        return Math.max(-1, Math.min(1, shifted));
    }

    private double centring(double angle) {
        double a = Math.cos(angle);
        double b = Math.cos(angle - 2 * Math.PI / 3);
        double c = -a - b;
        return -index * (Math.max(a, Math.max(b, c)) + Math.min(a, Math.min(b, c))) / 2;
    }
}
