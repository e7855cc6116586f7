package undermask.cli;

import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/**
 * A run of the program and what came of it.
 *
 * @param status exit status
 * @param out what went to standard output
 * @param err what went to standard error
 */
record Run(int status, String out, String err) {
    /** Runs the program without colour. */
    static Run of(String... arguments) {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        int status = Main.run(
                arguments,
                new Main.Console(
                        new PrintStream(out, true, StandardCharsets.UTF_8),
                        new PrintStream(err, true, StandardCharsets.UTF_8),
                        false,
                        false));
        return new Run(status, out.toString(StandardCharsets.UTF_8), err.toString(StandardCharsets.UTF_8));
    }

    /** Runs a command on the folders {@code profiles} and {@code reports} below a folder. */
    static Run in(Path folder, String command, String... arguments) {
        List<String> all = new ArrayList<>(List.of(
                command,
                "--profiles",
                folder.resolve("profiles").toString(),
                "--reports",
                folder.resolve("reports").toString()));
        all.addAll(List.of(arguments));
        return of(all.toArray(String[]::new));
    }
}
