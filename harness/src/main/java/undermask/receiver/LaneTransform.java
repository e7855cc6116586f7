package undermask.receiver;

import java.util.Arrays;

/**
 * The inverse discrete Fourier transform of many equally long sequences at once: a row per sample, a lane per sequence.
 *
 * <p>Each step works on whole rows, in loops over no more than two arrays, which the compiler reliably turns into vector
 * instructions; over a scan this takes less than half the time of a library transform per sequence, and leaves the samples as the detectors want them.
 * Halving recursively (decimation in time, Cooley and Tukey 1965) keeps the rows at work within the cache.
 */
final class LaneTransform {
    private final double[][] re;
    private final double[][] im;
    private final int[] order;
    private final double[] cos;
    private final double[] sin;

    /**
     * Makes room.
     *
     * @param samples length of each sequence, a power of two
     * @param lanes number of sequences
     */
    LaneTransform(int samples, int lanes) {
        if (Integer.bitCount(samples) != 1) {
            throw new IllegalArgumentException(samples + " samples are not a power of two");
        }
        this.re = new double[samples][lanes];
        this.im = new double[samples][lanes];
        this.order = new int[samples];
        for (int i = 1; i < samples; i++) {
            order[i] = Integer.reverse(i) >>> (Integer.numberOfLeadingZeros(samples) + 1);
        }
        this.cos = new double[Math.max(1, samples / 2)];
        this.sin = new double[cos.length];
        for (int j = 0; j < cos.length; j++) {
            double angle = 2 * Math.PI * j / samples;
            cos[j] = Math.cos(angle);
            sin[j] = Math.sin(angle);
        }
    }

    int samples() {
        return re.length;
    }

    int lanes() {
        return re[0].length;
    }

    /** Real parts of the row where coefficient m goes in, at index m or, for negative m, samples + m; not a copy. */
    double[] inputRe(int index) {
        return re[order[index]];
    }

    /** Imaginary parts likewise. */
    double[] inputIm(int index) {
        return im[order[index]];
    }

    /** Clears the coefficients from one index up to, but without, another in all lanes. */
    void clear(int from, int to) {
        for (int index = from; index < to; index++) {
            Arrays.fill(inputRe(index), 0);
            Arrays.fill(inputIm(index), 0);
        }
    }

    /** Real parts of a sample once {@link #run} is done; not a copy. */
    double[] re(int sample) {
        return re[sample];
    }

    /** Imaginary parts likewise. */
    double[] im(int sample) {
        return im[sample];
    }

    /** Turns coefficients into samples, Σ_m c_m·exp(+j2πmn/N), in place. */
    void run() {
        combine(0, re.length);
    }

    private void combine(int first, int count) {
        if (count == 1) {
            return;
        }
        int half = count / 2;
        combine(first, half);
        combine(first + half, half);
        int turn = re.length / count;
        for (int j = 0; j < half; j++) {
            int a = first + j;
            int b = a + half;
            turn(re[b], im[b], cos[j * turn], sin[j * turn]);
            sumAndDifference(re[a], re[b]);
            sumAndDifference(im[a], im[b]);
        }
    }

    private static void turn(double[] re, double[] im, double cos, double sin) {
        for (int lane = 0; lane < re.length; lane++) {
            double before = re[lane];
            re[lane] = before * cos - im[lane] * sin;
            im[lane] = before * sin + im[lane] * cos;
        }
    }

    private static void sumAndDifference(double[] a, double[] b) {
        for (int lane = 0; lane < a.length; lane++) {
            double first = a[lane];
            double second = b[lane];
            a[lane] = first + second;
            b[lane] = first - second;
        }
    }
}
