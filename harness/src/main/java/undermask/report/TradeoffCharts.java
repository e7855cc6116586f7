package undermask.report;

import java.awt.BasicStroke;
import java.awt.Color;
import java.util.ArrayList;
import java.util.List;
import java.util.function.ToDoubleFunction;
import org.knowm.xchart.XYChart;
import org.knowm.xchart.XYSeries;
import org.knowm.xchart.style.markers.SeriesMarkers;

/** The chart of a sweep: what is won and what it costs over the first quantity. */
final class TradeoffCharts {
    private static final Color BLUE = new Color(0x0b, 0x5f, 0xa5);
    private static final Color GREY = new Color(0x9a, 0xa5, 0xae);
    private static final BasicStroke LINE = new BasicStroke(1.6f);

    private TradeoffCharts() {}

    static Picture of(String title, Vary first, List<Tradeoff> results, Tradeoff saved) {
        String axis = first.quantity() + (first.unit().isEmpty() ? "" : " in " + first.unit());
        return Canvas.stacked(List.of(
                chart(title, axis, "margin in dB", 300, first, results, Tradeoff::marginDb),
                chart("", axis, "winding in degC", 230, first, results, Tradeoff::windingCelsius),
                chart("", axis, "drive loss in W", 230, first, results, Tradeoff::driveLoss),
                chart("", axis, "sound in dB(A)", 230, first, results, result -> result.sound() - saved.sound())));
    }

    private static XYChart chart(
            String title,
            String axis,
            String y,
            int height,
            Vary first,
            List<Tradeoff> results,
            ToDoubleFunction<Tradeoff> value) {
        XYChart chart = Canvas.chart(title, axis, y, height);
        // a word has no place on an axis; it takes its number
        boolean numbers = first.values().stream().allMatch(text -> text.matches("[-+0-9.eE]+"));
        List<Double> x = new ArrayList<>();
        List<Double> all = new ArrayList<>();
        List<Double> passingX = new ArrayList<>();
        List<Double> passing = new ArrayList<>();
        for (Tradeoff result : results) {
            String text = result.values().get(0);
            double place = numbers ? Double.parseDouble(text) : first.values().indexOf(text) + 1;
            x.add(place);
            all.add(value.applyAsDouble(result));
            if (result.passes()) {
                passingX.add(place);
                passing.add(value.applyAsDouble(result));
            }
        }
        XYSeries series = chart.addSeries("does not pass", x, all);
        Charts.dress(series, GREY, LINE);
        series.setMarker(SeriesMarkers.CIRCLE);
        series.setMarkerColor(GREY);
        if (!passing.isEmpty()) {
            XYSeries allowed = chart.addSeries("passes", passingX, passing);
            Charts.dress(allowed, BLUE, LINE);
            allowed.setMarker(SeriesMarkers.CIRCLE);
            allowed.setMarkerColor(BLUE);
        }
        chart.getStyler().setMarkerSize(8);
        chart.getStyler().setLegendVisible(!title.isEmpty());
        return chart;
    }
}
