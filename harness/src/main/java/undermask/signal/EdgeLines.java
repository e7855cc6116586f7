package undermask.signal;

/** Lines of an edge train, a block of neighbouring lines per transform. */
final class EdgeLines implements Lines {
    private final EdgeTrain train;
    private final NonUniformTransform transform = NonUniformTransform.BLOCK;
    /** Origins of the edges' shapes as a share of the window, 0 to 1. */
    private final double[] places;

    private final int[] start;
    private final double[] weights;
    private final double[] grid;
    private final double[] factor = new double[2];

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
        java.util.Arrays.fill(re, to, to + count, 0);
        java.util.Arrays.fill(im, to, to + count, 0);
        for (int shape = 0; shape < train.shapes().size(); shape++) {
            spread(shape, first + transform.modes() / 2);
            transform.forward(grid);
            gather(train.shapes().get(shape), first, count, re, im, to);
        }
    }

    /** Spreads the edges of one shape, shifted in frequency so that the block's centre lies at zero. */
    private void spread(int shape, long centre) {
        java.util.Arrays.fill(grid, 0);
        int points = transform.grid();
        for (int e = 0; e < start.length; e++) {
            if (train.shapeIndex(e) != shape) {
                continue;
            }
            double turns = centre * places[e];
            double angle = -2 * Math.PI * (turns - Math.rint(turns));
            double re = train.step(e) * Math.cos(angle);
            double im = train.step(e) * Math.sin(angle);
            int offset = e * NonUniformTransform.WIDTH;
            for (int i = 0; i < NonUniformTransform.WIDTH; i++) {
                int point = start[e] + i;
                point = 2 * (point < points ? point : point - points);
                grid[point] += weights[offset + i] * re;
                grid[point + 1] += weights[offset + i] * im;
            }
        }
    }

    private void gather(EdgeShape shape, int first, int count, double[] re, double[] im, int to) {
        double spacing = spacing();
        for (int i = 0; i < count; i++) {
            double frequency = (first + i) * spacing;
            shape.factor(frequency, factor);
            // 1/(T·j2πf) turns the sum of steps into a coefficient
            double scale = transform.deconvolution(i) / (2 * Math.PI * (first + (double) i));
            int at = transform.index(i);
            double x = grid[at] * scale;
            double y = grid[at + 1] * scale;
            re[to + i] += y * factor[0] + x * factor[1];
            im[to + i] += y * factor[1] - x * factor[0];
        }
    }
}
