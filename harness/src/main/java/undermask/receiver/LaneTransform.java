package undermask.receiver;

import java.util.Arrays;

/**
 * The inverse discrete Fourier transform of many equally long sequences at once: a row per sample, a lane per sequence.
 *
 * <p>Each step works on whole rows, in loops over no more than two arrays, which the compiler reliably turns into vector
 * instructions; over a scan this takes less than half the time of a library transform per sequence, and leaves the
 * samples as the detectors want them. Dividing recursively (decimation in frequency, Gentleman and Sande 1966) keeps the
 * rows at work within the cache.
 */
final class LaneTransform {
    private static final double SIN_60 = Math.sqrt(3) / 2;

    private final double[][] re;
    private final double[][] im;
    private final int[] order;
    private final double[] cos;
    private final double[] sin;

    /**
     * Makes room.
     *
     * @param samples length of each sequence, 2^k or 3·2^k
     * @param lanes number of sequences
     */
    LaneTransform(int samples, int lanes) {
        int odd = samples >> Integer.numberOfTrailingZeros(samples);
        if (odd != 1 && odd != 3) {
            throw new IllegalArgumentException(samples + " samples are neither 2^k nor 3·2^k");
        }
        this.re = new double[samples][lanes];
        this.im = new double[samples][lanes];
        this.cos = new double[samples];
        this.sin = new double[samples];
        for (int j = 0; j < samples; j++) {
            double angle = 2 * Math.PI * j / samples;
            cos[j] = Math.cos(angle);
            sin[j] = Math.sin(angle);
        }
        this.order = new int[samples];
        int even = samples / odd;
        for (int i = 0; i < samples; i++) {
            int reversed = even == 1 ? 0 : Integer.reverse(i / odd) >>> (Integer.numberOfLeadingZeros(even) + 1);
            order[i] = i % odd * even + reversed;
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
        return re[index];
    }

    /** Imaginary parts likewise. */
    double[] inputIm(int index) {
        return im[index];
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
        return re[order[sample]];
    }

    /** Imaginary parts likewise. */
    double[] im(int sample) {
        return im[order[sample]];
    }

    /** Turns coefficients into samples, Σ_m c_m·exp(+j2πmn/N), in place. */
    void run() {
        int samples = re.length;
        if (samples % 3 != 0) {
            divide(0, samples);
            return;
        }
        int third = samples / 3;
        for (int j = 0; j < third; j++) {
            thirds(j, j + third, j + 2 * third);
            turn(j + third, j);
            turn(j + 2 * third, 2 * j);
        }
        divide(0, third);
        divide(third, third);
        divide(2 * third, third);
    }

    /** Three-point transform over rows: a + b + c, and a − (b + c)/2 ± j·(√3/2)·(b − c). */
    private void thirds(int a, int b, int c) {
        sumAndDifference(re[b], re[c]);
        sumAndDifference(im[b], im[c]);
        sumAndRest(re[a], re[b]);
        sumAndRest(im[a], im[b]);
        turnSquare(re[b], im[c], -SIN_60);
        turnSquare(im[b], re[c], SIN_60);
        double[] real = im[c];
        im[c] = re[c];
        re[c] = real;
    }

    /** Two halvings at a time, so that a row is fetched half as often. */
    private void divide(int first, int count) {
        if (count == 1) {
            return;
        }
        if (count == 2) {
            sumAndDifference(re[first], re[first + 1]);
            sumAndDifference(im[first], im[first + 1]);
            return;
        }
        int quarter = count / 4;
        int turn = re.length / count;
        for (int j = 0; j < quarter; j++) {
            int a = first + j;
            int b = a + quarter;
            int c = b + quarter;
            int d = c + quarter;
            butterfly(a, c, j * turn);
            butterfly(b, d, (j + quarter) * turn);
            butterfly(a, b, 2 * j * turn);
            butterfly(c, d, 2 * j * turn);
        }
        divide(first, quarter);
        divide(first + quarter, quarter);
        divide(first + 2 * quarter, quarter);
        divide(first + 3 * quarter, quarter);
    }

    private void butterfly(int a, int b, int turns) {
        sumAndDifference(re[a], re[b]);
        sumAndDifference(im[a], im[b]);
        turn(b, turns);
    }

    private void turn(int row, int turns) {
        turn(re[row], im[row], cos[turns], sin[turns]);
    }

    private static void sumAndRest(double[] a, double[] b) {
        for (int lane = 0; lane < a.length; lane++) {
            double first = a[lane];
            double second = b[lane];
            a[lane] = first + second;
            b[lane] = first - 0.5 * second;
        }
    }

    private static void turnSquare(double[] a, double[] b, double factor) {
        for (int lane = 0; lane < a.length; lane++) {
            double first = a[lane];
            double second = factor * b[lane];
            a[lane] = first + second;
            b[lane] = first - second;
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
