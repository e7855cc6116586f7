package undermask.pwm;

import java.util.List;
import java.util.stream.IntStream;
import undermask.signal.EdgeTrain;
import undermask.signal.Lines;

/**
 * The current that the bridge takes from the DC link, Σ s_k·i_k with s_k 1 while leg k is at the upper rail. As the three
 * currents add up to nothing, that is Σ (s_k − 1/2)·i_k: the legs' edges, each as high as its current.
 */
public final class LinkCurrent {
    private static final double[] GAUSS_PLACES = {0.06943184420297371, 0.33000947820757187};
    private static final double[] GAUSS_WEIGHTS = {0.17392742256872692, 0.32607257743127307};

    /** Points per output period between which a current is taken as straight. */
    private static final double SINE_POINTS = 200;

    private final AnalysisWindow window;
    private final PhaseCurrents currents;
    /** Legs in units of the link voltage, between −1/2 and 1/2. */
    private final EdgeTrain[] legs;

    private final EdgeTrain train;

    LinkCurrent(AnalysisWindow window, List<EdgeTrain> units, PhaseCurrents currents) {
        this.window = window;
        this.currents = currents;
        this.legs = units.toArray(EdgeTrain[]::new);
        double outputPeriod = window.seconds() / window.fundamentalPeriods();
        List<EdgeTrain> shares = IntStream.range(0, legs.length)
                .mapToObj(k -> legs[k].times(time -> currents.at(k, time), outputPeriod / SINE_POINTS))
                .toList();
        this.train = EdgeTrain.sum(shares, 1, 1, 1);
    }

    /** Lines of the current in A. One reader at a time. */
    public Lines lines() {
        return train.lines();
    }

    /** The current as steps as high as the legs' currents, with the slopes between them. */
    public EdgeTrain train() {
        return train;
    }

    /** Mean in A. */
    public double mean() {
        return moments()[0];
    }

    /** Rms in A of what the link capacitor takes: all but the mean. The carrier ripple is included. */
    public double capacitorRms() {
        double[] moments = moments();
        return Math.sqrt(Math.max(0, moments[1] - moments[0] * moments[0]));
    }

    /** The current at a time with given states of the legs, A. */
    double at(double time, boolean[] upper) {
        double sum = 0;
        for (int k = 0; k < upper.length; k++) {
            sum += upper[k] ? currents.at(k, time) : 0;
        }
        return sum;
    }

    /** Mean and mean square. */
    private double[] moments() {
        double[] times = IntStream.range(0, legs.length)
                .mapToObj(k -> IntStream.range(0, legs[k].size()).mapToDouble(legs[k]::time))
                .flatMapToDouble(stream -> stream)
                .sorted()
                .toArray();
        boolean[] upper = new boolean[legs.length];
        int[] next = new int[legs.length];
        double[] level = new double[legs.length];
        for (int k = 0; k < legs.length; k++) {
            level[k] = legs[k].initialLevel();
        }
        double mean = 0;
        double square = 0;
        double from = 0;
        for (int i = 0; i <= times.length; i++) {
            double to = i < times.length ? times[i] : window.seconds();
            for (int k = 0; k < legs.length; k++) {
                upper[k] = level[k] > 0;
            }
            for (int g = 0; g < 2 * GAUSS_PLACES.length; g++) {
                double place = g % 2 == 0 ? GAUSS_PLACES[g / 2] : 1 - GAUSS_PLACES[g / 2];
                double amperes = at(from + (to - from) * place, upper);
                mean += amperes * GAUSS_WEIGHTS[g / 2] * (to - from);
                square += amperes * amperes * GAUSS_WEIGHTS[g / 2] * (to - from);
            }
            for (int k = 0; k < legs.length; k++) {
                while (next[k] < legs[k].size() && legs[k].time(next[k]) <= to) {
                    level[k] += legs[k].step(next[k]++);
                }
            }
            from = to;
        }
        return new double[] {mean / window.seconds(), square / window.seconds()};
    }
}
