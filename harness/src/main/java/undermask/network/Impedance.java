package undermask.network;

/** An impedance that depends on frequency in a way of its own. */
@FunctionalInterface
public interface Impedance {
    /**
     * The impedance, not zero.
     *
     * @param frequency in Hz, above 0
     */
    Phasor at(double frequency);
}
