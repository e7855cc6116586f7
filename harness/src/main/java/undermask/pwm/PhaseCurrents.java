package undermask.pwm;

import java.util.Arrays;
import java.util.List;
import undermask.drive.OperatingPoint;

/**
 * The currents out of the legs: the load's sine, which lags by the load's angle, and the carrier ripple that the phase
 * voltages without their fundamental drive through the leakage inductance.
 *
 * <p>At no load the sign of the sine still follows the lag: it is the magnetizing current.
 */
final class PhaseCurrents {
    private static final int PHASES = 3;

    private final OperatingPoint point;
    private final double window;
    /** Instants at which any leg switches, rising, s. */
    private final double[] times;
    /** Ripple of each phase at those instants, A; empty without ripple. */
    private final double[][] ripple;
    /** Slope of the ripple without its fundamental part after each instant, A/s. */
    private final double[][] slopes;
    /** Fundamental of each phase voltage over the inductance, real and imaginary coefficient, A/s. */
    private final double[][] fundamental;

    /**
     * Works the currents out.
     *
     * @param legs ideal switching instants
     * @param linkVoltage mean in V
     * @param inductance per phase in H; infinite for no ripple
     */
    PhaseCurrents(
            OperatingPoint point, double window, List<SwitchingInstants> legs, double linkVoltage, double inductance) {
        this.point = point;
        this.window = window;
        this.ripple = new double[PHASES][];
        this.slopes = new double[PHASES][];
        this.fundamental = new double[PHASES][2];
        if (Double.isInfinite(inductance)) {
            this.times = new double[0];
            return;
        }
        int count = legs.stream().mapToInt(SwitchingInstants::size).sum();
        double[] instants = new double[count];
        double[][] steps = new double[PHASES][count];
        int to = 0;
        double[] level = new double[PHASES];
        for (int k = 0; k < PHASES; k++) {
            SwitchingInstants leg = legs.get(k);
            int first = -1;
            for (int i = 0; i < leg.size(); i++, to++) {
                double turns = leg.time(i) / window;
                instants[to] = Math.min(turns - Math.floor(turns), Math.nextDown(1.0)) * window;
                steps[k][to] = leg.up(i) ? linkVoltage : -linkVoltage;
                first = first < 0 || instants[to] < instants[first] ? to : first;
            }
            boolean high = first < 0 ? leg.highWithoutEdges() : steps[k][first] < 0;
            level[k] = high ? linkVoltage / 2 : -linkVoltage / 2;
        }
        Integer[] sorted = new Integer[count];
        Arrays.setAll(sorted, i -> i);
        Arrays.sort(sorted, java.util.Comparator.comparingDouble(i -> instants[i]));
        this.times = new double[count];
        for (int i = 0; i < count; i++) {
            times[i] = instants[sorted[i]];
        }
        double[][] volts = new double[PHASES][count];
        for (int i = 0; i < count; i++) {
            for (int k = 0; k < PHASES; k++) {
                level[k] += steps[k][sorted[i]];
            }
            double common = (level[0] + level[1] + level[2]) / PHASES;
            for (int k = 0; k < PHASES; k++) {
                volts[k][i] = level[k] - common;
            }
        }
        for (int k = 0; k < PHASES; k++) {
            integrate(k, volts[k], inductance);
        }
    }

    private void integrate(int phase, double[] volts, double inductance) {
        int count = times.length;
        double omega = 2 * Math.PI * point.outputHz();
        double re = 0;
        double im = 0;
        for (int i = 0; i < count; i++) {
            double step = volts[i] - volts[(i + count - 1) % count];
            // coefficient of the fundamental, Σ ΔV·exp(−jωt)/(jωT)
            re -= step * Math.sin(omega * times[i]);
            im -= step * Math.cos(omega * times[i]);
        }
        fundamental[phase][0] = re / (omega * window * inductance);
        fundamental[phase][1] = im / (omega * window * inductance);
        double mean = 0;
        for (int i = 0; i < count; i++) {
            mean += volts[i] * lengthAfter(i) / window;
        }
        double[] amperes = new double[count];
        double[] slope = new double[count];
        double sum = 0;
        double area = 0;
        for (int i = 0; i < count; i++) {
            // a direct voltage would be taken by the windings' resistance
            slope[i] = (volts[i] - mean) / inductance;
            double length = lengthAfter(i);
            amperes[i] = sum;
            area += (sum + slope[i] * length / 2) * length;
            sum += slope[i] * length;
        }
        for (int i = 0; i < count; i++) {
            amperes[i] -= area / window;
        }
        ripple[phase] = amperes;
        slopes[phase] = slope;
    }

    private double lengthAfter(int instant) {
        return (instant + 1 < times.length ? times[instant + 1] : times[0] + window) - times[instant];
    }

    /** The load's sine in a phase at a time, A; without load a vanishing one of the right sign. */
    double sine(int phase, double time) {
        double peak = Math.max(Math.sqrt(2) * point.loadCurrentRms(), Double.MIN_NORMAL);
        return peak * Math.cos(2 * Math.PI * point.outputHz() * time - phase * 2 * Math.PI / 3 - point.lag());
    }

    /** The current out of a leg at a time, A. */
    double at(int phase, double time) {
        double amperes = sine(phase, time);
        if (times.length == 0) {
            return amperes;
        }
        double turns = time / window;
        double inside = (turns - Math.floor(turns)) * window;
        int place = Arrays.binarySearch(times, inside);
        int last = place >= 0 ? place : -place - 2;
        double since = last >= 0 ? inside - times[last] : inside + window - times[times.length - 1];
        int from = last >= 0 ? last : times.length - 1;
        double omega = 2 * Math.PI * point.outputHz();
        // less the integral of the fundamental, 2·Re(c·exp(jωt)/(jω))
        double sine = 2
                / omega
                * (fundamental[phase][0] * Math.sin(omega * inside) + fundamental[phase][1] * Math.cos(omega * inside));
        return amperes + ripple[phase][from] + slopes[phase][from] * since - sine;
    }
}
