package undermask.report;

import java.util.List;
import java.util.TreeSet;
import undermask.pwm.Bridge;
import undermask.signal.EdgeTrain;
import undermask.signal.Lines;
import undermask.unit.Figures;

/** The bridge's waveforms as a list of steps, and their line spectra. */
final class WaveformCsv {
    private static final double HIGHEST_LINE = 30e6;
    private static final double SMALLEST_SHARE = 1e-6;
    private static final int BLOCK = 1 << 14;

    private WaveformCsv() {}

    /**
     * A row at the start and at each edge of the first output period, with the levels after it.
     *
     * @param outputHz frequency of the fundamental
     */
    static String steps(Bridge bridge, double outputHz) {
        List<EdgeTrain> legs = List.of(bridge.leg(0), bridge.leg(1), bridge.leg(2));
        TreeSet<Double> instants = new TreeSet<>(List.of(0.0));
        for (EdgeTrain leg : legs) {
            for (int e = 0; e < leg.size() && leg.time(e) < 1 / outputHz; e++) {
                instants.add(leg.time(e));
            }
        }
        Csv csv = new Csv(List.of("time_s", "leg_a_v", "leg_b_v", "leg_c_v", "line_to_line_v", "common_mode_v"));
        int[] next = new int[legs.size()];
        double[] level = legs.stream().mapToDouble(EdgeTrain::initialLevel).toArray();
        for (double instant : instants) {
            for (int k = 0; k < level.length; k++) {
                EdgeTrain leg = legs.get(k);
                while (next[k] < leg.size() && leg.time(next[k]) <= instant) {
                    level[k] += leg.step(next[k]++);
                }
            }
            csv.row(
                    Figures.significant(instant, 12),
                    volts(level[0]),
                    volts(level[1]),
                    volts(level[2]),
                    volts(level[0] - level[1]),
                    volts((level[0] + level[1] + level[2]) / 3));
        }
        return csv.toString();
    }

    private static String volts(double value) {
        return Figures.fixed(value, 3);
    }

    /** The rms value of each line up to 30 MHz that reaches a millionth of the largest of its row's waveforms. */
    static String lines(Bridge bridge) {
        List<Lines> spectra = List.of(
                bridge.leg(0).lines(),
                bridge.lineToLine().lines(),
                bridge.commonMode().lines());
        double spacing = spectra.get(0).spacing();
        int count = (int) Math.floor(HIGHEST_LINE / spacing);
        double[][] rms = new double[spectra.size()][BLOCK];
        double[] im = new double[BLOCK];
        double largest = 0;
        Csv csv = new Csv(List.of("frequency_hz", "leg_v", "line_to_line_v", "common_mode_v"));
        for (int first = 1; first <= count; first += BLOCK) {
            int size = Math.min(BLOCK, count - first + 1);
            for (int k = 0; k < rms.length; k++) {
                spectra.get(k).read(first, size, rms[k], im);
                for (int i = 0; i < size; i++) {
                    rms[k][i] = Math.sqrt(2) * Math.hypot(rms[k][i], im[i]);
                    // the fundamental lies in the first block, so the scale is known from there on
                    largest = first == 1 ? Math.max(largest, rms[k][i]) : largest;
                }
            }
            for (int i = 0; i < size; i++) {
                if (Math.max(rms[0][i], Math.max(rms[1][i], rms[2][i])) >= SMALLEST_SHARE * largest) {
                    csv.row(Csv.frequency((first + i) * spacing), line(rms[0][i]), line(rms[1][i]), line(rms[2][i]));
                }
            }
        }
        return csv.toString();
    }

    private static String line(double rms) {
        return Figures.significant(rms, 6);
    }
}
