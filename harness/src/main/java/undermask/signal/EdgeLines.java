package undermask.signal;

import java.util.Arrays;

/**
 * Lines of an edge train, a block of neighbouring lines per set of transforms.
 *
 * <p>Few shapes take a transform each. Of many, as with transition times that follow the current, each edge's factor is
 * taken at a few frequencies of the block and interpolated between them, which needs a transform per frequency however
 * many shapes there are; as many frequencies as keep the interpolation's error below {@link #tolerance}.
 */
final class EdgeLines implements Lines {
    /** What a change of slope adds beyond is below 1e-4 of the edges: a ripple of tenths at hundreds of hertz. */
    private static final double SLOPES_COUNT_UP_TO = 100e3;

    private static final int PROBES = 64;

    private final EdgeTrain train;
    private final NonUniformTransform transform = NonUniformTransform.BLOCK;
    /** Origins of the edges' shapes as a share of the window, 0 to 1. */
    private final double[] places;

    private final int[] start;
    private final double[] weights;
    private final double[] grid;
    private final double[] factor = new double[2];
    private final EdgeShape[] probes;

    EdgeLines(EdgeTrain train) {
        this.train = train;
        this.places = new double[train.size()];
        this.start = new int[train.size()];
        this.weights = new double[train.size() * NonUniformTransform.WIDTH];
        this.grid = new double[2 * transform.grid()];
        for (int e = 0; e < start.length; e++) {
            double turns = (train.time(e) - train.shape(e).lead()) / train.period();
            places[e] = turns - Math.floor(turns);
            start[e] = transform.spread(places[e], weights, e * NonUniformTransform.WIDTH);
        }
        this.probes = probes();
    }

    /** Shapes of all lengths among those that occur, the longest and the shortest with them. */
    private EdgeShape[] probes() {
        EdgeShape[] sorted = train.shapes().toArray(EdgeShape[]::new);
        Arrays.sort(sorted, java.util.Comparator.comparingDouble(EdgeShape::transitionTime));
        int count = Math.min(PROBES, sorted.length);
        EdgeShape[] chosen = new EdgeShape[count];
        for (int i = 0; i < count; i++) {
            chosen[i] = sorted[(int) ((long) i * (sorted.length - 1) / Math.max(1, count - 1))];
        }
        return chosen;
    }

    @Override
    public double spacing() {
        return 1 / train.period();
    }

    @Override
    public void read(int first, int count, double[] re, double[] im) {
        if (first < 1) {
            throw new IllegalArgumentException("line " + first + " is not above zero");
        }
        for (int done = 0; done < count; done += transform.modes()) {
            block(first + done, Math.min(transform.modes(), count - done), re, im, done);
        }
    }

    private void block(int first, int count, double[] re, double[] im, int to) {
        Arrays.fill(re, to, to + count, 0);
        Arrays.fill(im, to, to + count, 0);
        InterpolationNodes nodes = InterpolationNodes.fewest(
                probes,
                first * spacing(),
                transform.modes() * spacing(),
                tolerance(first),
                train.shapes().size());
        if (nodes == null) {
            for (int shape = 0; shape < train.shapes().size(); shape++) {
                int wanted = shape;
                spread(first, e -> train.shapeIndex(e) == wanted ? train.step(e) : 0, null);
                gather(train.shapes().get(shape), first, count, re, im, to);
            }
        } else {
            for (int node = 0; node < nodes.count(); node++) {
                double frequency = nodes.frequency(node, first * spacing(), transform.modes() * spacing());
                spread(first, train::step, frequency);
                gather(nodes.basis(node), first, count, re, im, to);
            }
        }
        if (train.sloping() && first * spacing() < SLOPES_COUNT_UP_TO) {
            spread(first, e -> train.slope(e) - train.slope(e == 0 ? start.length - 1 : e - 1), null);
            gatherSlopes(first, count, re, im, to);
        }
    }

    /**
     * Largest error of an edge's factor as a share of what the factors are in the block. Line n has a weight of 1/n in
     * the spectrum, so early lines are held tighter; 1e-5, less than 0.0001 dB, is the loosest.
     */
    private static double tolerance(int first) {
        return Math.min(1e-5, 1e-9 * first);
    }

    private interface Strength {
        double of(int edge);
    }

    /**
     * Spreads strengths, shifted in frequency so that the block's centre lies at zero, and transforms them.
     *
     * @param frequency at which each edge's factor is taken; null for 1
     */
    private void spread(int first, Strength strength, Double frequency) {
        Arrays.fill(grid, 0);
        long centre = first + transform.modes() / 2;
        int points = transform.grid();
        factor[0] = 1;
        factor[1] = 0;
        for (int e = 0; e < start.length; e++) {
            double height = strength.of(e);
            if (height == 0) {
                continue;
            }
            if (frequency != null) {
                train.shape(e).factor(frequency, factor);
            }
            double turns = centre * places[e];
            double angle = -2 * Math.PI * (turns - Math.rint(turns));
            double cos = height * Math.cos(angle);
            double sin = height * Math.sin(angle);
            double re = cos * factor[0] - sin * factor[1];
            double im = cos * factor[1] + sin * factor[0];
            int offset = e * NonUniformTransform.WIDTH;
            for (int i = 0; i < NonUniformTransform.WIDTH; i++) {
                int point = start[e] + i;
                point = 2 * (point < points ? point : point - points);
                grid[point] += weights[offset + i] * re;
                grid[point + 1] += weights[offset + i] * im;
            }
        }
        transform.forward(grid);
    }

    private void gather(EdgeShape shape, int first, int count, double[] re, double[] im, int to) {
        double spacing = spacing();
        for (int i = 0; i < count; i++) {
            shape.factor((first + i) * spacing, factor);
            // 1/(T·j2πf) turns the sum of steps into a coefficient
            double scale = transform.deconvolution(i) / (2 * Math.PI * (first + (double) i));
            int at = transform.index(i);
            double x = grid[at] * scale;
            double y = grid[at + 1] * scale;
            re[to + i] += y * factor[0] + x * factor[1];
            im[to + i] += y * factor[1] - x * factor[0];
        }
    }

    private void gather(double[] basis, int first, int count, double[] re, double[] im, int to) {
        for (int i = 0; i < count; i++) {
            double scale = basis[i] * transform.deconvolution(i) / (2 * Math.PI * (first + (double) i));
            int at = transform.index(i);
            re[to + i] += grid[at + 1] * scale;
            im[to + i] -= grid[at] * scale;
        }
    }

    private void gatherSlopes(int first, int count, double[] re, double[] im, int to) {
        for (int i = 0; i < count; i++) {
            double angle = 2 * Math.PI * (first + (double) i);
            double scale = -transform.deconvolution(i) * train.period() / (angle * angle);
            int at = transform.index(i);
            re[to + i] += grid[at] * scale;
            im[to + i] += grid[at + 1] * scale;
        }
    }
}
