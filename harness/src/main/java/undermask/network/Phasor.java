package undermask.network;

/**
 * A complex voltage, current or impedance at one frequency.
 *
 * @param re real part
 * @param im imaginary part
 */
public record Phasor(double re, double im) {
    public double modulus() {
        return Math.hypot(re, im);
    }

    /** The angle in degrees, −180 to 180. */
    public double angleDegrees() {
        return Math.toDegrees(Math.atan2(im, re));
    }

    public Phasor minus(Phasor other) {
        return new Phasor(re - other.re, im - other.im);
    }

    public Phasor times(double factor) {
        return new Phasor(re * factor, im * factor);
    }
}
