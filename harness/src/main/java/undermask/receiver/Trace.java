package undermask.receiver;

import java.util.Arrays;

/**
 * What a receiver shows over a scan: a level per tuning step and detector. Frequencies rise strictly. A detector that
 * the receiver lacks reads NaN throughout.
 */
public final class Trace {
    private final double[] frequencies;
    private final double[][] levelsDbuv;

    /**
     * Takes copies of its arrays.
     *
     * @param frequencies tuning steps in Hz, rising
     * @param levelsDbuv a row per detector in the order of {@link Detector}, each as long as {@code frequencies}; dBµV
     *     or NaN where the receiver has no such detector
     */
    public Trace(double[] frequencies, double[][] levelsDbuv) {
        if (levelsDbuv.length != Detector.values().length) {
            throw new IllegalArgumentException("a trace needs a row per detector");
        }
        for (int i = 1; i < frequencies.length; i++) {
            if (!(frequencies[i] > frequencies[i - 1])) {
                throw new IllegalArgumentException("tuning steps do not rise at step " + i);
            }
        }
        this.frequencies = frequencies.clone();
        this.levelsDbuv = new double[levelsDbuv.length][];
        for (int d = 0; d < levelsDbuv.length; d++) {
            if (levelsDbuv[d].length != frequencies.length) {
                throw new IllegalArgumentException("a level is missing for detector " + Detector.values()[d].words());
            }
            this.levelsDbuv[d] = levelsDbuv[d].clone();
        }
    }

    /** Number of tuning steps. */
    public int size() {
        return frequencies.length;
    }

    /** Frequency of a tuning step in Hz. */
    public double frequency(int step) {
        return frequencies[step];
    }

    /** Level at a tuning step in dBµV; NaN where the receiver has no such detector. */
    public double levelDbuv(Detector detector, int step) {
        return levelsDbuv[detector.ordinal()][step];
    }

    /** Decibels to add to a detector at a frequency. */
    @FunctionalInterface
    public interface Shift {
        /** The shift of a detector at a frequency in Hz, dB. */
        double at(Detector detector, double frequency);
    }

    /** This trace with each reading shifted. */
    public Trace shifted(Shift shift) {
        double[][] shifted = new double[levelsDbuv.length][];
        for (Detector detector : Detector.values()) {
            int d = detector.ordinal();
            shifted[d] = levelsDbuv[d].clone();
            for (int i = 0; i < frequencies.length; i++) {
                shifted[d][i] += shift.at(detector, frequencies[i]);
            }
        }
        return new Trace(frequencies, shifted);
    }

    /**
     * The higher of two traces at every step and detector.
     *
     * @throws IllegalArgumentException when the tuning steps differ
     */
    public Trace envelopeWith(Trace other) {
        if (!Arrays.equals(frequencies, other.frequencies)) {
            throw new IllegalArgumentException("traces with different tuning steps have no common envelope");
        }
        double[][] highest = new double[levelsDbuv.length][];
        for (int d = 0; d < highest.length; d++) {
            highest[d] = levelsDbuv[d].clone();
            for (int i = 0; i < highest[d].length; i++) {
                highest[d][i] = Math.max(highest[d][i], other.levelsDbuv[d][i]);
            }
        }
        return new Trace(frequencies, highest);
    }
}
