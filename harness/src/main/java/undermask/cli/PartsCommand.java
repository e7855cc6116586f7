package undermask.cli;

import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import undermask.input.ProfileFolder;
import undermask.report.PartList;

/** Lists the known parts. */
@Command(
        name = "parts",
        description = "Lists the built-in and the own parts with their values and source.%n",
        mixinStandardHelpOptions = true)
final class PartsCommand implements Callable<Integer> {
    private final Main.Console console;

    @Mixin
    private Main.Folders folders;

    PartsCommand(Main.Console console) {
        this.console = console;
    }

    @Override
    public Integer call() throws Exception {
        console.out().print(PartList.of(new ProfileFolder(folders.profiles).parts()));
        return Main.CLEAR;
    }
}
