package undermask.report;

import de.erichseifert.vectorgraphics2d.VectorGraphics2D;
import de.erichseifert.vectorgraphics2d.svg.SVGProcessor;
import de.erichseifert.vectorgraphics2d.util.PageSize;
import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Pattern;
import javax.imageio.ImageIO;
import org.knowm.xchart.XYChart;
import org.knowm.xchart.XYChartBuilder;
import org.knowm.xchart.style.Styler;
import org.knowm.xchart.style.XYStyler;

/** The house style of charts, and charts stacked into one picture. */
final class Canvas {
    static final int WIDTH = 1100;
    static final Color INK = new Color(0x22, 0x2b, 0x33);
    private static final Color GRID = new Color(0xdd, 0xe2, 0xe6);
    private static final double SCALE = 1.5;
    private static final Pattern CLIP_NAME = Pattern.compile("clip-?\\d+");

    private Canvas() {}

    /** An empty chart in house style. */
    static XYChart chart(String title, String x, String y, int height) {
        XYChart chart = new XYChartBuilder()
                .width(WIDTH)
                .height(height)
                .title(title)
                .xAxisTitle(x)
                .yAxisTitle(y)
                .build();
        XYStyler style = chart.getStyler();
        style.setChartBackgroundColor(Color.WHITE);
        style.setPlotBackgroundColor(Color.WHITE);
        style.setPlotBorderColor(INK);
        style.setPlotGridLinesColor(GRID);
        style.setChartFontColor(INK);
        style.setAxisTickLabelsColor(INK);
        style.setChartTitleFont(new Font(Font.SANS_SERIF, Font.BOLD, 17));
        style.setAxisTitleFont(new Font(Font.SANS_SERIF, Font.PLAIN, 14));
        style.setAxisTickLabelsFont(new Font(Font.SANS_SERIF, Font.PLAIN, 11));
        style.setLegendFont(new Font(Font.SANS_SERIF, Font.PLAIN, 13));
        style.setChartTitleBoxVisible(false);
        style.setLegendPosition(Styler.LegendPosition.OutsideS);
        style.setLegendLayout(Styler.LegendLayout.Horizontal);
        style.setLegendBorderColor(Color.WHITE);
        style.setMarkerSize(0);
        style.setLocale(java.util.Locale.ROOT);
        style.setChartPadding(14);
        return chart;
    }

    /** Charts below each other. */
    static Picture stacked(List<XYChart> charts) {
        int height = charts.stream().mapToInt(XYChart::getHeight).sum();
        BufferedImage image =
                new BufferedImage((int) (SCALE * WIDTH), (int) (SCALE * height), BufferedImage.TYPE_3BYTE_BGR);
        Graphics2D pixels = image.createGraphics();
        pixels.scale(SCALE, SCALE);
        pixels.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
        paint(charts, pixels);
        pixels.dispose();
        VectorGraphics2D vectors = new VectorGraphics2D();
        paint(charts, vectors);
        try {
            ByteArrayOutputStream png = new ByteArrayOutputStream();
            ImageIO.write(image, "png", png);
            ByteArrayOutputStream svg = new ByteArrayOutputStream();
            new SVGProcessor()
                    .getDocument(vectors.getCommands(), new PageSize(WIDTH, height))
                    .writeTo(svg);
            return new Picture(png.toByteArray(), withStableNames(svg.toString(StandardCharsets.UTF_8)));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** Numbers the clip paths in their order; the writer names them differently at each run. */
    private static byte[] withStableNames(String svg) {
        Map<String, String> names = new HashMap<>();
        return CLIP_NAME
                .matcher(svg)
                .replaceAll(found -> names.computeIfAbsent(found.group(), name -> "clip-" + (names.size() + 1)))
                .getBytes(StandardCharsets.UTF_8);
    }

    private static void paint(List<XYChart> charts, Graphics2D graphics) {
        int top = 0;
        for (XYChart chart : charts) {
            graphics.translate(0, top);
            chart.paint(graphics, WIDTH, chart.getHeight());
            graphics.translate(0, -top);
            top += chart.getHeight();
        }
    }
}
