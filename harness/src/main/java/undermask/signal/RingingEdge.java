package undermask.signal;

/**
 * An edge followed by a damped oscillation: what drives it becomes a step with overshoot·exp(−ζω_r·t)·sin(ω_d·t) added,
 * so that E is multiplied by 1 + overshoot·s·ω_d/((s + ζω_r)² + ω_d²) at s = j2πf.
 *
 * <p>Source: Laplace transforms of step and damped sine, standard tables.
 *
 * @param edge without ringing
 * @param frequency undamped, f_r = ω_r/2π, Hz
 * @param damping ratio ζ, above 0 and below 1
 * @param overshoot first amplitude over the height of the edge, before damping
 */
public record RingingEdge(EdgeShape edge, double frequency, double damping, double overshoot) implements EdgeShape {
    private static final int POINTS = 200;

    /** Builds an edge with ringing. */
    public RingingEdge {
        if (!(frequency > 0) || !(damping > 0 && damping < 1) || !(overshoot >= 0)) {
            throw new IllegalArgumentException(
                    "ringing of " + frequency + " Hz, damping " + damping + ", overshoot " + overshoot);
        }
    }

    @Override
    public void factor(double f, double[] out) {
        edge.factor(f, out);
        double omega = 2 * Math.PI * f;
        double decay = damping * 2 * Math.PI * frequency;
        double damped = Math.sqrt(1 - damping * damping) * 2 * Math.PI * frequency;
        // denominator (jω + σ)² + ω_d², numerator a·jω·ω_d
        double re = decay * decay + damped * damped - omega * omega;
        double im = 2 * decay * omega;
        double scale = overshoot * omega * damped / (re * re + im * im);
        double gainRe = 1 + scale * im;
        double gainIm = scale * re;
        double x = out[0];
        out[0] = x * gainRe - out[1] * gainIm;
        out[1] = x * gainIm + out[1] * gainRe;
    }

    @Override
    public double lead() {
        return edge.lead();
    }

    /** The plain edge and, for each slice of its rise, the oscillation that this slice leaves behind. */
    @Override
    public double response(double time) {
        double decay = damping * 2 * Math.PI * frequency;
        double damped = Math.sqrt(1 - damping * damping) * 2 * Math.PI * frequency;
        double sum = edge.response(time);
        double from = -edge.transitionTime();
        double slice = 4 * edge.transitionTime() / POINTS;
        for (int i = 0; i < POINTS; i++) {
            double start = from + i * slice;
            double since = time - (start + slice / 2);
            if (since > 0) {
                double rise = edge.response(start + slice) - edge.response(start);
                sum += overshoot * rise * Math.exp(-decay * since) * Math.sin(damped * since);
            }
        }
        return sum;
    }

    @Override
    public double reach() {
        return edge.reach() + 14 / (damping * 2 * Math.PI * frequency);
    }

    @Override
    public double transitionTime() {
        return edge.transitionTime();
    }
}
