package undermask.report;

import java.awt.BasicStroke;
import java.awt.Color;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import org.knowm.xchart.XYChart;
import org.knowm.xchart.XYSeries;
import org.knowm.xchart.style.XYStyler;
import org.knowm.xchart.style.markers.SeriesMarkers;
import undermask.check.TraceBand;
import undermask.mask.Judgement;
import undermask.mask.LimitSegment;
import undermask.mask.Mask;
import undermask.receiver.Detector;
import undermask.receiver.Trace;

/** The charts of a profile. */
final class Charts {
    /** Blue, orange and grey differ also for eyes that cannot tell red from green. */
    private static final Map<Detector, Color> COLOURS = Map.of(
            Detector.PEAK, new Color(0x9a, 0xa5, 0xae),
            Detector.QUASI_PEAK, new Color(0xd9, 0x6b, 0x0c),
            Detector.AVERAGE, new Color(0x0b, 0x5f, 0xa5));

    private static final BasicStroke TRACE = new BasicStroke(1.2f, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND);
    private static final BasicStroke FAINT =
            new BasicStroke(0.9f, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 10, new float[] {2, 3}, 0);
    private static final BasicStroke LIMIT =
            new BasicStroke(2.2f, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 10, new float[] {9, 5}, 0);
    private static final int BUCKETS = 600;
    private static final double LOWEST_SHOWN = 0;
    private static final double MEGAHERTZ = 1e6;

    private Charts() {}

    /** The three detectors against their limits, worst frequencies marked. */
    static Picture spectrum(
            String title, Trace trace, Optional<TraceBand> band, Mask mask, List<Judgement> judgements) {
        XYChart chart = Canvas.chart(title, "frequency in MHz", "level in dB\u00b5V", 620);
        double low =
                mask.segments().stream().mapToDouble(LimitSegment::fromHz).min().orElseThrow();
        double high = trace.frequency(trace.size() - 1);
        XYStyler style = chart.getStyler();
        style.setXAxisLogarithmic(true);
        style.setXAxisLogarithmicDecadeOnly(false);
        style.setXAxisMin(low / MEGAHERTZ);
        style.setXAxisMax(high / MEGAHERTZ);
        double top = 0;
        for (Detector detector : Detector.values()) {
            if (!Double.isNaN(trace.levelDbuv(detector, 0))) {
                top = Math.max(top, addTrace(chart, detector.words(), trace, detector, low, TRACE));
            }
        }
        if (band.isPresent()) {
            for (Detector detector : mask.detectors()) {
                String name = detector.words();
                String lower = "lower " + name;
                addTrace(chart, lower, band.get().low(), detector, low, FAINT);
                chart.getSeriesMap().get(lower).setShowInLegend(false);
                top = Math.max(
                        top, addTrace(chart, "5 and 95 % " + name, band.get().high(), detector, low, FAINT));
            }
        }
        for (Detector detector : mask.detectors()) {
            top = Math.max(top, addLimit(chart, mask, detector));
        }
        for (Judgement judgement : judgements) {
            XYSeries worst = chart.addSeries(
                    "worst " + judgement.detector().words(),
                    new double[] {judgement.frequencyHz() / MEGAHERTZ},
                    new double[] {judgement.levelDbuv()});
            worst.setMarker(SeriesMarkers.CIRCLE);
            worst.setMarkerColor(COLOURS.get(judgement.detector()).darker());
            worst.setLineColor(new Color(0, 0, 0, 0));
            worst.setShowInLegend(false);
        }
        style.setMarkerSize(11);
        style.setYAxisMin(LOWEST_SHOWN);
        style.setYAxisMax(10 * Math.ceil((top + 3) / 10));
        return Canvas.stacked(List.of(chart));
    }

    /** Adds a trace thinned to the highest step of each bucket, and returns its top. */
    private static double addTrace(
            XYChart chart, String name, Trace trace, Detector detector, double low, BasicStroke stroke) {
        double span = Math.log(trace.frequency(trace.size() - 1) / low);
        TreeMap<Integer, Integer> highest = new TreeMap<>();
        double top = 0;
        for (int step = 0; step < trace.size(); step++) {
            double frequency = trace.frequency(step);
            if (frequency >= low) {
                int bucket = Math.min(BUCKETS - 1, (int) (Math.log(frequency / low) / span * BUCKETS));
                int here = step;
                highest.merge(
                        bucket, here, (a, b) -> trace.levelDbuv(detector, a) >= trace.levelDbuv(detector, b) ? a : b);
                top = Math.max(top, trace.levelDbuv(detector, step));
            }
        }
        XYSeries series = chart.addSeries(
                name,
                highest.values().stream()
                        .mapToDouble(step -> trace.frequency(step) / MEGAHERTZ)
                        .toArray(),
                highest.values().stream()
                        .mapToDouble(step -> Math.max(LOWEST_SHOWN, trace.levelDbuv(detector, step)))
                        .toArray());
        dress(series, COLOURS.get(detector), stroke);
        return top;
    }

    private static double addLimit(XYChart chart, Mask mask, Detector detector) {
        List<Double> x = new ArrayList<>();
        List<Double> y = new ArrayList<>();
        for (LimitSegment segment : mask.segments()) {
            if (segment.detector() == detector) {
                x.addAll(List.of(segment.fromHz() / MEGAHERTZ, segment.toHz() / MEGAHERTZ));
                y.addAll(List.of(segment.fromDbuv(), segment.toDbuv()));
            }
        }
        dress(chart.addSeries("limit " + detector.words(), x, y), COLOURS.get(detector), LIMIT);
        return y.stream().mapToDouble(Double::doubleValue).max().orElseThrow();
    }

    static void dress(XYSeries series, Color colour, BasicStroke stroke) {
        series.setMarker(SeriesMarkers.NONE);
        series.setLineColor(colour);
        series.setLineStyle(stroke);
    }
}
