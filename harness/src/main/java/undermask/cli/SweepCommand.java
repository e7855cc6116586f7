package undermask.cli;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import undermask.input.ProfileFolder;
import undermask.input.VariedProfile;
import undermask.report.ReportFolder;
import undermask.report.SweepRun;
import undermask.report.Vary;

/** Weighs the settings of a grid. */
@Command(
        name = "sweep",
        description = "Checks a profile over a grid of settings and weighs emission margin, motor heating, drive losses"
                + " and audible noise.%n",
        mixinStandardHelpOptions = true)
final class SweepCommand implements Callable<Integer> {
    /** More settings than this take long enough to ask. */
    private static final int ASKS_FROM = 500;
    /** What a setting takes on two cores, measured. */
    private static final double SECONDS_EACH = 0.8;

    private final Main.Console console;

    @Spec
    private CommandSpec spec;

    @Mixin
    private Main.Folders folders;

    @Mixin
    private Main.Output output;

    @Option(
            names = "--vary",
            required = true,
            paramLabel = "QUANTITY=…",
            description = "What to vary, up to three times: \"carrier=2..16 by 2 kHz\", \"dv/dt=1,2,4 kV/us\","
                    + " \"modulation=space-vector,clamp-60\", \"motor lead length=5..50 by 5 m\".")
    private List<String> varied = new ArrayList<>();

    @Option(names = "--jobs", paramLabel = "N", description = "Settings checked at a time (default: the cores).")
    private Integer jobs;

    @Option(names = "--yes", description = "Go on with a sweep that takes long.")
    private boolean yes;

    @Option(names = "--write", paramLabel = "NAME", description = "Save the recommended setting as a profile.")
    private String write;

    @Parameters(paramLabel = "PROFILE", description = "Name of a profile, or path of a CSV file.")
    private String profile;

    SweepCommand(Main.Console console) {
        this.console = console;
    }

    @Override
    public Integer call() throws Exception {
        List<Vary> vary = new ArrayList<>();
        try {
            varied.forEach(text -> vary.add(Vary.of(text)));
        } catch (IllegalArgumentException wrong) {
            throw usage("--vary " + wrong.getMessage());
        }
        if (vary.size() > 3) {
            throw usage("--vary is given " + vary.size() + " times; three quantities are swept at most");
        }
        if (jobs != null && jobs < 1) {
            throw usage("--jobs is " + jobs + "; at least 1 is wanted");
        }
        long size = SweepRun.size(vary);
        if (size > ASKS_FROM && !yes) {
            throw usage(size + " settings take about " + Math.round(size * SECONDS_EACH / 60)
                    + " minutes; give --yes to go on, or a wider step");
        }
        VariedProfile saved = new ProfileFolder(folders.profiles).varied(profile);
        Path file = write == null ? null : folders.profiles.resolve(write + ".csv");
        if (file != null && Files.exists(file)) {
            throw usage("--write " + write + ": " + file + " is there already; choose another name");
        }
        long start = System.nanoTime();
        SweepRun.Found found = new SweepRun(
                        new ReportFolder(output.reports),
                        jobs == null ? Runtime.getRuntime().availableProcessors() : jobs,
                        !output.noCharts,
                        console.err()::println,
                        (done, of) -> progress(done, of, start))
                .of(saved, vary);
        if (!output.quiet) {
            found.lines().forEach(console.out()::println);
            console.out().println("reports: " + output.reports.resolve(saved.name()));
        }
        if (file != null && found.recommended().isPresent()) {
            Files.writeString(file, saved.text(found.recommended().get()), StandardCharsets.UTF_8);
            found.recommended().get().keySet().stream()
                    .filter(quantity -> !saved.ofProfile(quantity))
                    .forEach(quantity -> console.err()
                            .println("note: " + quantity
                                    + " stands in the installation and is to be changed there by hand"));
            console.out().println("written: " + file);
        }
        return found.recommended().isPresent() ? Main.CLEAR : Main.NOT_PASSED;
    }

    private CommandLine.ParameterException usage(String message) {
        return new CommandLine.ParameterException(spec.commandLine(), message);
    }

    private void progress(int done, int of, long start) {
        if (!console.terminal() || output.quiet) {
            return;
        }
        double each = (System.nanoTime() - start) / 1e9 / done;
        console.err()
                .print("\r" + "#".repeat(40 * done / of) + ".".repeat(40 - 40 * done / of) + " " + done + " of " + of
                        + ", " + Math.round(each * (of - done)) + " s left   "
                        + (done == of ? "\r" + " ".repeat(78) + "\r" : ""));
        console.err().flush();
    }
}
