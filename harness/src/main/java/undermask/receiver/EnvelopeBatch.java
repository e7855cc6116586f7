package undermask.receiver;

import java.util.Arrays;

/**
 * Envelopes of several tuning steps side by side, one period each: a row per sample, a lane per tuning step. The
 * detectors run along the rows and treat all lanes alike, which the compiler turns into vector instructions.
 */
final class EnvelopeBatch {
    /** Added to every amplitude, V: far below any floor, and no quotient becomes 0/0. */
    private static final double TINY = 1e-60;

    /** Longest block in s: a hundredth of the meter's time constant, so that the meter sees the same. */
    private static final double LONGEST_BLOCK = Meter.TIME_CONSTANT / 100;

    private final int samples;
    private final int width;
    private final double period;
    private final int samplesPerBlock;
    private final double[] amplitudes;

    /**
     * Makes room.
     *
     * @param samples per period
     * @param width number of lanes
     * @param period in s
     */
    EnvelopeBatch(int samples, int width, double period) {
        this.samples = samples;
        this.width = width;
        this.period = period;
        this.amplitudes = new double[Math.multiplyExact(samples, width)];
        int block = 1;
        while (samples % (2 * block) == 0 && 2 * block * period / samples <= LONGEST_BLOCK) {
            block *= 2;
        }
        this.samplesPerBlock = block;
    }

    int samples() {
        return samples;
    }

    int width() {
        return width;
    }

    double period() {
        return period;
    }

    double sampleInterval() {
        return period / samples;
    }

    int samplesPerBlock() {
        return samplesPerBlock;
    }

    int blocks() {
        return samples / samplesPerBlock;
    }

    /** The amplitudes, sample n of a lane at n·{@link #width()} + lane; not a copy. */
    double[] amplitudes() {
        return amplitudes;
    }

    /** Fills the only lane with amplitudes, V. */
    void put(double[] envelope) {
        for (int i = 0; i < amplitudes.length; i++) {
            amplitudes[i] = envelope[i] + TINY;
        }
    }

    /** Fills all lanes with the squares of complex envelopes. */
    void square(LaneTransform envelope) {
        double[] squares = new double[width];
        for (int n = 0; n < samples; n++) {
            square(envelope.re(n), envelope.im(n), squares);
            System.arraycopy(squares, 0, amplitudes, n * width, width);
        }
    }

    private static void square(double[] re, double[] im, double[] squares) {
        for (int lane = 0; lane < squares.length; lane++) {
            squares[lane] = re[lane] * re[lane] + im[lane] * im[lane];
        }
    }

    /** Turns squares into amplitudes. */
    void takeRoots() {
        for (int i = 0; i < amplitudes.length; i++) {
            amplitudes[i] = Math.sqrt(amplitudes[i]) + TINY;
        }
    }

    /** A batch of some of these lanes. */
    EnvelopeBatch lanes(int[] lanes) {
        EnvelopeBatch some = new EnvelopeBatch(samples, lanes.length, period);
        for (int n = 0; n < samples; n++) {
            for (int i = 0; i < lanes.length; i++) {
                some.amplitudes[n * lanes.length + i] = amplitudes[n * width + lanes[i]];
            }
        }
        return some;
    }

    /** Mean of each block, block b of a lane at b·{@link #width()} + lane. */
    double[] blockMeans() {
        double[] means = new double[blocks() * width];
        double[] sum = new double[width];
        int row = 0;
        for (int block = 0; block < blocks(); block++) {
            Arrays.fill(sum, 0);
            for (int i = 0; i < samplesPerBlock; i++, row += width) {
                add(amplitudes, row, sum);
            }
            for (int lane = 0; lane < width; lane++) {
                means[block * width + lane] = sum[lane] / samplesPerBlock;
            }
        }
        return means;
    }

    private static void add(double[] from, int row, double[] sum) {
        for (int lane = 0; lane < sum.length; lane++) {
            sum[lane] += from[row + lane];
        }
    }
}
