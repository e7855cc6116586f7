package undermask.cli;

import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import undermask.input.ProfileFolder;
import undermask.report.MaskList;

/** Lists the known masks. */
@Command(
        name = "masks",
        description = "Lists the published and the own masks with their source.%n",
        mixinStandardHelpOptions = true)
final class MasksCommand implements Callable<Integer> {
    private final Main.Console console;

    @Mixin
    private Main.Folders folders;

    MasksCommand(Main.Console console) {
        this.console = console;
    }

    @Override
    public Integer call() throws Exception {
        console.out().print(MaskList.of(new ProfileFolder(folders.profiles).masks()));
        return Main.CLEAR;
    }
}
