package undermask.receiver;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import undermask.signal.Lines;
import undermask.unit.Decibels;

/**
 * A measuring receiver: its filter tuned step by step, and the detectors behind it.
 *
 * <p>All detectors are calibrated so that a sine reads its rms value.
 */
public final class Receiver {
    /** The lowest level that is shown: where a receiver would show its own noise, far below every limit. */
    public static final double FLOOR_DBUV = -40;

    /** Most envelope samples held at a time; each takes 24 bytes, so that a scan of any window needs some 50 MB. */
    private static final int MOST_SAMPLES = 1 << 21;

    private static final int MOST_LANES = 128;

    private final List<Band> bands;

    private Receiver(List<Band> bands) {
        this.bands = bands;
    }

    /** The receiver of a standard. */
    public static Receiver of(ReceiverStandard standard) {
        return new Receiver(standard.bands());
    }

    /** The lowest frequency that it can be tuned to, Hz. */
    public double lowest() {
        return bands.get(0).from();
    }

    /** The highest frequency that it can be tuned to, Hz. */
    public double highest() {
        return bands.get(bands.size() - 1).to();
    }

    /** The 6 dB bandwidth that a frequency is read with, Hz. */
    public double bandwidth(double frequency) {
        return bandOf(frequency).response().bandwidth();
    }

    /**
     * Reads all tuning steps of all bands. The steps are the same for every window.
     *
     * @return levels not below {@link #FLOOR_DBUV}; quasi-peak NaN where the standard has no such detector
     */
    public Trace scan(Lines lines) {
        int size = bands.stream().mapToInt(band -> band.tuningSteps().length).sum();
        double[] frequencies = new double[size];
        double[][] levels = new double[Detector.values().length][size];
        int at = 0;
        for (Band band : bands) {
            double[] steps = band.tuningSteps();
            System.arraycopy(steps, 0, frequencies, at, steps.length);
            Reading[] readings = read(band, lines, steps);
            for (Reading reading : readings) {
                levels[Detector.PEAK.ordinal()][at] = levelDbuv(reading.peak());
                levels[Detector.QUASI_PEAK.ordinal()][at] = levelDbuv(reading.quasiPeak());
                levels[Detector.AVERAGE.ordinal()][at] = levelDbuv(reading.average());
                at++;
            }
        }
        return new Trace(frequencies, levels);
    }

    /**
     * Reads one frequency.
     *
     * @param frequency in Hz, inside a band
     * @throws IllegalArgumentException when no band of this receiver holds the frequency
     */
    public Reading at(double frequency, Lines lines) {
        return read(bandOf(frequency), lines, new double[] {frequency})[0];
    }

    /**
     * Reads several frequencies.
     *
     * @param frequencies rising, in Hz, each inside a band
     * @throws IllegalArgumentException when no band of this receiver holds one of them
     */
    public List<Reading> at(double[] frequencies, Lines lines) {
        List<Reading> readings = new ArrayList<>();
        int from = 0;
        while (from < frequencies.length) {
            Band band = bandOf(frequencies[from]);
            int to = from;
            while (to < frequencies.length && bandOf(frequencies[to]) == band) {
                to++;
            }
            readings.addAll(List.of(read(band, lines, Arrays.copyOfRange(frequencies, from, to))));
            from = to;
        }
        return readings;
    }

    private Band bandOf(double frequency) {
        for (int i = bands.size() - 1; i >= 0; i--) {
            if (frequency >= bands.get(i).from() && frequency <= bands.get(i).to()) {
                return bands.get(i);
            }
        }
        throw new IllegalArgumentException("no band of the receiver holds " + frequency + " Hz");
    }

    /** A reading in dBµV, not below the floor; NaN stays NaN. */
    static double levelDbuv(double reading) {
        return Math.max(FLOOR_DBUV, Decibels.dbuv(reading));
    }

    private static Reading[] read(Band band, Lines lines, double[] steps) {
        TunedFilter filter = new TunedFilter(band.response(), lines.spacing());
        Detectors detectors = Detectors.of(band);
        LineWindow window =
                new LineWindow(lines, filter.lowestLine(steps[0]), filter.highestLine(steps[steps.length - 1]));
        int samples = filter.samples();
        int lanes = Math.max(1, Math.min(MOST_LANES, MOST_SAMPLES / samples));
        double interval = 1 / (lines.spacing() * samples * band.response().pulseSigma());
        PeakDetector peakDetector = new PeakDetector(interval);
        Reading[] readings = new Reading[steps.length];
        LaneTransform envelope = null;
        EnvelopeBatch batch = null;
        for (int first = 0; first < steps.length; first += lanes) {
            int width = Math.min(lanes, steps.length - first);
            if (batch == null || batch.width() != width) {
                envelope = new LaneTransform(samples, width);
                batch = new EnvelopeBatch(samples, width, 1 / lines.spacing());
            }
            filter.tune(steps, first, window, envelope);
            envelope.run();
            batch.square(envelope);
            double[] peaks = peakDetector.read(envelope, batch.amplitudes(), width);
            batch.takeRoots();
            double[] averages = detectors.averages(batch);
            double[] quasiPeaks = detectors.quasiPeaks(batch);
            for (int lane = 0; lane < width; lane++) {
                readings[first + lane] = new Reading(peaks[lane], quasiPeaks[lane], averages[lane]);
            }
        }
        return readings;
    }
}
