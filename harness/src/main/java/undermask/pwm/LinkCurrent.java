package undermask.pwm;

import java.util.List;
import java.util.stream.IntStream;
import undermask.signal.EdgeTrain;
import undermask.signal.Lines;

/**
 * The current that the bridge takes from the DC link, Σ s_k·i_k with s_k 1 while leg k is at the upper rail. Its lines
 * follow from those of the legs: a sine shifts them by the output frequency, up and down.
 */
public final class LinkCurrent {
    private static final double[] GAUSS_PLACES = {0.06943184420297371, 0.33000947820757187};
    private static final double[] GAUSS_WEIGHTS = {0.17392742256872692, 0.32607257743127307};

    private final AnalysisWindow window;
    /** Legs in units of the link voltage, between −1/2 and 1/2. */
    private final List<EdgeTrain> units;

    private final PhaseCurrents currents;
    /** Instants at which any leg switches, and which legs are at the upper rail after each. */
    private final EdgeTrain[] legs;

    LinkCurrent(AnalysisWindow window, List<EdgeTrain> units, PhaseCurrents currents) {
        this.window = window;
        this.units = units;
        this.currents = currents;
        this.legs = units.toArray(EdgeTrain[]::new);
    }

    /**
     * Lines of the current in A, of the load's sine alone: the carrier ripple, a few percent of the current, is left out.
     * One reader at a time.
     */
    public Lines lines() {
        return new Shifted();
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

    private final class Shifted implements Lines {
        private final List<Lines> spectra = units.stream().map(EdgeTrain::lines).toList();
        private double[] re = new double[0];
        private double[] im = new double[0];

        @Override
        public double spacing() {
            return 1 / window.seconds();
        }

        @Override
        public void read(int first, int count, double[] outRe, double[] outIm) {
            if (first < 1) {
                throw new IllegalArgumentException("line " + first + " is not above zero");
            }
            int shift = window.fundamentalPeriods();
            int size = count + 2 * shift;
            if (re.length < size) {
                re = new double[size];
                im = new double[size];
            }
            java.util.Arrays.fill(outRe, 0, count, 0);
            java.util.Arrays.fill(outIm, 0, count, 0);
            for (int k = 0; k < legs.length; k++) {
                around(k, first - shift, size);
                // half the phasor of the sine: i = 2·Re(h·exp(jω1t))
                double lag = Math.atan2(currents.sine(k, 0.25 * window.seconds() / shift), currents.sine(k, 0));
                double half = Math.hypot(currents.sine(k, 0.25 * window.seconds() / shift), currents.sine(k, 0)) / 2;
                double hRe = half * Math.cos(lag);
                double hIm = -half * Math.sin(lag);
                for (int i = 0; i < count; i++) {
                    double belowRe = re[i];
                    double belowIm = im[i];
                    double aboveRe = re[i + 2 * shift];
                    double aboveIm = im[i + 2 * shift];
                    outRe[i] += hRe * (belowRe + aboveRe) + hIm * (aboveIm - belowIm);
                    outIm[i] += hRe * (belowIm + aboveIm) + hIm * (belowRe - aboveRe);
                }
            }
        }

        /** Lines of a leg from a number that may lie below 1: line 0 is the mean, negative ones are conjugate. */
        private void around(int leg, int first, int size) {
            int from = Math.max(1, first);
            int missing = from - first;
            Lines lines = spectra.get(leg);
            double[] aboveRe = new double[Math.max(size - missing, missing)];
            double[] aboveIm = new double[aboveRe.length];
            lines.read(from, aboveRe.length, aboveRe, aboveIm);
            for (int i = 0; i < size; i++) {
                int line = first + i;
                if (line == 0) {
                    re[i] = 0.5 + units.get(leg).mean();
                    im[i] = 0;
                } else {
                    re[i] = aboveRe[Math.abs(line) - from];
                    im[i] = line > 0 ? aboveIm[line - from] : -aboveIm[-line - from];
                }
            }
        }
    }
}
