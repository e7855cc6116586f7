package undermask.report;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import undermask.check.Profile;
import undermask.cost.MotorTerminals;
import undermask.drive.OperatingPoint;
import undermask.pwm.AnalysisWindow;
import undermask.pwm.Bridge;
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
     * @param samples points per output period of a sampled table; 0 for none
     * @return what there is to say about them, a line each
     * @throws IOException when a report cannot be written
     */
    public List<String> of(Profile profile, OperatingPoint point, int samples) throws IOException {
        Bridge bridge = Bridge.switching(profile.settings(), point, profile.link(point), profile.load());
        String name = profile.name();
        String title = name + ", " + point.label();
        folder.write(name, "waveform.csv", WaveformCsv.steps(bridge));
        if (samples > 0) {
            folder.write(name, "samples.csv", WaveformCsv.samples(bridge, samples));
        }
        folder.write(name, "lines.csv", WaveformCsv.lines(bridge));
        charts.draw(folder, name, "waveform", () -> WaveformCharts.waveform(title, bridge));
        charts.draw(folder, name, "lines", () -> WaveformCharts.lines(title, bridge));
        List<String> said = new ArrayList<>(List.of(
                title,
                "link voltage       " + volts(bridge.link().mean()) + " mean, ripple "
                        + volts(bridge.link().peakToPeak()) + " from peak to peak",
                "modulation         " + bridge.scheme().words() + ", index "
                        + Figures.fixed(bridge.modulationIndex(), 4),
                "window             " + window(bridge.window()),
                "carrier            "
                        + Figures.withUnit(bridge.window().carrierHz(), Dimension.FREQUENCY, 7) + " mean (moved by "
                        + Figures.fixed(bridge.window().nudgePpm(), 1) + " ppm to fit the window)",
                "line-to-line       " + volts(bridge.lineToLine().rms()) + " rms, fundamental "
                        + volts(bridge.fundamentalVoltage()) + ", WTHD "
                        + Figures.fixed(100 * bridge.weightedDistortion(), 3) + " %",
                "common mode        " + volts(bridge.commonMode().rms()) + " rms",
                "link current       " + amperes(bridge.linkCurrent().mean()) + " mean, "
                        + amperes(bridge.linkCurrent().capacitorRms()) + " rms in the capacitor"));
        said.add("motor terminals    " + terminals(profile, bridge));
        for (String remark : bridge.remarks()) {
            StringBuilder note = new StringBuilder();
            Paragraph.append(note, remark, "note: ", "  ");
            note.toString().lines().forEach(said::add);
        }
        return said;
    }

    /** Peak by reflection of the fastest edge. */
    private static String terminals(Profile profile, Bridge bridge) {
        MotorTerminals terminals = MotorTerminals.of(profile.installation(), bridge);
        return volts(terminals.peak()) + " peak, rise " + Figures.withUnit(terminals.riseTime(), Dimension.TIME, 3)
                + ", reflection " + Figures.fixed(terminals.reflection(), 2);
    }

    private static String window(AnalysisWindow window) {
        return Figures.withUnit(window.seconds(), Dimension.TIME, 6) + ": " + window.fundamentalPeriods()
                + (window.fundamentalPeriods() == 1 ? " output period, " : " output periods, ")
                + window.carrierPeriods() + " carrier periods";
    }

    private static String volts(double value) {
        return Figures.withUnit(value, Dimension.VOLTAGE, 5);
    }

    private static String amperes(double value) {
        return Figures.withUnit(value, Dimension.CURRENT, 4);
    }
}
