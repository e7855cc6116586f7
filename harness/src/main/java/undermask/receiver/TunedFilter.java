package undermask.receiver;

import java.util.Arrays;

/**
 * The receiver's filter, tuned to many frequencies side by side: lines weighted by the response and transformed to the
 * complex envelope over one window, a lane per tuning step. An envelope turns by the distance from the tuned frequency to
 * its nearest line, which no detector sees.
 */
final class TunedFilter {
    /** Samples per window and per σ·T: no two samples lie further apart than 0.63 standard deviations of a pulse. */
    private static final double DENSITY = 10;

    /** A short window costs little, and its few pulses always fall alike between the samples. */
    private static final int FEWEST_SAMPLES = 128;

    private static final int GROUP = 8;

    private static final double SAME_OFFSET = 1e-9;

    private final GaussianResponse response;
    private final double spacing;
    private final int reach;
    private final double[] centred;
    private final double[] weights;
    private final double[] offsets = new double[GROUP];

    /**
     * Builds the filter for one line spacing.
     *
     * @param spacing distance of lines in Hz
     */
    TunedFilter(GaussianResponse response, double spacing) {
        this.response = response;
        this.spacing = spacing;
        this.reach = Math.max(1, (int) Math.floor(GaussianResponse.REACH * response.sigma() / spacing + 0.5));
        this.centred = new double[reach + 1];
        for (int m = 0; m <= reach; m++) {
            centred[m] = response.at(m * spacing);
        }
        this.weights = new double[(2 * reach + 1) * GROUP];
        Arrays.fill(offsets, Double.NaN);
    }

    /** Samples of the envelope per window, 2^k or 3·2^k. */
    int samples() {
        double least = DENSITY * response.sigma() / spacing;
        int samples = FEWEST_SAMPLES;
        while (samples < least) {
            samples = Math.multiplyExact(samples, 2);
        }
        int fewer = samples / 4 * 3;
        return fewer >= Math.max(least, FEWEST_SAMPLES) ? fewer : samples;
    }

    int lowestLine(double frequency) {
        return nearestLine(frequency) - reach;
    }

    int highestLine(double frequency) {
        return nearestLine(frequency) + reach;
    }

    private int nearestLine(double frequency) {
        return Math.toIntExact(Math.round(frequency / spacing));
    }

    /**
     * Tunes a lane to each of some frequencies: puts the weighted lines around them into the transform.
     *
     * @param frequencies rising, in Hz
     * @param first index of the first one
     * @param transform with as many lanes as frequencies are to be taken
     */
    void tune(double[] frequencies, int first, LineWindow window, LaneTransform transform) {
        transform.clear(reach + 1, transform.samples() - reach);
        for (int lane = 0; lane < transform.lanes(); lane += GROUP) {
            int count = Math.min(GROUP, transform.lanes() - lane);
            tune(frequencies, first + lane, window, transform, lane, count);
        }
    }

    /** Some lanes at a time, because neighbours in a row share a line of the cache. */
    private void tune(
            double[] frequencies, int first, LineWindow window, LaneTransform transform, int firstLane, int count) {
        window.cover(lowestLine(frequencies[first]), highestLine(frequencies[first + count - 1]));
        int[] nearest = new int[count];
        for (int lane = 0; lane < count; lane++) {
            double frequency = frequencies[first + lane];
            nearest[lane] = nearestLine(frequency);
            double offset = frequency - nearest[lane] * spacing;
            if (!(Math.abs(offset - offsets[lane]) <= SAME_OFFSET * spacing)) {
                offsets[lane] = offset;
                weigh(lane);
            }
        }
        double[] re = window.re();
        double[] im = window.im();
        for (int m = -reach; m <= reach; m++) {
            int index = m < 0 ? m + transform.samples() : m;
            double[] rowRe = transform.inputRe(index);
            double[] rowIm = transform.inputIm(index);
            int weightAt = (reach + m) * GROUP;
            int shift = m - window.first();
            for (int lane = 0; lane < count; lane++) {
                double weight = weights[weightAt + lane];
                int line = nearest[lane] + shift;
                rowRe[firstLane + lane] = weight * re[line];
                rowIm[firstLane + lane] = weight * im[line];
            }
        }
    }

    /**
     * The response over the lines around one that lies an offset d below the tuned frequency: the Gaussian over m·Δ − d
     * is the centred one times a geometric sequence.
     */
    private void weigh(int lane) {
        double offset = offsets[lane];
        double ratio = Math.exp(offset * spacing / (response.sigma() * response.sigma()));
        // a coefficient c is the peak envelope 2·|c|, hence the rms value √2·|c|
        double up = Math.sqrt(2) * response.at(offset);
        double down = up;
        weights[reach * GROUP + lane] = up;
        for (int m = 1; m <= reach; m++) {
            up *= ratio;
            down /= ratio;
            weights[(reach + m) * GROUP + lane] = centred[m] * up;
            weights[(reach - m) * GROUP + lane] = centred[m] * down;
        }
    }
}
