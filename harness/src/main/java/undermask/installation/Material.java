package undermask.installation;

import java.util.List;
import java.util.Objects;

/**
 * A core material: complex permeability µ′ − jµ″ over frequency, straight in logarithms between its points, and what it
 * saturates at.
 */
public final class Material {
    private static final double SMALLEST = 1e-3;

    private final String name;
    private final double[] frequencies;
    private final double[] real;
    private final double[] loss;
    private final double saturation;
    private final String source;

    /**
     * Builds a material.
     *
     * @param frequencies rising, in Hz, at least one
     * @param real µ′ at each of them, relative, positive
     * @param loss µ″ likewise, not negative
     * @param saturation flux density in T
     * @param source where the values come from
     */
    public Material(
            String name,
            List<Double> frequencies,
            List<Double> real,
            List<Double> loss,
            double saturation,
            String source) {
        this.name = Objects.requireNonNull(name);
        this.source = Objects.requireNonNull(source);
        this.frequencies = frequencies.stream().mapToDouble(Double::doubleValue).toArray();
        this.real = real.stream().mapToDouble(Double::doubleValue).toArray();
        this.loss =
                loss.stream().mapToDouble(value -> Math.max(value, SMALLEST)).toArray();
        this.saturation = saturation;
        int count = this.frequencies.length;
        if (count == 0 || this.real.length != count || this.loss.length != count) {
            throw new IllegalArgumentException("material " + name + " has " + count + " frequencies, "
                    + this.real.length + " values of mu real and " + this.loss.length + " of mu loss");
        }
        for (int i = 0; i < count; i++) {
            boolean rising = i == 0 || this.frequencies[i] > this.frequencies[i - 1];
            if (!(this.frequencies[i] > 0) || !rising || !(this.real[i] > 0)) {
                throw new IllegalArgumentException(
                        "material " + name + " needs rising frequencies and positive permeability at each");
            }
        }
        if (!(saturation > 0)) {
            throw new IllegalArgumentException("material " + name + " saturates at " + saturation + " T");
        }
    }

    public String name() {
        return name;
    }

    /** Flux density at which it saturates, T. */
    public double saturation() {
        return saturation;
    }

    public String source() {
        return source;
    }

    /** µ′ at the lowest frequency known. */
    public double initial() {
        return real[0];
    }

    /**
     * The permeability at a frequency: as at the lowest point below it, and above the highest one falling on as there.
     *
     * @param out receives µ′ and −µ″
     */
    public void permeability(double frequency, double[] out) {
        int count = frequencies.length;
        if (count == 1 || frequency <= frequencies[0]) {
            out[0] = real[0];
            out[1] = -loss[0] * (count == 1 ? 1 : frequency / frequencies[0]);
            return;
        }
        int upper = 1;
        while (upper < count - 1 && frequencies[upper] < frequency) {
            upper++;
        }
        double place =
                Math.log(frequency / frequencies[upper - 1]) / Math.log(frequencies[upper] / frequencies[upper - 1]);
        out[0] = real[upper - 1] * Math.pow(real[upper] / real[upper - 1], place);
        out[1] = -loss[upper - 1] * Math.pow(loss[upper] / loss[upper - 1], place);
    }
}
