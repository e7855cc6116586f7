package undermask.signal;

import org.jtransforms.fft.DoubleFFT_1D;
import pl.edu.icm.jlargearrays.ConcurrencyUtils;

/**
 * The non-uniform Fourier transform of type 1: Σ s_e·exp(−jk·x_e) for whole k around 0, by spreading the strengths onto
 * an oversampled grid, a fast Fourier transform and division by the spreading kernel's own transform.
 *
 * <p>Source: Greengard and Lee, Accelerating the nonuniform fast Fourier transform, SIAM Review 46 (2004); the kernel
 * exp(β(√(1 − z²) − 1)) is that of Barnett, Magland and af Klinteberg, SIAM J. Sci. Comput. 41 (2019).
 */
final class NonUniformTransform {
    static {
        // the library's own threads would outlive the work by a minute
        ConcurrencyUtils.setNumberOfThreads(1);
    }

    /** Grid points that one strength is spread over. */
    static final int WIDTH = 13;

    private static final double BETA = 2.3 * WIDTH;
    private static final int OVERSAMPLING = 2;

    private static final int NODES = 20;
    private static final double[] NODE_PLACES = new double[NODES];
    private static final double[] NODE_WEIGHTS = new double[NODES];

    static {
        for (int i = 0; i < NODES; i++) {
            double u = Math.PI / 2 * (i + 0.5) / NODES;
            NODE_PLACES[i] = Math.sin(u) * WIDTH / 2;
            NODE_WEIGHTS[i] = Math.exp(BETA * (Math.cos(u) - 1)) * Math.cos(u) * Math.PI / NODES * WIDTH / 2;
        }
    }

    /** The one plan: lines per block. Immutable, hence shared. */
    static final NonUniformTransform BLOCK = new NonUniformTransform(1 << 14);

    private final int modes;
    private final int grid;
    private final DoubleFFT_1D fft;
    private final double[] deconvolution;

    private NonUniformTransform(int modes) {
        this.modes = modes;
        this.grid = OVERSAMPLING * modes;
        this.fft = new DoubleFFT_1D(grid);
        this.deconvolution = new double[modes];
        for (int bin = 0; bin <= modes / 2; bin++) {
            double factor = 1 / kernelTransform(2 * Math.PI * bin / grid);
            deconvolution[modes / 2 - bin] = factor;
            if (bin < modes / 2) {
                deconvolution[modes / 2 + bin] = factor;
            }
        }
    }

    /** Lines that one transform gives. */
    int modes() {
        return modes;
    }

    /** Points of the oversampled grid. */
    int grid() {
        return grid;
    }

    /**
     * First grid point and kernel weights of a strength at a place.
     *
     * @param place in periods, 0 to 1
     * @param weights receives WIDTH weights from {@code offset}
     * @return the first grid point; those that follow wrap at the grid's end
     */
    int spread(double place, double[] weights, int offset) {
        double centre = place * grid;
        int start = (int) Math.ceil(centre - WIDTH / 2.0);
        for (int i = 0; i < WIDTH; i++) {
            double z = (start + i - centre) / (WIDTH / 2.0);
            weights[offset + i] = Math.abs(z) <= 1 ? Math.exp(BETA * (Math.sqrt(1 - z * z) - 1)) : 0;
        }
        return Math.floorMod(start, grid);
    }

    /**
     * Transforms a spread grid in place.
     *
     * @param points interleaved complex grid, 2·{@link #grid()} long
     */
    void forward(double[] points) {
        fft.complexForward(points);
    }

    /** Place of a mode's real part in the transformed grid. */
    int index(int mode) {
        int bin = mode - modes / 2;
        return 2 * (bin < 0 ? bin + grid : bin);
    }

    /** Factor that takes the kernel out of a mode, counted from the lowest one. */
    double deconvolution(int mode) {
        return deconvolution[mode];
    }

    /** Transform of the kernel, an even function, at an angle per grid point. */
    private static double kernelTransform(double angle) {
        // z = sin u makes the integrand periodic and smooth, so that the midpoint rule converges exponentially
        double sum = 0;
        for (int i = 0; i < NODES; i++) {
            sum += NODE_WEIGHTS[i] * Math.cos(angle * NODE_PLACES[i]);
        }
        return sum;
    }
}
