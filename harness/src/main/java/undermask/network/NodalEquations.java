package undermask.network;

import java.util.Arrays;

/**
 * The complex equations of a circuit at one frequency: a row and a column per node, then one per voltage source whose
 * unknown is the source's current. Flat arrays, used over and over.
 *
 * <p>Source: modified nodal analysis, Ho, Ruehli and Brennan, IEEE Trans. Circuits and Systems 22(6) 1975.
 */
final class NodalEquations {
    /**
     * A pivot below this share of its column's largest entry is rounding. A picofarad at 9 kHz beside a milliohm is 6e-11.
     */
    private static final double NO_PIVOT = 1e-13;

    private final int size;
    private final double[] re;
    private final double[] im;
    private final double[] largest;
    private final int[] swap;
    private final int[] columns;
    private int filled;

    NodalEquations(int size) {
        this.size = size;
        re = new double[size * size];
        im = new double[size * size];
        columns = new int[size];
        largest = new double[size];
        swap = new int[size];
    }

    void clear() {
        Arrays.fill(re, 0);
        Arrays.fill(im, 0);
    }

    /** Adds an admittance between two nodes. */
    void admittance(int from, int to, double yRe, double yIm) {
        transferAdmittance(from, to, from, to, yRe, yIm);
    }

    /** Adds a current from {@code from} through the element to {@code to}, y times the voltage of a over b. */
    void transferAdmittance(int from, int to, int a, int b, double yRe, double yIm) {
        add(from, a, yRe, yIm);
        add(to, b, yRe, yIm);
        add(from, b, -yRe, -yIm);
        add(to, a, -yRe, -yIm);
    }

    /** Adds a voltage source from {@code minus} to {@code plus} whose current is the unknown {@code unknown}. */
    void source(int plus, int minus, int unknown) {
        add(plus, unknown, 1, 0);
        add(minus, unknown, -1, 0);
        add(unknown, plus, 1, 0);
        add(unknown, minus, -1, 0);
    }

    private void add(int row, int column, double valueRe, double valueIm) {
        if (row >= 0 && column >= 0) {
            re[row * size + column] += valueRe;
            im[row * size + column] += valueIm;
        }
    }

    /**
     * Factors in place, rows exchanged for the largest pivot.
     *
     * @return −1, or the first unknown that the equations leave undetermined
     */
    int factor() {
        Arrays.fill(largest, 0);
        for (int i = 0; i < size; i++) {
            for (int j = 0; j < size; j++) {
                largest[j] = Math.max(largest[j], Math.abs(re[i * size + j]) + Math.abs(im[i * size + j]));
            }
        }
        for (int k = 0; k < size; k++) {
            int best = k;
            double bestSize = -1;
            for (int i = k; i < size; i++) {
                double candidate = Math.abs(re[i * size + k]) + Math.abs(im[i * size + k]);
                if (candidate > bestSize) {
                    best = i;
                    bestSize = candidate;
                }
            }
            if (!(bestSize > NO_PIVOT * largest[k])) {
                return k;
            }
            swap[k] = best;
            takeOut(k, best);
            eliminate(k);
        }
        return -1;
    }

    /** Moves the pivot row into place and notes where it is not zero beyond the diagonal: in a few places only. */
    private void takeOut(int k, int best) {
        filled = 0;
        for (int j = 0; j < size; j++) {
            int here = k * size + j;
            if (best != k) {
                int there = best * size + j;
                double keptRe = re[there];
                double keptIm = im[there];
                re[there] = re[here];
                im[there] = im[here];
                re[here] = keptRe;
                im[here] = keptIm;
            }
            if (j > k && (re[here] != 0 || im[here] != 0)) {
                columns[filled++] = j;
            }
        }
    }

    private void eliminate(int k) {
        int pivotRow = k * size;
        double pivotRe = re[pivotRow + k];
        double pivotIm = im[pivotRow + k];
        double square = pivotRe * pivotRe + pivotIm * pivotIm;
        for (int i = k + 1; i < size; i++) {
            int row = i * size;
            double aRe = re[row + k];
            double aIm = im[row + k];
            if (aRe == 0 && aIm == 0) {
                continue;
            }
            double factorRe = (aRe * pivotRe + aIm * pivotIm) / square;
            double factorIm = (aIm * pivotRe - aRe * pivotIm) / square;
            re[row + k] = factorRe;
            im[row + k] = factorIm;
            for (int c = 0; c < filled; c++) {
                int j = columns[c];
                double uRe = re[pivotRow + j];
                double uIm = im[pivotRow + j];
                re[row + j] -= factorRe * uRe - factorIm * uIm;
                im[row + j] -= factorRe * uIm + factorIm * uRe;
            }
        }
    }

    /** Solves with the factors; the right-hand side becomes the solution. */
    void solve(double[] xRe, double[] xIm) {
        for (int k = 0; k < size; k++) {
            int other = swap[k];
            double keptRe = xRe[other];
            double keptIm = xIm[other];
            xRe[other] = xRe[k];
            xIm[other] = xIm[k];
            xRe[k] = keptRe;
            xIm[k] = keptIm;
        }
        for (int i = 0; i < size; i++) {
            subtractRow(i, 0, i, xRe, xIm);
        }
        for (int i = size - 1; i >= 0; i--) {
            subtractRow(i, i + 1, size, xRe, xIm);
            double dRe = re[i * size + i];
            double dIm = im[i * size + i];
            double square = dRe * dRe + dIm * dIm;
            double numRe = (xRe[i] * dRe + xIm[i] * dIm) / square;
            xIm[i] = (xIm[i] * dRe - xRe[i] * dIm) / square;
            xRe[i] = numRe;
        }
    }

    private void subtractRow(int i, int from, int to, double[] xRe, double[] xIm) {
        double sumRe = xRe[i];
        double sumIm = xIm[i];
        for (int j = from; j < to; j++) {
            double aRe = re[i * size + j];
            double aIm = im[i * size + j];
            sumRe -= aRe * xRe[j] - aIm * xIm[j];
            sumIm -= aRe * xIm[j] + aIm * xRe[j];
        }
        xRe[i] = sumRe;
        xIm[i] = sumIm;
    }
}
