package undermask.signal;

/**
 * A line spectrum: the Fourier coefficients of a periodic waveform, read in blocks so that a long window need not be
 * held in memory.
 *
 * <p>Line n lies at n·{@link #spacing()}. Its coefficient c_n is that of exp(+j2πnt/T); a real waveform has the peak
 * amplitude 2·|c_n| and the rms value √2·|c_n| on line n ≥ 1.
 */
public interface Lines {
    /** Distance of neighbouring lines in Hz, the inverse of the window. */
    double spacing();

    /**
     * Reads coefficients.
     *
     * @param first number of the first line, at least 1
     * @param count how many
     * @param re receives the real parts from index 0, at least {@code count} long
     * @param im receives the imaginary parts likewise
     */
    void read(int first, int count, double[] re, double[] im);

    /** These lines after a network with the given transfer. */
    default Lines through(Transfer transfer) {
        return new FilteredLines(this, transfer);
    }

    /** These lines and others of the same window added; one reader at a time. */
    default Lines plus(Lines other) {
        return new SumLines(this, other);
    }

    /**
     * These lines kept in memory up to 30.2 MHz, for several readings; as they are when that would take more than 88 MB,
     * which is a window of a third of a second.
     */
    default Lines stored() {
        double count = 30.2e6 / spacing();
        return count > 11e6 ? this : new StoredLines(this, (int) count);
    }
}
