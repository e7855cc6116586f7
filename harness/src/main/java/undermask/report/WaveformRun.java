package undermask.report;

import java.io.IOException;
import java.util.List;
import java.util.function.Consumer;
import undermask.check.Profile;
import undermask.drive.OperatingPoint;
import undermask.pwm.AnalysisWindow;
import undermask.pwm.Bridge;
import undermask.signal.EdgeTrain;
import undermask.unit.Dimension;
import undermask.unit.Figures;

/** Writes the waveforms of one operating point of a profile. */
public final class WaveformRun {
    private final ReportFolder folder;
    private final ChartMaker charts;

    /** Prepares a run. */
    public WaveformRun(ReportFolder folder, boolean charts, Consumer<String> warnings) {
        this.folder = folder;
        this.charts = new ChartMaker(charts, warnings);
    }

    /**
     * Writes steps, lines and charts.
     *
     * @return what there is to say about them, a line each
     * @throws IOException when a report cannot be written
     */
    public List<String> of(Profile profile, OperatingPoint point) throws IOException {
        Bridge bridge = Bridge.switching(profile.settings(), point, profile.linkVoltage());
        String name = profile.name();
        folder.write(name, "waveform.csv", WaveformCsv.steps(bridge, point.outputHz()));
        folder.write(name, "lines.csv", WaveformCsv.lines(bridge));
        charts.draw(
                folder,
                name,
                "waveform",
                () -> Charts.waveform(
                        name + ", " + point.label(), bridge.lineToLine(), bridge.commonMode(), point.outputHz()));
        AnalysisWindow window = bridge.window();
        return List.of(
                name + ", " + point.label(),
                "link voltage       " + volts(bridge.linkVoltage()),
                "modulation index   " + Figures.fixed(bridge.modulationIndex(), 4)
                        + (bridge.overmodulated() ? " (beyond the linear range: the reference is clipped)" : ""),
                "window             " + Figures.withUnit(window.seconds(), Dimension.TIME, 6) + ": "
                        + window.fundamentalPeriods()
                        + (window.fundamentalPeriods() == 1 ? " output period, " : " output periods, ")
                        + window.carrierPeriods()
                        + " carrier periods",
                "carrier            " + Figures.withUnit(window.carrierHz(), Dimension.FREQUENCY, 7) + " (moved by "
                        + Figures.fixed(window.nudgePpm(), 1) + " ppm to fit the window)",
                "line-to-line       " + volts(rms(bridge.lineToLine())) + " rms, fundamental "
                        + volts(fundamental(bridge.lineToLine(), window)),
                "common mode        " + volts(rms(bridge.commonMode())) + " rms");
    }

    private static String volts(double value) {
        return Figures.withUnit(value, Dimension.VOLTAGE, 5);
    }

    /** The rms value of the steps, edges taken as instants. */
    private static double rms(EdgeTrain train) {
        double level = train.initialLevel();
        double since = 0;
        double sum = 0;
        for (int e = 0; e < train.size(); e++) {
            sum += level * level * (train.time(e) - since);
            since = train.time(e);
            level += train.step(e);
        }
        sum += level * level * (train.period() - since);
        return Math.sqrt(sum / train.period());
    }

    private static double fundamental(EdgeTrain train, AnalysisWindow window) {
        double[] re = new double[1];
        double[] im = new double[1];
        train.lines().read(window.fundamentalPeriods(), 1, re, im);
        return Math.sqrt(2) * Math.hypot(re[0], im[0]);
    }
}
