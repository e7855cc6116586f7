package undermask.signal;

/**
 * An exponential approach with time constant τ/2, advanced by τ/2 so that its centre of gravity is the instant of the
 * edge: E = 1/(1 + jπfτ) from its start. Its corner is 1/(πτ), that of the classic trapezoid envelope, and it has no nulls.
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
        out[0] = 1 / (1 + x * x);
        out[1] = -x * out[0];
    }

    @Override
    public double lead() {
        return transitionTime / 2;
    }

    @Override
    public double response(double time) {
        double since = time + lead();
        return since <= 0 ? 0 : -Math.expm1(-2 * since / transitionTime);
    }
}
