package undermask.installation;

import java.util.Objects;

/**
 * A ring core of the catalogue, or two halves that clamp on.
 *
 * @param name as installations name it
 * @param outer diameter in m
 * @param inner diameter in m
 * @param height in m
 * @param gap of both joints together in m; 0 for a closed ring
 * @param source where the values come from
 */
public record CorePart(
        String name, Material material, double outer, double inner, double height, double gap, String source) {
    private static final double MU_0 = 4e-7 * Math.PI;

    /** Builds a core. */
    public CorePart {
        Objects.requireNonNull(name);
        Objects.requireNonNull(material);
        Objects.requireNonNull(source);
        if (!(inner > 0) || !(outer > inner) || !(height > 0) || !(gap >= 0)) {
            throw new IllegalArgumentException("core " + name + " of " + outer + " m over " + inner + " m, height "
                    + height + " m, gap " + gap + " m");
        }
    }

    /** Cross-section of the flux, m². */
    public double area() {
        return (outer - inner) / 2 * height;
    }

    /** Mean length of the flux, m: that of the ring whose inductance the core has. */
    public double length() {
        return Math.PI * (outer - inner) / Math.log(outer / inner);
    }

    /** Magnetizing field in A/m that saturates the ring at a permeability of its lowest frequency. */
    public double saturationField() {
        return material.saturation() / (MU_0 * effectiveInitial());
    }

    /** µ of ring and gap together at low frequency. */
    public double effectiveInitial() {
        return material.initial() / (1 + material.initial() * gap / length());
    }

    /**
     * Impedance of one turn at a frequency, ohm: jωµ0(µ′ − jµ″)·A/l, the gap in series with the ring.
     *
     * @param share of the permeability that saturation leaves, 0 to 1
     * @param out receives real and imaginary part
     */
    public void impedance(double frequency, double share, double[] out) {
        material.permeability(frequency, out);
        double re = out[0] * share;
        double im = out[1] * share;
        // µ/(1 + µ·g/l)
        double downRe = 1 + re * gap / length();
        double downIm = im * gap / length();
        double square = downRe * downRe + downIm * downIm;
        double effectiveRe = (re * downRe + im * downIm) / square;
        double effectiveIm = (im * downRe - re * downIm) / square;
        double scale = 2 * Math.PI * frequency * MU_0 * area() / length();
        out[0] = -scale * effectiveIm;
        out[1] = scale * effectiveRe;
    }
}
