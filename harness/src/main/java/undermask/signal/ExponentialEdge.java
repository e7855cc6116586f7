package undermask.signal;

/**
 * An exponential approach with time constant τ/2, advanced by τ/2 so that its centre of gravity is the instant of the
 * edge: E = exp(jπfτ)/(1 + jπfτ). Its corner is 1/(πτ), that of the classic trapezoid envelope, and it has no nulls.
 *
 * @param transitionTime τ in s, positive
 */
public record ExponentialEdge(double transitionTime) implements EdgeShape {
    /** Builds an exponential edge. */
    public ExponentialEdge {
        EdgeShape.checkTransition(transitionTime);
    }

    @Override
    public void factor(double frequency, double[] out) {
        double x = Math.PI * frequency * transitionTime;
        double cos = Math.cos(x);
        double sin = Math.sin(x);
        double squared = 1 + x * x;
        out[0] = (cos + x * sin) / squared;
        out[1] = (sin - x * cos) / squared;
    }

    @Override
    public double response(double time) {
        double since = time + transitionTime / 2;
        return since <= 0 ? 0 : -Math.expm1(-2 * since / transitionTime);
    }
}
