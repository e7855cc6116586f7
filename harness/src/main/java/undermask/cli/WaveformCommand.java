package undermask.cli;

import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import undermask.check.Profile;
import undermask.input.ProfileFolder;
import undermask.report.ReportFolder;
import undermask.report.WaveformRun;

/** Writes the waveforms of a profile and their line spectra. */
@Command(
        name = "waveform",
        description = "Writes the waveforms of a profile and their line spectra.%n",
        mixinStandardHelpOptions = true)
final class WaveformCommand implements Callable<Integer> {
    private static final int MOST_SAMPLES = 10_000_000;

    private final Main.Console console;

    @Spec
    private CommandSpec spec;

    @Mixin
    private Main.Folders folders;

    @Mixin
    private Main.Output output;

    @Option(
            names = "--point",
            paramLabel = "N",
            defaultValue = "1",
            description = "Operating point, counted from 1 (default: ${DEFAULT-VALUE}).")
    private int point;

    @Option(
            names = "--samples",
            paramLabel = "N",
            defaultValue = "0",
            description = "Also write N samples of one output period (default: none).")
    private int samples;

    @Parameters(paramLabel = "PROFILE", description = "Name of a profile, or path of a CSV file.")
    private String profile;

    WaveformCommand(Main.Console console) {
        this.console = console;
    }

    @Override
    public Integer call() throws Exception {
        Profile read =
                new ProfileFolder(folders.profiles).read(List.of(profile)).get(0);
        if (point < 1 || point > read.points().size()) {
            throw new CommandLine.ParameterException(
                    spec.commandLine(),
                    "--point is " + point + "; " + read.name() + " has points 1 to "
                            + read.points().size());
        }
        if (samples < 0 || samples > MOST_SAMPLES) {
            throw new CommandLine.ParameterException(
                    spec.commandLine(), "--samples is " + samples + "; allowed: 1 to " + MOST_SAMPLES);
        }
        List<String> said = new WaveformRun(new ReportFolder(output.reports), !output.noCharts, console.err()::println)
                .of(read, read.points().get(point - 1), samples);
        if (!output.quiet) {
            said.forEach(console.out()::println);
            console.out().println("reports: " + output.reports.resolve(read.name()));
        }
        return Main.CLEAR;
    }
}
