package undermask.unit;

/**
 * Where a value stands: file as the user named it, line and column from 1. Column 0 means the whole line, line 0 the
 * whole file.
 */
public record Place(String file, int line, int column) implements Comparable<Place> {
    /** A place that means a file as a whole. */
    public static Place of(String file) {
        return new Place(file, 0, 0);
    }

    /** {@code file:line:column}, clickable in most terminals and editors. */
    @Override
    public String toString() {
        if (line == 0) {
            return file;
        }
        return column == 0 ? file + ":" + line : file + ":" + line + ":" + column;
    }

    @Override
    public int compareTo(Place other) {
        int byFile = file.compareTo(other.file);
        if (byFile != 0) {
            return byFile;
        }
        int byLine = Integer.compare(line, other.line);
        return byLine != 0 ? byLine : Integer.compare(column, other.column);
    }
}
