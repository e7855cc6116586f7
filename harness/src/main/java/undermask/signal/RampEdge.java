package undermask.signal;

/**
 * A linear ramp, centred on the instant of the edge: E = sin(πfτ)/(πfτ).
 *
 * @param transitionTime τ from rail to rail in s, positive
 */
public record RampEdge(double transitionTime) implements EdgeShape {
    /** Builds a ramp. */
    public RampEdge {
        EdgeShape.checkTransition(transitionTime);
    }

    @Override
    public void factor(double frequency, double[] out) {
        double x = Math.PI * frequency * transitionTime;
        out[0] = Math.abs(x) < 1e-6 ? 1 - x * x / 6 : Math.sin(x) / x;
        out[1] = 0;
    }

    @Override
    public double response(double time) {
        return Math.min(1, Math.max(0, 0.5 + time / transitionTime));
    }
}
