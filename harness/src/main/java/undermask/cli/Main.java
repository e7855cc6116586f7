package undermask.cli;

import java.io.PrintStream;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;
import undermask.input.Refused;

/** The program: arguments in, exit status out. */
@Command(
        name = "undermask",
        description = "Checks saved drive profiles against conducted-emission masks.%n",
        synopsisSubcommandLabel = "COMMAND",
        mixinStandardHelpOptions = true,
        versionProvider = Main.Version.class,
        footer = {
            "",
            "Exit status: 0 all clear; 1 a profile does not pass; 2 refused: an input or",
            "usage error, or nothing to check; 3 a fault of the program itself.",
            "A prediction is no compliance test."
        })
public final class Main implements Runnable {
    static final int CLEAR = 0;
    static final int NOT_PASSED = 1;
    static final int REFUSED = 2;
    static final int FAULT = 3;

    @Spec
    private CommandSpec spec;

    private Main() {}

    /** Runs the program and ends the process. */
    public static void main(String[] args) {
        PrintStream out = new PrintStream(System.out, true, StandardCharsets.UTF_8);
        PrintStream err = new PrintStream(System.err, true, StandardCharsets.UTF_8);
        boolean colour = System.console() != null && System.getenv("NO_COLOR") == null;
        System.exit(run(args, new Console(out, err, colour, System.console() != null)));
    }

    /**
     * Runs the program.
     *
     * @return the exit status
     */
    static int run(String[] args, Console console) {
        PrintStream out = console.out();
        PrintStream err = console.err();
        boolean colour = console.colour();
        CommandLine line = new CommandLine(new Main());
        line.addSubcommand("check", new CheckCommand(console));
        line.addSubcommand("sweep", new SweepCommand(console));
        line.addSubcommand("waveform", new WaveformCommand(console));
        line.addSubcommand("masks", new MasksCommand(console));
        line.addSubcommand("parts", new PartsCommand(console));
        line.setOut(new PrintWriter(out, true));
        line.setErr(new PrintWriter(err, true));
        line.setColorScheme(
                CommandLine.Help.defaultColorScheme(colour ? CommandLine.Help.Ansi.ON : CommandLine.Help.Ansi.OFF));
        line.setParameterExceptionHandler((e, arguments) -> {
            err.println("undermask: " + e.getMessage());
            err.println("Help: undermask " + name(e.getCommandLine()) + "--help");
            return REFUSED;
        });
        line.setExecutionExceptionHandler((e, command, result) -> {
            if (e instanceof Refused refused) {
                refused.problems().forEach(err::println);
                return REFUSED;
            }
            err.println("undermask: fault: " + (e.getMessage() == null ? e : e.getMessage()));
            if (Boolean.getBoolean("undermask.trace")) {
                e.printStackTrace(err);
            } else {
                err.println("Run with java -Dundermask.trace=true -jar … to see where.");
            }
            return FAULT;
        });
        return line.execute(args);
    }

    private static String name(CommandLine command) {
        return command.getParent() == null ? "" : command.getCommandName() + " ";
    }

    /** Asked for nothing: that is a usage error. */
    @Override
    public void run() {
        throw new CommandLine.ParameterException(spec.commandLine(), "no command was given");
    }

    static final class Version implements CommandLine.IVersionProvider {
        @Override
        public String[] getVersion() {
            String version = Main.class.getPackage().getImplementationVersion();
            return new String[] {"undermask " + (version == null ? "(unpacked)" : version)};
        }
    }

    /**
     * Where results and messages go.
     *
     * @param colour whether results may be coloured
     * @param terminal whether somebody watches
     */
    record Console(PrintStream out, PrintStream err, boolean colour, boolean terminal) {}

    /** The folder that every command knows. */
    static final class Folders {
        @CommandLine.Option(
                names = "--profiles",
                paramLabel = "DIR",
                defaultValue = "profiles",
                description = "Folder of profiles (default: ${DEFAULT-VALUE}).")
        Path profiles;
    }

    /** What every command knows that writes reports. */
    static final class Output {
        @CommandLine.Option(
                names = "--reports",
                paramLabel = "DIR",
                defaultValue = "reports",
                description = "Folder of reports (default: ${DEFAULT-VALUE}).")
        Path reports;

        @CommandLine.Option(names = "--quiet", description = "Print nothing but refusals and faults.")
        boolean quiet;

        @CommandLine.Option(names = "--no-charts", description = "Leave the charts out.")
        boolean noCharts;
    }
}
