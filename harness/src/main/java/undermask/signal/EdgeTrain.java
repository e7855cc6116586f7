package undermask.signal;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.DoubleUnaryOperator;

/**
 * A waveform that is a sum of edges within one window and repeats after it. Edges rise in time. Between edges the level
 * is constant, or runs straight with a slope of its own.
 *
 * <p>What the edges of a window do not bring back to its first level would be a ramp without end; such a train is
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
    /** Slope after each edge in V/s; empty where all levels are constant. */
    private final double[] slopes;

    /**
     * A train of constant levels. Takes copies and sorts by time; edges of equal time keep their order.
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
        this(period, times, steps, shapeOf, shapes, initialLevel, new double[0], order(times));
    }

    private EdgeTrain(
            double period,
            double[] times,
            double[] steps,
            int[] shapeOf,
            List<EdgeShape> shapes,
            double initialLevel,
            double[] slopes,
            int[] order) {
        if (!(period > 0) || Double.isInfinite(period)) {
            throw new IllegalArgumentException("window of an edge train is " + period + " s");
        }
        if (steps.length != times.length || shapeOf.length != times.length) {
            throw new IllegalArgumentException("an edge needs an instant, a height and a shape");
        }
        this.period = period;
        this.times = new double[times.length];
        this.steps = new double[times.length];
        this.shapeOf = new int[times.length];
        this.shapes = List.copyOf(shapes);
        this.initialLevel = initialLevel;
        this.slopes = slopes;
        double modulus = 0;
        for (int i = 0; i < order.length; i++) {
            int from = order[i];
            if (!(times[from] >= 0 && times[from] < period)) {
                throw new IllegalArgumentException("edge at " + times[from] + " s lies outside its window");
            }
            this.times[i] = times[from];
            this.steps[i] = steps[from];
            this.shapeOf[i] = shapeOf[from];
            modulus += Math.abs(steps[from]);
        }
        double rest = 0;
        for (int i = 0; i < order.length; i++) {
            rest += this.steps[i] + slope(i) * lengthAfter(i);
        }
        if (Math.abs(rest) > CLOSES_TO * modulus) {
            throw new IllegalArgumentException("the edges of a window leave a rest of " + rest + " V");
        }
    }

    private static int[] order(double[] times) {
        Integer[] order = new Integer[times.length];
        Arrays.setAll(order, i -> i);
        Arrays.sort(order, Comparator.comparingDouble(i -> times[i]));
        return Arrays.stream(order).mapToInt(Integer::intValue).toArray();
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
        double[] kinks = new double[size];
        int[] shapeOf = new int[size];
        List<EdgeShape> shapes = new ArrayList<>();
        Map<EdgeShape, Integer> known = new HashMap<>();
        double slope = 0;
        boolean sloping = false;
        int to = 0;
        for (int k = 0; k < weights.length; k++) {
            EdgeTrain train = trains.get(k);
            if (train.period != trains.get(0).period) {
                throw new IllegalArgumentException("trains of different windows have no sum");
            }
            int last = train.size() - 1;
            slope += last < 0 ? 0 : weights[k] * train.slope(last);
            sloping |= train.sloping();
            for (int i = 0; i <= last; i++, to++) {
                times[to] = train.times[i];
                steps[to] = weights[k] * train.steps[i];
                kinks[to] = weights[k] * (train.slope(i) - train.slope(i == 0 ? last : i - 1));
                shapeOf[to] = known.computeIfAbsent(train.shape(i), shape -> {
                    shapes.add(shape);
                    return shapes.size() - 1;
                });
            }
        }
        int[] order = order(times);
        double[] slopes = new double[sloping ? size : 0];
        for (int i = 0; i < slopes.length; i++) {
            slope += kinks[order[i]];
            slopes[i] = slope;
        }
        double level = 0;
        for (int k = 0; k < weights.length; k++) {
            EdgeTrain train = trains.get(k);
            double ahead = train.size() == 0 ? 0 : train.times[0] - times[order[0]];
            level += weights[k] * (train.initialLevel - (ahead == 0 ? 0 : train.slope(train.size() - 1) * ahead));
        }
        return new EdgeTrain(trains.get(0).period, times, steps, shapeOf, shapes, level, slopes, order);
    }

    /** This train with all levels multiplied. */
    public EdgeTrain times(double factor) {
        return sum(List.of(this), factor);
    }

    /**
     * This train, of constant levels, multiplied by a gain that changes slowly and is taken as straight between edges
     * and between points that are added where edges lie far apart.
     *
     * @param gain over time in s, periodic with the window
     * @param farApart longest distance of such points in s
     */
    public EdgeTrain times(DoubleUnaryOperator gain, double farApart) {
        List<double[]> points = new ArrayList<>();
        double level = initialLevel;
        for (int e = 0; e < size(); e++) {
            points.add(new double[] {times[e], steps[e], shapeOf[e]});
            double length = lengthAfter(e);
            int pieces = (int) Math.ceil(length / farApart);
            for (int piece = 1; piece < pieces; piece++) {
                double time = times[e] + length * piece / pieces;
                points.add(new double[] {time < period ? time : time - period, 0, shapeOf[e]});
            }
        }
        points.sort(Comparator.comparingDouble(point -> point[0]));
        int count = points.size();
        double[] at = new double[count];
        double[] heights = new double[count];
        int[] shape = new int[count];
        double[] slope = new double[count];
        int[] order = new int[count];
        double[] gains = new double[count];
        for (int i = 0; i < count; i++) {
            at[i] = points.get(i)[0];
            shape[i] = (int) points.get(i)[2];
            order[i] = i;
            gains[i] = gain.applyAsDouble(at[i]);
        }
        for (int i = 0; i < count; i++) {
            level += points.get(i)[1];
            heights[i] = points.get(i)[1] * gains[i];
            double length = i + 1 < count ? at[i + 1] - at[i] : at[0] + period - at[i];
            slope[i] = length > 0 ? level * (gains[(i + 1) % count] - gains[i]) / length : 0;
        }
        double first = count == 0 ? initialLevel * gain.applyAsDouble(0) : initialLevel * gains[0];
        return new EdgeTrain(period, at, heights, shape, shapes, first, slope, order);
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

    /** Slope between an edge and the next one, V/s. */
    public double slope(int edge) {
        return slopes.length == 0 ? 0 : slopes[edge];
    }

    /** Time from an edge to the next one, over the end of the window for the last, s. */
    public double lengthAfter(int edge) {
        return (edge + 1 < times.length ? times[edge + 1] : times[0] + period) - times[edge];
    }

    /** Shape of an edge. */
    public EdgeShape shape(int edge) {
        return shapes.get(shapeOf[edge]);
    }

    /** Level just before the first edge of the window, V. */
    public double initialLevel() {
        return initialLevel;
    }

    /** Mean over the window, edges taken as instants, V. */
    public double mean() {
        double level = initialLevel;
        double sum = size() == 0 ? level * period : 0;
        for (int e = 0; e < size(); e++) {
            level += steps[e];
            double end = level + slope(e) * lengthAfter(e);
            sum += (level + end) / 2 * lengthAfter(e);
            level = end;
        }
        return sum / period;
    }

    /** Rms value over the window, edges taken as instants, V. */
    public double rms() {
        double level = initialLevel;
        double sum = size() == 0 ? level * level * period : 0;
        for (int e = 0; e < size(); e++) {
            level += steps[e];
            double end = level + slope(e) * lengthAfter(e);
            sum += (level * level + level * end + end * end) / 3 * lengthAfter(e);
            level = end;
        }
        return Math.sqrt(sum / period);
    }

    /** The shapes that occur. */
    List<EdgeShape> shapes() {
        return shapes;
    }

    /** Index into {@link #shapes()} of an edge's shape. */
    int shapeIndex(int edge) {
        return shapeOf[edge];
    }

    /** Whether any level is not constant. */
    boolean sloping() {
        return slopes.length > 0;
    }

    /**
     * The exact Fourier coefficients, c_n = (1/T)·Σ ΔV_e·E_e(f_n)·exp(−j2πf_n·t_e)/(j2πf_n), and for each change of slope
     * its part over (j2πf_n)² where it counts. One reader at a time: the result keeps buffers.
     */
    public Lines lines() {
        return new EdgeLines(this);
    }
}
