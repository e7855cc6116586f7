package undermask.report;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;

/** Where reports go. A file is written whole or not at all: it is made under another name and then renamed. */
public final class ReportFolder {
    private final Path root;

    /**
     * Names the folder; it is made when the first report is written.
     *
     * @param root as the user names it
     */
    public ReportFolder(Path root) {
        this.root = root;
    }

    /** The folder as the user named it. */
    public Path root() {
        return root;
    }

    void write(String folder, String file, String text) throws IOException {
        write(folder, file, text.getBytes(StandardCharsets.UTF_8));
    }

    /**
     * Writes a file.
     *
     * @param folder below the report folder; empty for the report folder itself
     * @throws IOException naming the file when it cannot be written; an older file of that name is then as it was
     */
    void write(String folder, String file, byte[] content) throws IOException {
        Path target = root.resolve(folder).resolve(file).normalize();
        if (!target.startsWith(root.normalize())) {
            throw new IOException(target + " lies outside the report folder " + root);
        }
        // not a temporary file of the runtime: those are for the owner's eyes only
        Path half =
                target.resolveSibling("." + file + "." + ProcessHandle.current().pid() + ".part");
        try {
            Files.createDirectories(target.getParent());
            Files.write(half, content);
            Files.move(half, target, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
        } catch (IOException e) {
            try {
                Files.deleteIfExists(half);
            } catch (IOException second) {
                e.addSuppressed(second);
            }
            throw new IOException("cannot write " + target + ": " + reason(e), e);
        }
    }

    private static String reason(IOException e) {
        return e.getClass().getSimpleName() + (e.getMessage() == null ? "" : " (" + e.getMessage() + ")");
    }
}
