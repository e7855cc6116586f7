package undermask.signal;

/**
 * A half-sine transition, centred on the instant of the edge: E = cos(πfτ)/(1 − (2fτ)²).
 *
 * @param transitionTime τ from rail to rail in s, positive
 */
public record RaisedCosineEdge(double transitionTime) implements EdgeShape {
    /** Builds a raised-cosine edge. */
    public RaisedCosineEdge {
        EdgeShape.checkTransition(transitionTime);
    }

    @Override
    public void factor(double frequency, double[] out) {
        double y = 2 * frequency * transitionTime;
        double pole = 1 - y * y;
        // at 2fτ = 1 both parts vanish; the limit is π/4, approached with slope −π/8 in (y − 1)
        out[0] = Math.abs(pole) < 1e-6
                ? Math.PI / 4 - Math.PI / 8 * (Math.abs(y) - 1)
                : Math.cos(Math.PI / 2 * y) / pole;
        out[1] = 0;
    }

    @Override
    public double response(double time) {
        if (time <= -transitionTime / 2) {
            return 0;
        }
        return time >= transitionTime / 2 ? 1 : 0.5 * (1 + Math.sin(Math.PI * time / transitionTime));
    }
}
