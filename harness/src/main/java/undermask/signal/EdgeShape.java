package undermask.signal;

/**
 * The shape of a step between two levels. Each shape is placed so that its centre of gravity in time is the instant of
 * the edge; the shape then changes no volt-seconds and no low harmonic.
 */
public sealed interface EdgeShape permits IdealEdge, RampEdge, RaisedCosineEdge, ExponentialEdge, RingingEdge {
    /**
     * The spectrum factor E(f), the Fourier transform of the edge's derivative, 1 at f = 0. Time counts from the origin
     * of the shape, {@link #lead()} before the instant of the edge.
     *
     * @param frequency in Hz
     * @param out receives real and imaginary part in its first two places
     */
    void factor(double frequency, double[] out);

    /** By how many seconds the shape's origin lies before the instant of the edge. */
    default double lead() {
        return 0;
    }

    /**
     * The edge in time: 0 long before, 1 long after.
     *
     * @param time from the instant of the edge, s
     */
    double response(double time);

    /** Time from the instant of the edge, before and after it, beyond which it has no more to do, s. */
    default double reach() {
        return 8 * transitionTime();
    }

    /** Transition time between the rails in s: ΔV divided by dv/dt. */
    double transitionTime();

    /** Refuses a transition time that is not positive and finite. */
    static void checkTransition(double transitionTime) {
        if (!(transitionTime > 0) || Double.isInfinite(transitionTime)) {
            throw new IllegalArgumentException("transition time of an edge is " + transitionTime + " s");
        }
    }
}
