package undermask.cli;

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
import undermask.check.Profile;
import undermask.input.ProfileFolder;
import undermask.report.CheckRun;
import undermask.report.Outcome;
import undermask.report.ReportFolder;
import undermask.report.Summary;

/** Checks profiles and writes reports. */
@Command(
        name = "check",
        description = "Checks profiles against their masks and writes reports.%n",
        mixinStandardHelpOptions = true)
final class CheckCommand implements Callable<Integer> {
    private final Main.Console console;

    @Spec
    private CommandSpec spec;

    @Mixin
    private Main.Folders folders;

    @Option(
            names = "--reports",
            paramLabel = "DIR",
            defaultValue = "reports",
            description = "Folder of reports (default: ${DEFAULT-VALUE}).")
    private Path reports;

    @Option(names = "--jobs", paramLabel = "N", description = "Profiles checked at a time (default: the cores).")
    private Integer jobs;

    @Option(names = "--quiet", description = "Print nothing but refusals and faults.")
    private boolean quiet;

    @Option(names = "--no-charts", description = "Leave the charts out.")
    private boolean noCharts;

    @Parameters(
            paramLabel = "PROFILE",
            arity = "0..*",
            description = "Names of profiles, or paths of CSV files (default: all).")
    private List<String> profiles = new ArrayList<>();

    CheckCommand(Main.Console console) {
        this.console = console;
    }

    @Override
    public Integer call() throws Exception {
        if (jobs != null && jobs < 1) {
            throw new CommandLine.ParameterException(
                    spec.commandLine(), "--jobs is " + jobs + "; at least 1 is wanted");
        }
        ProfileFolder folder = new ProfileFolder(folders.profiles);
        List<Profile> read = profiles.isEmpty() ? folder.readAll() : folder.read(profiles);
        int workers = jobs == null ? Runtime.getRuntime().availableProcessors() : jobs;
        List<Outcome> outcomes =
                new CheckRun(new ReportFolder(reports), workers, !noCharts, console.err()::println).of(read);
        if (!quiet) {
            console.out().print(new Summary(outcomes).console(console.colour()));
            console.out().println("reports: " + reports);
        }
        return outcomes.stream().allMatch(Outcome::passes) ? Main.CLEAR : Main.NOT_PASSED;
    }
}
