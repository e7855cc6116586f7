package undermask.report;

import java.awt.BasicStroke;
import java.awt.Color;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalInt;
import java.util.TreeMap;
import org.knowm.xchart.XYChart;
import undermask.pwm.Bridge;
import undermask.signal.EdgeTrain;
import undermask.signal.Lines;
import undermask.signal.ShapedLevel;
import undermask.signal.TrapezoidEnvelope;
import undermask.unit.Decibels;

/** Charts of what a bridge puts out. */
final class WaveformCharts {
    private static final Color BLUE = new Color(0x0b, 0x5f, 0xa5);
    private static final Color ORANGE = new Color(0xd9, 0x6b, 0x0c);
    private static final Color GREY = new Color(0x6d, 0x78, 0x81);
    private static final BasicStroke THIN = new BasicStroke(1.2f, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND);
    private static final BasicStroke THICK = new BasicStroke(2f);
    private static final BasicStroke DASHED =
            new BasicStroke(2f, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 10, new float[] {9, 5}, 0);
    private static final double LOWEST = 1e3;
    private static final double HIGHEST = 30e6;
    private static final int BUCKETS = 600;
    private static final int CURRENT_POINTS = 600;
    private static final double MEGAHERTZ = 1e6;

    private WaveformCharts() {}

    /** Line-to-line and common-mode voltage and a phase current over one output period, and one edge. */
    static Picture waveform(String title, Bridge bridge) {
        double span = 1 / bridge.point().outputHz();
        XYChart line = Canvas.chart(title, "time in ms", "line to line in V", 280);
        EdgeTrain lineToLine = bridge.lineToLine();
        steps(line, lineToLine, span, BLUE);
        XYChart common = Canvas.chart("", "time in ms", "common mode in V", 260);
        steps(common, bridge.commonMode(), span, ORANGE);
        XYChart current = Canvas.chart("", "time in ms", "current of leg a in A", 240);
        current(current, bridge, span);
        List<XYChart> charts = new ArrayList<>(List.of(line, common, current));
        steepest(lineToLine).ifPresent(edge -> charts.add(edge(lineToLine, edge)));
        charts.forEach(chart -> chart.getStyler().setLegendVisible(false));
        return Canvas.stacked(charts);
    }

    private static void steps(XYChart chart, EdgeTrain train, double span, Color colour) {
        List<Double> x = new ArrayList<>(List.of(0.0));
        double level = train.initialLevel();
        List<Double> y = new ArrayList<>(List.of(level));
        for (int e = 0; e < train.size() && train.time(e) < span; e++) {
            x.addAll(List.of(1e3 * train.time(e), 1e3 * train.time(e)));
            y.addAll(List.of(level, level + train.step(e)));
            level += train.step(e) + train.slope(e) * train.lengthAfter(e);
        }
        x.add(1e3 * span);
        y.add(level);
        Charts.dress(chart.addSeries("level", x, y), colour, THIN);
        chart.getStyler().setYAxisDecimalPattern("0");
        chart.getStyler().setXAxisMin(0.0);
        chart.getStyler().setXAxisMax(1e3 * span);
    }

    private static void current(XYChart chart, Bridge bridge, double span) {
        double[] x = new double[CURRENT_POINTS];
        double[] y = new double[CURRENT_POINTS];
        for (int i = 0; i < x.length; i++) {
            // not in step with the carrier, whose ripple would else look slow
            double time = span * (i + 0.3 * Math.sin(i)) / x.length;
            x[i] = 1e3 * time;
            y[i] = bridge.current(0, time);
        }
        Charts.dress(chart.addSeries("current", x, y), GREY, THIN);
        chart.getStyler().setXAxisMin(0.0);
        chart.getStyler().setXAxisMax(1e3 * span);
    }

    /** Of the highest rising edges, which are not cut short, the one with the shortest transition. */
    private static OptionalInt steepest(EdgeTrain train) {
        double highest = 0;
        for (int e = 0; e < train.size(); e++) {
            highest = Math.max(highest, train.step(e));
        }
        int best = -1;
        for (int e = 0; e < train.size(); e++) {
            if (train.step(e) > 0.8 * highest
                    && (best < 0
                            || train.shape(e).transitionTime()
                                    < train.shape(best).transitionTime())) {
                best = e;
            }
        }
        return best < 0 ? OptionalInt.empty() : OptionalInt.of(best);
    }

    private static XYChart edge(EdgeTrain train, int edge) {
        double reach = 50e-9 * Math.max(1, Math.ceil(4 * train.shape(edge).transitionTime() / 50e-9));
        int points = 400;
        double[] x = new double[points];
        double[] y = new double[points];
        ShapedLevel level = new ShapedLevel(train);
        for (int i = 0; i < points; i++) {
            double place = 2.0 * i / (points - 1) - 1;
            // denser around the instant
            double time = reach * place * (0.2 + 0.8 * place * place);
            x[i] = 1e9 * time;
            y[i] = level.at(train.time(edge) + time);
        }
        XYChart chart = Canvas.chart("", "time in ns around the steepest edge", "line to line in V", 260);
        chart.getStyler().setXAxisDecimalPattern("0");
        chart.getStyler().setYAxisDecimalPattern("0");
        chart.getStyler().setXAxisMin(x[0]);
        chart.getStyler().setXAxisMax(x[points - 1]);
        Charts.dress(chart.addSeries("edge", x, y), BLUE, THICK);
        return chart;
    }

    /** The lines of leg and common mode under the envelope of trapezoidal pulses. */
    static Picture lines(String title, Bridge bridge) {
        XYChart chart = Canvas.chart(title, "frequency in MHz", "rms of a line in dB\u00b5V", 620);
        chart.getStyler().setXAxisLogarithmic(true);
        chart.getStyler().setXAxisLogarithmicDecadeOnly(true);
        chart.getStyler().setXAxisMin(LOWEST / MEGAHERTZ);
        chart.getStyler().setXAxisMax(HIGHEST / MEGAHERTZ);
        double top = Math.max(
                highest(chart, "leg", bridge.leg(0).lines(), GREY),
                highest(chart, "common mode", bridge.commonMode().lines(), ORANGE));
        double carrier = bridge.window().carrierHz();
        double fastest = bridge.fastestTransition();
        if (Double.isFinite(fastest)) {
            TrapezoidEnvelope envelope = new TrapezoidEnvelope(bridge.link().mean(), carrier, 0.5 / carrier, fastest);
            double[] x = {LOWEST, envelope.pulseCorner(), envelope.edgeCorner(), HIGHEST};
            java.util.Arrays.sort(x);
            double[] y = new double[x.length];
            for (int i = 0; i < x.length; i++) {
                y[i] = level(envelope.peak(x[i]) / Math.sqrt(2));
                x[i] /= MEGAHERTZ;
            }
            Charts.dress(chart.addSeries("envelope of trapezoids", x, y), BLUE, DASHED);
        }
        chart.getStyler().setYAxisMin(0.0);
        chart.getStyler().setYAxisMax(10 * Math.ceil((top + 3) / 10));
        return Canvas.stacked(List.of(chart));
    }

    /** Adds the highest line of each bucket and returns the highest of all. */
    private static double highest(XYChart chart, String name, Lines lines, Color colour) {
        int count = (int) (HIGHEST / lines.spacing());
        int first = (int) Math.ceil(LOWEST / lines.spacing());
        double[] re = new double[count];
        double[] im = new double[count];
        lines.read(1, count, re, im);
        TreeMap<Integer, double[]> buckets = new TreeMap<>();
        double top = 0;
        for (int n = Math.max(1, first); n <= count; n++) {
            double frequency = n * lines.spacing();
            double level = level(Math.sqrt(2) * Math.hypot(re[n - 1], im[n - 1]));
            int bucket =
                    Math.min(BUCKETS - 1, (int) (Math.log(frequency / LOWEST) / Math.log(HIGHEST / LOWEST) * BUCKETS));
            buckets.merge(bucket, new double[] {frequency, level}, (a, b) -> a[1] >= b[1] ? a : b);
            top = Math.max(top, level);
        }
        Charts.dress(
                chart.addSeries(
                        name,
                        buckets.values().stream()
                                .mapToDouble(line -> line[0] / MEGAHERTZ)
                                .toArray(),
                        buckets.values().stream()
                                .mapToDouble(line -> Math.max(0, line[1]))
                                .toArray()),
                colour,
                THIN);
        return top;
    }

    private static double level(double volts) {
        return Decibels.dbuv(volts);
    }
}
