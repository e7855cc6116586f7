package undermask.report;

import java.util.List;
import java.util.TreeSet;
import java.util.stream.IntStream;
import undermask.pwm.Bridge;
import undermask.signal.EdgeTrain;
import undermask.signal.Lines;
import undermask.signal.ShapedLevel;
import undermask.unit.Figures;

/** The bridge's waveforms as a list of steps or sampled, and their line spectra. */
final class WaveformCsv {
    private static final double HIGHEST_LINE = 30e6;
    private static final double SMALLEST_SHARE = 1e-6;
    private static final int BLOCK = 1 << 14;
    private static final int LEGS = 3;
    private static final List<String> WAVEFORMS = List.of(
            "time_s",
            "leg_a_v",
            "leg_b_v",
            "leg_c_v",
            "line_to_line_v",
            "common_mode_v",
            "current_a_a",
            "current_b_a",
            "current_c_a",
            "link_current_a");

    private WaveformCsv() {}

    /** A row at the start and at each edge of the first output period, with levels and currents just after it. */
    static String steps(Bridge bridge) {
        double span = 1 / bridge.point().outputHz();
        List<EdgeTrain> legs = legs(bridge);
        TreeSet<Double> instants = new TreeSet<>(List.of(0.0));
        for (EdgeTrain leg : legs) {
            for (int e = 0; e < leg.size() && leg.time(e) < span; e++) {
                instants.add(leg.time(e));
            }
        }
        Csv csv = new Csv(WAVEFORMS);
        int[] next = new int[LEGS];
        double[] level = new double[LEGS];
        double[] since = new double[LEGS];
        double[] slope = new double[LEGS];
        for (int k = 0; k < LEGS; k++) {
            EdgeTrain leg = legs.get(k);
            int last = leg.size() - 1;
            slope[k] = last < 0 ? 0 : leg.slope(last);
            level[k] = leg.initialLevel() - (last < 0 ? 0 : slope[k] * leg.time(0));
        }
        for (double instant : instants) {
            double[] now = new double[LEGS];
            for (int k = 0; k < LEGS; k++) {
                EdgeTrain leg = legs.get(k);
                while (next[k] < leg.size() && leg.time(next[k]) <= instant) {
                    level[k] += slope[k] * (leg.time(next[k]) - since[k]) + leg.step(next[k]);
                    since[k] = leg.time(next[k]);
                    slope[k] = leg.slope(next[k]++);
                }
                now[k] = level[k] + slope[k] * (instant - since[k]);
            }
            row(csv, bridge, instant, now);
        }
        return csv.toString();
    }

    /**
     * Evenly spaced samples of the first output period, edges as they are shaped.
     *
     * @param count of them, at least 1
     */
    static String samples(Bridge bridge, int count) {
        List<ShapedLevel> legs = legs(bridge).stream().map(ShapedLevel::new).toList();
        Csv csv = new Csv(WAVEFORMS);
        for (int i = 0; i < count; i++) {
            double time = i / (count * bridge.point().outputHz());
            row(
                    csv,
                    bridge,
                    time,
                    legs.stream().mapToDouble(leg -> leg.at(time)).toArray());
        }
        return csv.toString();
    }

    private static List<EdgeTrain> legs(Bridge bridge) {
        return IntStream.range(0, LEGS).mapToObj(bridge::leg).toList();
    }

    private static void row(Csv csv, Bridge bridge, double time, double[] level) {
        double link = 0;
        for (int k = 0; k < LEGS; k++) {
            link += level[k] > 0 ? bridge.current(k, time) : 0;
        }
        csv.row(
                Figures.significant(time, 12),
                volts(level[0]),
                volts(level[1]),
                volts(level[2]),
                volts(level[0] - level[1]),
                volts((level[0] + level[1] + level[2]) / 3),
                amperes(bridge.current(0, time)),
                amperes(bridge.current(1, time)),
                amperes(bridge.current(2, time)),
                amperes(link));
    }

    private static String volts(double value) {
        return Figures.fixed(value, 3);
    }

    private static String amperes(double value) {
        return Figures.fixed(value, 4);
    }

    /** The rms value of each line up to 30 MHz that reaches a millionth of the largest of its kind. */
    static String lines(Bridge bridge) {
        List<Lines> spectra = List.of(
                bridge.leg(0).lines(),
                bridge.lineToLine().lines(),
                bridge.commonMode().lines(),
                bridge.linkCurrent().lines());
        double spacing = spectra.get(0).spacing();
        int count = (int) Math.floor(HIGHEST_LINE / spacing);
        double[][] rms = new double[spectra.size()][BLOCK];
        double[] im = new double[BLOCK];
        double[] largest = new double[spectra.size()];
        Csv csv = new Csv(List.of("frequency_hz", "leg_v", "line_to_line_v", "common_mode_v", "link_current_a"));
        for (int first = 1; first <= count; first += BLOCK) {
            int size = Math.min(BLOCK, count - first + 1);
            for (int k = 0; k < rms.length; k++) {
                spectra.get(k).read(first, size, rms[k], im);
                for (int i = 0; i < size; i++) {
                    rms[k][i] = Math.sqrt(2) * Math.hypot(rms[k][i], im[i]);
                    // fundamental and carrier lie in the first block, so the scale is known from there on
                    largest[k] = first == 1 ? Math.max(largest[k], rms[k][i]) : largest[k];
                }
            }
            for (int i = 0; i < size; i++) {
                boolean counts = false;
                for (int k = 0; k < rms.length; k++) {
                    counts |= rms[k][i] >= SMALLEST_SHARE * largest[k];
                }
                if (counts) {
                    csv.row(
                            Csv.frequency((first + i) * spacing),
                            line(rms[0][i]),
                            line(rms[1][i]),
                            line(rms[2][i]),
                            line(rms[3][i]));
                }
            }
        }
        return csv.toString();
    }

    private static String line(double rms) {
        return Figures.significant(rms, 6);
    }
}
