package undermask.signal;

public final class EdgeTrain {
    /** Number of edges in one period. */
    public int size() {
        throw new UnsupportedOperationException();
    }

    /** Length of the window in s, after which the train repeats. */
    public double period() {
        throw new UnsupportedOperationException();
    }

    /** Instant of an edge in s, rising with the index, 0 ≤ t < period. */
    public double time(int edge) {
        throw new UnsupportedOperationException();
    }

    /** Height of an edge in V, signed. */
    public double step(int edge) {
        throw new UnsupportedOperationException();
    }

    public EdgeShape shape(int edge) {
        throw new UnsupportedOperationException();
    }

    /** Level just before the first edge of the window, V. */
    public double initialLevel() {
        throw new UnsupportedOperationException();
    }

    /** The exact Fourier coefficients. */
    public Lines lines() {
        throw new UnsupportedOperationException();
    }
}
