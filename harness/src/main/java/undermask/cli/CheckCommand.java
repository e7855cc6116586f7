package undermask.cli;

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

    @Mixin
    private Main.Output output;

    @Option(names = "--jobs", paramLabel = "N", description = "Profiles checked at a time (default: the cores).")
    private Integer jobs;

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
        List<Outcome> outcomes = new CheckRun(
                        folder, new ReportFolder(output.reports), workers, !output.noCharts, console.err()::println)
                .of(read);
        if (!output.quiet) {
            console.out().print(new Summary(outcomes).console(console.colour()));
            console.out().println("reports: " + output.reports);
        }
        return outcomes.stream().allMatch(Outcome::passes) ? Main.CLEAR : Main.NOT_PASSED;
    }
}
