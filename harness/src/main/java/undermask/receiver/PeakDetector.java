package undermask.receiver;

import java.util.Arrays;

/**
 * The peak detector: the highest envelope, also between samples.
 *
 * <p>A pulse may fall between two samples and stand above both, by 0.4 dB at the widest sampling. Around the candidates
 * the complex envelope is therefore interpolated to half the interval, and a parabola laid through the logarithms at the
 * top, which is exact for the pulse of a Gaussian filter.
 */
final class PeakDetector {
    /** Squares below this share of the highest cannot hide the peak next to them. */
    private static final double CANDIDATE = 0.8;

    /** By how much, in squares, a parabola through samples may miss the peak between them. */
    private static final double PARABOLA_DOUBT = 1.05;

    /** A parabola that rises less than this above its middle sample is believed; its error is 0.001 dB. */
    private static final double FLAT = 1.001;

    private static final int HALF_TAPS = 4;

    private static final int BLOCK = 8;

    private final double[] taps;

    /**
     * Builds a detector.
     *
     * @param interval distance of samples in standard deviations of the receiver's pulse
     */
    PeakDetector(double interval) {
        this.taps = midpointTaps(interval);
    }

    /**
     * Weights with which 2·{@value #HALF_TAPS} samples give the envelope midway between the inner two: least squares over
     * signals with the receiver's response as their spectrum, scaled so that a steady envelope comes out exactly.
     */
    private static double[] midpointTaps(double interval) {
        double[][] system = new double[HALF_TAPS][HALF_TAPS + 1];
        for (int i = 0; i < HALF_TAPS; i++) {
            double ti = (i + 0.5) * interval;
            for (int j = 0; j < HALF_TAPS; j++) {
                double tj = (j + 0.5) * interval;
                system[i][j] = Math.exp(-(ti - tj) * (ti - tj) / 2) + Math.exp(-(ti + tj) * (ti + tj) / 2);
            }
            // a trace of white noise keeps the system solvable where samples lie close
            system[i][i] += 1e-10;
            system[i][HALF_TAPS] = Math.exp(-ti * ti / 2);
        }
        double[] taps = solve(system);
        double sum = 2 * Arrays.stream(taps).sum();
        for (int i = 0; i < taps.length; i++) {
            taps[i] /= sum;
        }
        return taps;
    }

    /** Gauss elimination of a positive definite system, right-hand side in the last column. */
    private static double[] solve(double[][] system) {
        int n = system.length;
        for (int i = 0; i < n; i++) {
            for (int row = i + 1; row < n; row++) {
                double factor = system[row][i] / system[i][i];
                for (int k = i; k <= n; k++) {
                    system[row][k] -= factor * system[i][k];
                }
            }
        }
        double[] x = new double[n];
        for (int i = n - 1; i >= 0; i--) {
            x[i] = system[i][n];
            for (int k = i + 1; k < n; k++) {
                x[i] -= system[i][k] * x[k];
            }
            x[i] /= system[i][i];
        }
        return x;
    }

    /**
     * Reads the peaks of all lanes, V rms.
     *
     * @param envelope complex envelopes
     * @param squares their squares, sample n of a lane at n·{@code width} + lane
     */
    double[] read(LaneTransform envelope, double[] squares, int width) {
        double[][] highest = highestOfBlocks(squares, envelope.samples(), width);
        double[] best = new double[width];
        for (double[] block : highest) {
            raise(best, block);
        }
        double[] threshold = new double[width];
        for (int lane = 0; lane < width; lane++) {
            threshold[lane] = CANDIDATE * best[lane];
        }
        // lanes inside blocks: neighbours peak at the same time, and their samples share lines of the cache
        for (int block = 0; block < highest.length; block++) {
            for (int lane = 0; lane < width; lane++) {
                if (highest[block][lane] >= threshold[lane]) {
                    best[lane] = search(envelope, squares, width, lane, block * BLOCK, threshold[lane], best[lane]);
                }
            }
        }
        for (int lane = 0; lane < width; lane++) {
            best[lane] = Math.sqrt(best[lane]);
        }
        return best;
    }

    private static double[][] highestOfBlocks(double[] squares, int samples, int width) {
        double[][] highest = new double[samples / BLOCK][];
        double[] row = new double[width];
        double[] top = new double[width];
        int n = 0;
        for (int block = 0; block < highest.length; block++) {
            Arrays.fill(top, 0);
            for (int i = 0; i < BLOCK; i++, n++) {
                System.arraycopy(squares, n * width, row, 0, width);
                raise(top, row);
            }
            highest[block] = top.clone();
        }
        return highest;
    }

    private static void raise(double[] top, double[] row) {
        for (int lane = 0; lane < row.length; lane++) {
            double more = row[lane] - top[lane];
            top[lane] += 0.5 * (more + Math.abs(more));
        }
    }

    private double search(
            LaneTransform envelope, double[] squares, int width, int lane, int from, double threshold, double highest) {
        int samples = envelope.samples();
        double best = highest;
        double before = squares[wrapped(from - 1, samples) * width + lane];
        double middle = squares[from * width + lane];
        for (int n = from; n < from + BLOCK; n++) {
            double after = squares[wrapped(n + 1, samples) * width + lane];
            if (middle >= threshold && middle >= before && middle > after) {
                double top = middle + (after - before) * (after - before) / (8 * (2 * middle - before - after));
                if (top * PARABOLA_DOUBT > best) {
                    best = Math.max(
                            best, top <= FLAT * middle ? top : refined(envelope, lane, n, before, middle, after));
                }
            }
            before = middle;
            middle = after;
        }
        return best;
    }

    private double refined(LaneTransform envelope, int lane, int sample, double before, double middle, double after) {
        double earlier = midway(envelope, lane, sample - 1);
        double later = midway(envelope, lane, sample);
        if (earlier > middle && earlier >= later) {
            return top(before, earlier, middle);
        }
        return later > middle ? top(middle, later, after) : top(earlier, middle, later);
    }

    /** Top of the parabola through the logarithms of three equidistant values of which the middle one is highest. */
    private static double top(double before, double middle, double after) {
        double left = Math.log(before / middle);
        double right = Math.log(after / middle);
        double bend = left + right;
        return bend < 0 && bend > Double.NEGATIVE_INFINITY
                ? middle * Math.exp((right - left) * (right - left) / (-8 * bend))
                : middle;
    }

    /** Square of the envelope midway between a sample and the next. */
    private double midway(LaneTransform envelope, int lane, int sample) {
        int samples = envelope.samples();
        double re = 0;
        double im = 0;
        for (int i = 0; i < HALF_TAPS; i++) {
            int early = wrapped(sample - i, samples);
            int late = wrapped(sample + 1 + i, samples);
            re += taps[i] * (envelope.re(early)[lane] + envelope.re(late)[lane]);
            im += taps[i] * (envelope.im(early)[lane] + envelope.im(late)[lane]);
        }
        return re * re + im * im;
    }

    private static int wrapped(int sample, int samples) {
        return sample < 0 ? sample + samples : sample < samples ? sample : sample - samples;
    }
}
