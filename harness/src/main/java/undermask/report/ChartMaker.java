package undermask.report;

import java.io.IOException;
import java.util.function.Consumer;
import java.util.function.Supplier;

/**
 * Draws charts as long as this Java runtime can. One without fonts cannot; then a single warning says so and everything
 * else goes on.
 */
final class ChartMaker {
    private final boolean wanted;
    private final Consumer<String> warnings;
    private boolean able = true;

    ChartMaker(boolean wanted, Consumer<String> warnings) {
        this.wanted = wanted;
        this.warnings = warnings;
    }

    /**
     * Draws and writes a chart as PNG and SVG. One at a time: the drawing library is not made for more.
     *
     * @param drawing makes the picture; not called when charts are not wanted or cannot be had
     */
    synchronized void draw(ReportFolder folder, String profile, String name, Supplier<Picture> drawing)
            throws IOException {
        if (!wanted || !able) {
            return;
        }
        Picture picture;
        try {
            picture = drawing.get();
        } catch (RuntimeException | LinkageError | InternalError e) {
            able = false;
            warnings.accept("warning: charts are left out, this Java runtime cannot draw (fonts missing?): " + e);
            return;
        }
        folder.write(profile, name + ".png", picture.png());
        folder.write(profile, name + ".svg", picture.svg());
    }
}
