package undermask.check;

import java.util.Arrays;
import java.util.EnumMap;
import java.util.Map;
import java.util.SplittableRandom;
import undermask.installation.Installation;
import undermask.installation.Parasitic;
import undermask.network.InstallationNetwork;
import undermask.network.PortResponse;
import undermask.network.Variation;
import undermask.receiver.Detector;
import undermask.receiver.Receiver;

/**
 * Draws an installation's values anew, each log-normal about what is written, and keeps by which complex factor the
 * transfers change, on a logarithmic grid of frequencies. The source lines and what the detectors make of each mode do not
 * change.
 */
final class ToleranceRuns {
    private static final int POINTS = 320;

    private final double[] frequencies = new double[POINTS];
    /** Factors of run, port and frequency: common mode and link current, real and imaginary part each. */
    private final float[][][][] factors;

    private final int ports;

    /** Draws the runs of a policy, on a grid over what the receiver can be tuned to. */
    ToleranceRuns(Installation installation, InstallationNetwork network, Receiver receiver, Policy policy) {
        double low = receiver.lowest();
        double high = receiver.highest();
        for (int i = 0; i < POINTS; i++) {
            // rounding must not leave the receiver's bands
            frequencies[i] = Math.max(low, Math.min(high, low * Math.pow(high / low, i / (POINTS - 1.0))));
        }
        ports = network.ports().size();
        float[][][] nominal = solve(network.response(Variation.NONE));
        factors = new float[policy.toleranceRuns()][][][];
        SplittableRandom seeds = new SplittableRandom(policy.seed());
        for (int run = 0; run < factors.length; run++) {
            factors[run] = solve(network.response(drawn(installation, seeds.split())));
            for (int port = 0; port < ports; port++) {
                for (int i = 0; i < POINTS; i++) {
                    divide(factors[run][port][i], nominal[port][i]);
                }
            }
        }
    }

    private static Variation drawn(Installation installation, SplittableRandom random) {
        Map<Parasitic, Double> drawn = new EnumMap<>(Parasitic.class);
        for (Parasitic parasitic : Parasitic.values()) {
            double deviation = installation.deviation(parasitic);
            double sigma = Math.sqrt(Math.log1p(deviation * deviation));
            drawn.put(parasitic, Math.exp(sigma * gaussian(random)));
        }
        return drawn::get;
    }

    /** A normal deviate (Box and Muller 1958). */
    private static double gaussian(SplittableRandom random) {
        return Math.sqrt(-2 * Math.log(1 - random.nextDouble())) * Math.cos(2 * Math.PI * random.nextDouble());
    }

    private float[][][] solve(PortResponse response) {
        float[][][] solved = new float[ports][POINTS][4];
        for (int i = 0; i < POINTS; i++) {
            for (int port = 0; port < ports; port++) {
                double[] common = response.commonMode(port, frequencies[i]);
                double[] link = response.linkCurrent(port, frequencies[i]);
                solved[port][i][0] = (float) common[0];
                solved[port][i][1] = (float) common[1];
                solved[port][i][2] = (float) link[0];
                solved[port][i][3] = (float) link[1];
            }
        }
        return solved;
    }

    private static void divide(float[] above, float[] below) {
        for (int mode = 0; mode < 4; mode += 2) {
            double[] ratio = PortMix.ratio(
                    new double[] {above[mode], above[mode + 1]}, new double[] {below[mode], below[mode + 1]});
            above[mode] = (float) ratio[0];
            above[mode + 1] = (float) ratio[1];
        }
    }

    double[] frequencies() {
        return frequencies;
    }

    /**
     * By how many decibels a detector's reading of the worse port lies at a percentile, relative to what it is.
     *
     * @param percentiles shares
     * @return a row per percentile, a value per frequency
     */
    double[][] shifts(PortReadings[] readings, Detector detector, double... percentiles) {
        double[][] shifts = new double[percentiles.length][POINTS];
        double[] levels = new double[factors.length];
        for (int i = 0; i < POINTS; i++) {
            double nominal = 0;
            for (PortReadings port : readings) {
                nominal = Math.max(nominal, port.square(detector, i));
            }
            for (int run = 0; run < levels.length; run++) {
                double highest = 0;
                for (int port = 0; port < ports; port++) {
                    highest = Math.max(highest, readings[port].square(detector, i, factors[run][port][i]));
                }
                levels[run] = nominal > 0 && highest > 0 ? 10 * Math.log10(highest / nominal) : 0;
            }
            Arrays.sort(levels);
            for (int p = 0; p < percentiles.length; p++) {
                shifts[p][i] = between(levels, percentiles[p]);
            }
        }
        return shifts;
    }

    /** A percentile between the two values next to it. */
    private static double between(double[] sorted, double share) {
        double place = share * (sorted.length - 1);
        int below = (int) Math.floor(place);
        int above = Math.min(below + 1, sorted.length - 1);
        return sorted[below] + (place - below) * (sorted[above] - sorted[below]);
    }

    /** A value of the grid at a frequency, straight over the logarithm of frequency. */
    double at(double[] row, double frequency) {
        double low = frequencies[0];
        double place = Math.log(frequency / low) / Math.log(frequencies[POINTS - 1] / low) * (POINTS - 1);
        int below = Math.max(0, Math.min(POINTS - 2, (int) Math.floor(place)));
        double share = Math.max(0, Math.min(1, place - below));
        return row[below] + share * (row[below + 1] - row[below]);
    }
}
