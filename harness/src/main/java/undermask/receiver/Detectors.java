package undermask.receiver;

import java.util.Arrays;
import java.util.Optional;

/** The detectors of a band at work on envelopes, from lines or from a measured record alike. */
public final class Detectors {
    private final Optional<QuasiPeakDetector> quasiPeak;

    private Detectors(Optional<QuasiPeakDetector> quasiPeak) {
        this.quasiPeak = quasiPeak;
    }

    /** The detectors of a band. */
    public static Detectors of(Band band) {
        return new Detectors(band.quasiPeak());
    }

    /**
     * Reads one envelope.
     *
     * @param envelope samples of the envelope behind the receiver's filter, evenly spaced over one period, not negative,
     *     in V rms: the rms value of a sine of that amplitude. They must lie closer than the envelope's {@linkplain
     *     GaussianResponse#pulseSigma() pulse}; the peak is the highest of them, without interpolation
     * @param period in s, after which the envelope repeats
     * @throws IllegalArgumentException when there is no sample or a sample is negative or NaN, or the period is not
     *     positive
     */
    public Reading read(double[] envelope, double period) {
        if (envelope.length == 0 || !(period > 0)) {
            throw new IllegalArgumentException("an envelope needs samples and a period");
        }
        double peak = 0;
        for (int i = 0; i < envelope.length; i++) {
            if (!(envelope[i] >= 0)) {
                throw new IllegalArgumentException("envelope is " + envelope[i] + " V at sample " + i);
            }
            peak = Math.max(peak, envelope[i]);
        }
        EnvelopeBatch batch = new EnvelopeBatch(envelope.length, 1, period);
        batch.put(envelope);
        return new Reading(peak, quasiPeaks(batch)[0], averages(batch)[0]);
    }

    /** Average reading of every lane, V rms. */
    double[] averages(EnvelopeBatch batch) {
        return deflections(batch, batch.blockMeans());
    }

    /** Quasi-peak reading of every lane, V rms; NaN without such a detector. */
    double[] quasiPeaks(EnvelopeBatch batch) {
        if (quasiPeak.isEmpty()) {
            double[] none = new double[batch.width()];
            Arrays.fill(none, Double.NaN);
            return none;
        }
        return deflections(batch, quasiPeak.get().settle(batch));
    }

    private static double[] deflections(EnvelopeBatch batch, double[] blocks) {
        double[] highest = new double[batch.width()];
        for (int lane = 0; lane < highest.length; lane++) {
            highest[lane] = Meter.highest(blocks, lane, highest.length, batch.blocks(), batch.period());
        }
        return highest;
    }
}
