package undermask.signal;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;

/**
 * A waveform that is a sum of edges within one window and repeats after it. Edges rise in time.
 *
 * <p>What the steps of a window do not bring back to its first level would be a ramp without end; such a train is
 * refused.
 */
public final class EdgeTrain {
    private static final double CLOSES_TO = 1e-9;

    private final double period;
    private final double[] times;
    private final double[] steps;
    private final int[] shapeOf;
    private final List<EdgeShape> shapes;
    private final double initialLevel;

    /**
     * Takes copies and sorts by time; edges of equal time keep their order.
     *
     * @param period window in s, positive
     * @param times instants in s, 0 ≤ t &lt; period
     * @param steps heights in V, their sum 0
     * @param shapeOf index into {@code shapes} for each edge
     * @param shapes the shapes that occur
     * @param initialLevel level just before the first edge in V
     */
    public EdgeTrain(
            double period, double[] times, double[] steps, int[] shapeOf, List<EdgeShape> shapes, double initialLevel) {
        if (!(period > 0) || Double.isInfinite(period)) {
            throw new IllegalArgumentException("window of an edge train is " + period + " s");
        }
        if (steps.length != times.length || shapeOf.length != times.length) {
            throw new IllegalArgumentException("an edge needs an instant, a height and a shape");
        }
        Integer[] order = new Integer[times.length];
        Arrays.setAll(order, i -> i);
        Arrays.sort(order, Comparator.comparingDouble(i -> times[i]));
        this.period = period;
        this.times = new double[times.length];
        this.steps = new double[times.length];
        this.shapeOf = new int[times.length];
        this.shapes = List.copyOf(shapes);
        this.initialLevel = initialLevel;
        double sum = 0;
        double modulus = 0;
        for (int i = 0; i < order.length; i++) {
            int from = order[i];
            if (!(times[from] >= 0 && times[from] < period)) {
                throw new IllegalArgumentException("edge at " + times[from] + " s lies outside its window");
            }
            this.times[i] = times[from];
            this.steps[i] = steps[from];
            this.shapeOf[i] = shapeOf[from];
            sum += steps[from];
            modulus += Math.abs(steps[from]);
        }
        if (Math.abs(sum) > CLOSES_TO * modulus) {
            throw new IllegalArgumentException("the edges of a window leave a rest of " + sum + " V");
        }
    }

    /**
     * A weighted sum of trains of one window: (1, −1) of two legs is the line-to-line voltage.
     *
     * @throws IllegalArgumentException when the windows differ
     */
    public static EdgeTrain sum(List<EdgeTrain> trains, double... weights) {
        int size = trains.stream().mapToInt(EdgeTrain::size).sum();
        double[] times = new double[size];
        double[] steps = new double[size];
        int[] shapeOf = new int[size];
        List<EdgeShape> shapes = new ArrayList<>();
        double level = 0;
        int to = 0;
        for (int k = 0; k < weights.length; k++) {
            EdgeTrain train = trains.get(k);
            if (train.period != trains.get(0).period) {
                throw new IllegalArgumentException("trains of different windows have no sum");
            }
            level += weights[k] * train.initialLevel;
            for (int i = 0; i < train.size(); i++, to++) {
                times[to] = train.times[i];
                steps[to] = weights[k] * train.steps[i];
                shapeOf[to] = indexOf(train.shape(i), shapes);
            }
        }
        return new EdgeTrain(trains.get(0).period, times, steps, shapeOf, shapes, level);
    }

    private static int indexOf(EdgeShape shape, List<EdgeShape> shapes) {
        int index = shapes.indexOf(shape);
        if (index >= 0) {
            return index;
        }
        shapes.add(shape);
        return shapes.size() - 1;
    }

    /** Number of edges in one period. */
    public int size() {
        return times.length;
    }

    /** Length of the window in s, after which the train repeats. */
    public double period() {
        return period;
    }

    /** Instant of an edge in s, rising with the index, 0 ≤ t &lt; period. */
    public double time(int edge) {
        return times[edge];
    }

    /** Height of an edge in V, signed. */
    public double step(int edge) {
        return steps[edge];
    }

    /** Shape of an edge. */
    public EdgeShape shape(int edge) {
        return shapes.get(shapeOf[edge]);
    }

    /** Level just before the first edge of the window, V. */
    public double initialLevel() {
        return initialLevel;
    }

    /** The shapes that occur. */
    List<EdgeShape> shapes() {
        return shapes;
    }

    /** Index into {@link #shapes()} of an edge's shape. */
    int shapeIndex(int edge) {
        return shapeOf[edge];
    }

    /**
     * The exact Fourier coefficients, c_n = (1/T)·Σ ΔV_e·E_e(f_n)·exp(−j2πf_n·t_e)/(j2πf_n). One reader at a time: the
     * result keeps buffers.
     */
    public Lines lines() {
        return new EdgeLines(this);
    }
}
