package undermask.signal;

/**
 * Frequencies of a block at which factors of edges are taken, and the polynomials that interpolate between them: the
 * Chebyshev points of the block and Lagrange's basis on them.
 *
 * <p>Source: Berrut and Trefethen, Barycentric Lagrange interpolation, SIAM Review 46 (2004).
 */
final class InterpolationNodes {
    private static final int[] COUNTS = {1, 2, 3, 4, 5, 6, 7, 8, 10, 12, 14, 16, 20, 24, 32, 40};
    private static final InterpolationNodes[] SETS = sets();

    private final double[] places;
    private final double[] signs;
    /** Basis of each node at each line of a full block. */
    private double[][] basis;

    private InterpolationNodes(int count) {
        places = new double[count];
        signs = new double[count];
        for (int k = 0; k < count; k++) {
            double angle = Math.PI * (k + 0.5) / count;
            places[k] = 0.5 - 0.5 * Math.cos(angle);
            signs[k] = (k % 2 == 0 ? 1 : -1) * Math.sin(angle);
        }
    }

    private static InterpolationNodes[] sets() {
        InterpolationNodes[] sets = new InterpolationNodes[COUNTS.length];
        for (int i = 0; i < sets.length; i++) {
            sets[i] = new InterpolationNodes(COUNTS[i]);
        }
        return sets;
    }

    /**
     * The smallest set that interpolates the factors of some shapes well enough.
     *
     * @param from start of the block in Hz
     * @param width of the block in Hz
     * @param tolerance largest error of a factor, as a share of the root of their mean square in the block's middle
     * @param below sets of so many nodes and more are not wanted
     * @return null when no smaller set does
     */
    static InterpolationNodes fewest(EdgeShape[] shapes, double from, double width, double tolerance, int below) {
        double allowed = tolerance * typical(shapes, from + width / 2);
        for (InterpolationNodes set : SETS) {
            if (set.count() >= below) {
                return null;
            }
            if (set.error(shapes, from, width, allowed) <= allowed) {
                return set;
            }
        }
        return null;
    }

    private static double typical(EdgeShape[] shapes, double frequency) {
        double[] out = new double[2];
        double sum = 0;
        for (EdgeShape shape : shapes) {
            shape.factor(frequency, out);
            sum += out[0] * out[0] + out[1] * out[1];
        }
        return Math.sqrt(sum / Math.max(1, shapes.length));
    }

    /** The largest error over some shapes half-way between nodes and at the block's ends, or one above the tolerance. */
    private double error(EdgeShape[] shapes, double from, double width, double tolerance) {
        int count = count();
        double[] out = new double[2];
        double[] re = new double[count];
        double[] im = new double[count];
        double largest = 0;
        for (EdgeShape shape : shapes) {
            for (int k = 0; k < count; k++) {
                shape.factor(frequency(k, from, width), out);
                re[k] = out[0];
                im[k] = out[1];
            }
            for (int probe = 0; probe <= count; probe++) {
                double place = 0.5 - 0.5 * Math.cos(Math.PI * probe / count);
                double x = 0;
                double y = 0;
                for (int k = 0; k < count; k++) {
                    double share = basis(k, place);
                    x += share * re[k];
                    y += share * im[k];
                }
                shape.factor(from + place * width, out);
                largest = Math.max(largest, Math.hypot(x - out[0], y - out[1]));
            }
            if (largest > tolerance) {
                return largest;
            }
        }
        return largest;
    }

    int count() {
        return places.length;
    }

    /** A node's frequency in a block, Hz. */
    double frequency(int node, double from, double width) {
        return from + places[node] * width;
    }

    /** A node's polynomial at each line of a full block. */
    synchronized double[] basis(int node) {
        if (basis == null) {
            int lines = NonUniformTransform.BLOCK.modes();
            basis = new double[count()][lines];
            for (int i = 0; i < lines; i++) {
                double place = (double) i / lines;
                for (int k = 0; k < count(); k++) {
                    basis[k][i] = basis(k, place);
                }
            }
        }
        return basis[node];
    }

    private double basis(int node, double place) {
        double sum = 0;
        for (int k = 0; k < count(); k++) {
            double apart = place - places[k];
            if (apart == 0) {
                return k == node ? 1 : 0;
            }
            sum += signs[k] / apart;
        }
        return signs[node] / ((place - places[node]) * sum);
    }
}
