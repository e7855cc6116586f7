package undermask.signal;

/** A step of no duration. */
public record IdealEdge() implements EdgeShape {
    @Override
    public void factor(double frequency, double[] out) {
        out[0] = 1;
        out[1] = 0;
    }

    @Override
    public double response(double time) {
        return time < 0 ? 0 : 1;
    }

    @Override
    public double transitionTime() {
        return 0;
    }
}
