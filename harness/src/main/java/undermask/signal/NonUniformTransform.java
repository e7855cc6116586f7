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
        for (int i = 0; i < modes; i++) {
            deconvolution[i] = 1 / kernelTransform(2 * Math.PI * (i - modes / 2) / grid);
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

    /** Transform of the kernel at an angle per grid point, by midpoint sums of the smooth integrand. */
    private static double kernelTransform(double angle) {
        // z = sin u makes the integrand periodic and smooth, so that the midpoint rule converges exponentially
        int nodes = 200;
        double sum = 0;
        for (int i = 0; i < nodes; i++) {
            double u = Math.PI * ((i + 0.5) / nodes - 0.5);
            double z = Math.sin(u);
            double cos = Math.cos(u);
            sum += Math.exp(BETA * (cos - 1)) * Math.cos(angle * z * WIDTH / 2) * cos;
        }
        return sum * Math.PI / nodes * WIDTH / 2;
    }
}
