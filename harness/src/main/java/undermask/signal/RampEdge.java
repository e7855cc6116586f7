package undermask.signal;

public record RampEdge(double transitionTime) implements EdgeShape {
    @Override
    public void factor(double frequency, double[] out) {
        throw new UnsupportedOperationException();
    }

    @Override
    public double response(double time) {
        throw new UnsupportedOperationException();
    }
}
