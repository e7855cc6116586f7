package undermask.signal;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Deque;
import java.util.List;

/**
 * A transfer held as polynomials of the fourth degree over adjoining intervals of frequency, fine where it bends. Below
 * the first and above the last interval it stays at its end value.
 */
public final class TabulatedTransfer implements Transfer {
    /** Upper over lower bound of an interval before it is halved. */
    private static final double WIDEST_RATIO = Math.sqrt(2);
    /** An interval of this share of its frequency is taken as it is: only a resonance without losses asks for less. */
    private static final double NARROWEST = 1e-6;
    /** Halving an interval lessens the error of a polynomial of the fourth degree 32 times in the end; this is relied on. */
    private static final double GAIN_OF_HALVING = 4;

    private static final int COEFFICIENTS = 5;
    /** How finely an interval is searched for a dip. */
    private static final int PLACES = 32;

    /** Bounds of the intervals in Hz, rising. */
    private final double[] bounds;
    /** Coefficients per interval in rising power of the place in the interval, 0 to 1. */
    private final double[] re;

    private final double[] im;

    /** A complex function of frequency. */
    @FunctionalInterface
    public interface Response {
        /**
         * Computes a value.
         *
         * @param frequency in Hz
         * @param out receives real and imaginary part
         */
        void at(double frequency, double[] out);
    }

    private TabulatedTransfer(List<Piece> pieces) {
        bounds = new double[pieces.size() + 1];
        re = new double[pieces.size() * COEFFICIENTS];
        im = new double[pieces.size() * COEFFICIENTS];
        for (int p = 0; p < pieces.size(); p++) {
            Piece piece = pieces.get(p);
            bounds[p] = piece.low;
            bounds[p + 1] = piece.high;
            coefficients(piece.re, re, p * COEFFICIENTS);
            coefficients(piece.im, im, p * COEFFICIENTS);
        }
    }

    /**
     * Samples a response as closely as its shape asks for.
     *
     * @param response smooth, as that of a lumped circuit or a line with losses
     * @param low lowest frequency in Hz, above 0
     * @param high highest frequency in Hz, above {@code low}
     * @param ripple distance in Hz of the resonances that follow each other evenly, as those of a line do; infinite when
     *     there are none
     * @param relativeError largest error aimed at, as a share of the modulus at the same frequency
     */
    public static TabulatedTransfer of(
            Response response, double low, double high, double ripple, double relativeError) {
        if (!(low > 0) || !(high > low) || Double.isInfinite(high) || !(ripple > 0)) {
            throw new IllegalArgumentException("a transfer cannot be tabulated from " + low + " to " + high
                    + " Hz with resonances every " + ripple + " Hz");
        }
        // samples that keep step with even resonances would not see them
        double widest = ripple / 2;
        List<Piece> pieces = new ArrayList<>();
        Deque<Piece> waiting = new ArrayDeque<>();
        double from = low;
        while (from < high) {
            double next = Math.min(from * WIDEST_RATIO, from + widest);
            double to = next < high ? next : high;
            waiting.add(Piece.sampled(response, from, to));
            from = to;
        }
        while (!waiting.isEmpty()) {
            Piece piece = waiting.pop();
            Piece left = piece.half(response, 0);
            Piece right = piece.half(response, 2);
            boolean close = piece.misses(left, right) <= GAIN_OF_HALVING * relativeError;
            if (close || piece.high - piece.low < NARROWEST * piece.high) {
                pieces.add(left);
                pieces.add(right);
            } else {
                waiting.push(right);
                waiting.push(left);
            }
        }
        return new TabulatedTransfer(pieces);
    }

    @Override
    public void multiply(double spacing, int first, int count, double[] re, double[] im) {
        int last = bounds.length - 2;
        int done = 0;
        int piece = pieceOf(first * spacing);
        while (done < count) {
            // lines up to the end of this interval; the outermost intervals also serve what lies beyond
            double upTo = piece == last ? Double.POSITIVE_INFINITY : Math.ceil(bounds[piece + 1] / spacing) - first;
            int end = (int) Math.min(count, Math.max(upTo, done));
            double width = bounds[piece + 1] - bounds[piece];
            double step = spacing / width;
            double start = (first * spacing - bounds[piece]) / width;
            boolean outermost = piece == 0 || piece == last;
            scale(piece * COEFFICIENTS, start, step, outermost, done, end, re, im);
            done = end;
            piece++;
        }
    }

    private void scale(
            int at, double start, double step, boolean clamp, int from, int to, double[] lineRe, double[] lineIm) {
        double r0 = re[at];
        double r1 = re[at + 1];
        double r2 = re[at + 2];
        double r3 = re[at + 3];
        double r4 = re[at + 4];
        double i0 = im[at];
        double i1 = im[at + 1];
        double i2 = im[at + 2];
        double i3 = im[at + 3];
        double i4 = im[at + 4];
        for (int i = from; i < to; i++) {
            double x = start + i * step;
            if (clamp) {
                x = Math.min(1, Math.max(0, x));
            }
            double hRe = r0 + x * (r1 + x * (r2 + x * (r3 + x * r4)));
            double hIm = i0 + x * (i1 + x * (i2 + x * (i3 + x * i4)));
            double kept = lineRe[i];
            lineRe[i] = kept * hRe - lineIm[i] * hIm;
            lineIm[i] = kept * hIm + lineIm[i] * hRe;
        }
    }

    private int pieceOf(double frequency) {
        int found = Arrays.binarySearch(bounds, frequency);
        int piece = found >= 0 ? found : -found - 2;
        return Math.max(0, Math.min(bounds.length - 2, piece));
    }

    /** Newton's forward differences at five equal steps, turned into powers of the place 0 to 1. */
    private static void coefficients(double[] y, double[] out, int at) {
        double d1 = y[1] - y[0];
        double d2 = y[2] - 2 * y[1] + y[0];
        double d3 = y[3] - 3 * y[2] + 3 * y[1] - y[0];
        double d4 = y[4] - 4 * y[3] + 6 * y[2] - 4 * y[1] + y[0];
        out[at] = y[0];
        out[at + 1] = 4 * (d1 - d2 / 2 + d3 / 3 - d4 / 4);
        out[at + 2] = 16 * (d2 / 2 - d3 / 2 + 11 * d4 / 24);
        out[at + 3] = 64 * (d3 / 6 - d4 / 4);
        out[at + 4] = 256 * (d4 / 24);
    }

    /** An interval with the values at its ends and its quarters. */
    private static final class Piece {
        private final double low;
        private final double high;
        private final double[] re = new double[COEFFICIENTS];
        private final double[] im = new double[COEFFICIENTS];

        private Piece(double low, double high) {
            this.low = low;
            this.high = high;
        }

        static Piece sampled(Response response, double low, double high) {
            Piece piece = new Piece(low, high);
            for (int i = 0; i < COEFFICIENTS; i++) {
                piece.sample(response, i);
            }
            return piece;
        }

        /** The half from quarter {@code first}; three of its values are known. */
        Piece half(Response response, int first) {
            double middle = (low + high) / 2;
            Piece half = first == 0 ? new Piece(low, middle) : new Piece(middle, high);
            for (int i = 0; i <= 2; i++) {
                half.re[2 * i] = re[first + i];
                half.im[2 * i] = im[first + i];
            }
            half.sample(response, 1);
            half.sample(response, 3);
            return half;
        }

        private void sample(Response response, int i) {
            double[] out = new double[2];
            response.at(low + (high - low) * i / (COEFFICIENTS - 1), out);
            re[i] = out[0];
            im[i] = out[1];
        }

        /**
         * The largest error of this interval's polynomial at the values that its halves have added, as a share of the
         * smallest modulus in the interval: an error at one place counts where the response dips at another.
         */
        double misses(Piece left, Piece right) {
            double[] pRe = new double[COEFFICIENTS];
            double[] pIm = new double[COEFFICIENTS];
            coefficients(re, pRe, 0);
            coefficients(im, pIm, 0);
            double worst = 0;
            double smallest = Double.POSITIVE_INFINITY;
            for (int i = 1; i < 8; i += 2) {
                Piece half = i < 4 ? left : right;
                int sample = i % 4;
                double x = i / 8.0;
                worst = Math.max(worst, Math.hypot(horner(pRe, x) - half.re[sample], horner(pIm, x) - half.im[sample]));
                smallest = Math.min(smallest, Math.hypot(half.re[sample], half.im[sample]));
            }
            for (int i = 0; i <= PLACES; i++) {
                double x = (double) i / PLACES;
                smallest = Math.min(smallest, Math.hypot(horner(pRe, x), horner(pIm, x)));
            }
            return worst == 0 ? 0 : worst / smallest;
        }

        private static double horner(double[] c, double x) {
            return c[0] + x * (c[1] + x * (c[2] + x * (c[3] + x * c[4])));
        }
    }
}
