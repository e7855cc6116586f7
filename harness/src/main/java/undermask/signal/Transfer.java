package undermask.signal;

/** A complex, frequency-dependent factor between a source and a place in a network. */
public interface Transfer {
    /**
     * Multiplies lines in place.
     *
     * @param spacing distance of lines in Hz
     * @param first number of the first line; its frequency is {@code first · spacing}
     * @param count how many lines
     * @param re real parts from index 0
     * @param im imaginary parts from index 0
     */
    void multiply(double spacing, int first, int count, double[] re, double[] im);
}
