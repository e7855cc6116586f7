package undermask.input;

import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CoderResult;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.LinkedHashSet;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import undermask.unit.Figures;
import undermask.unit.Place;

/** The text of one file, with line feeds as the only line ends, and the place of every character. */
final class SourceText {
    /** More than any table of settings needs; a larger file is a record or a mistake and is not read into memory. */
    static final int LARGEST_BYTES = 1 << 20;

    /** What the decoder puts in place of a byte that is no UTF-8. */
    static final char DAMAGED = '\uFFFD';

    private final String file;
    private final String text;
    private final int[] lineStarts;

    private SourceText(String file, String text) {
        this.file = file;
        this.text = text;
        int[] starts = new int[text.length() + 1];
        int lines = 1;
        for (int i = 0; i < text.length(); i++) {
            if (text.charAt(i) == '\n') {
                starts[lines++] = i + 1;
            }
        }
        this.lineStarts = Arrays.copyOf(starts, lines);
    }

    /**
     * This text of a quantity file with some rows set: replaced where they stand, else added at the end.
     *
     * @param rows quantity to what stands behind it, {@code value,unit} with commas or semicolons as the file has them
     */
    SourceText withRows(Map<String, SetRow> rows) {
        char separator = text.lines()
                .filter(line -> line.startsWith("quantity"))
                .findFirst()
                .map(line -> line.contains(";") ? ';' : ',')
                .orElse(',');
        StringBuilder changed = new StringBuilder();
        Set<String> left = new LinkedHashSet<>(rows.keySet());
        for (String line : text.split("\n", -1)) {
            int end = line.indexOf(separator);
            String quantity = end < 0 ? "" : line.substring(0, end).strip();
            changed.append(left.remove(quantity) ? row(quantity, rows.get(quantity), separator) : line)
                    .append('\n');
        }
        left.forEach(quantity ->
                changed.append(row(quantity, rows.get(quantity), separator)).append('\n'));
        return new SourceText(file, changed.toString());
    }

    private static String row(String quantity, SetRow row, char separator) {
        return quantity + separator + '"' + row.value() + '"' + separator + row.unit() + separator;
    }

    /**
     * Reads a file.
     *
     * @param path named in messages as it is given here
     * @return the text, or empty when there is none to go on with; the reason is then among the problems
     */
    static Optional<SourceText> read(Path path, Problems problems) {
        Place whole = Place.of(path.toString());
        if (!Files.exists(path)) {
            problems.add(whole, "no such file");
            return Optional.empty();
        }
        if (!Files.isRegularFile(path)) {
            problems.add(whole, Files.isDirectory(path) ? "a folder, wanted is a file" : "not a regular file");
            return Optional.empty();
        }
        byte[] bytes;
        try (InputStream in = Files.newInputStream(path)) {
            long size = Files.size(path);
            bytes = size > LARGEST_BYTES ? null : in.readNBytes(LARGEST_BYTES + 1);
            if (bytes == null || bytes.length > LARGEST_BYTES) {
                String megabytes = Figures.significant(Math.max(size, LARGEST_BYTES) / 1e6, 3);
                problems.add(
                        whole,
                        "file of " + megabytes + " MB; a table of settings, parts or limits may have 1 MiB at most");
                return Optional.empty();
            }
        } catch (IOException e) {
            problems.add(
                    whole,
                    "cannot be read: " + (e instanceof AccessDeniedException ? "access denied" : e.getMessage()));
            return Optional.empty();
        }
        return of(path.toString(), bytes, problems);
    }

    /**
     * Reads a file that is built in.
     *
     * @throws IllegalStateException when it is missing
     */
    static Optional<SourceText> builtIn(String resource, Problems problems) {
        try (InputStream in = SourceText.class.getResourceAsStream(resource)) {
            if (in == null) {
                throw new IllegalStateException("built-in table " + resource + " is missing");
            }
            return of("built-in " + resource, in.readAllBytes(), problems);
        } catch (IOException e) {
            throw new IllegalStateException("built-in table " + resource + " cannot be read", e);
        }
    }

    private static Optional<SourceText> of(String file, byte[] bytes, Problems problems) {
        if (startsWith(bytes, 0xFF, 0xFE) || startsWith(bytes, 0xFE, 0xFF)) {
            problems.add(Place.of(file), "text in UTF-16; save the file as UTF-8");
            return Optional.empty();
        }
        boolean marked = startsWith(bytes, 0xEF, 0xBB, 0xBF);
        SourceText source = new SourceText(file, decode(bytes, marked ? 3 : 0));
        return source.isText(problems) ? Optional.of(source) : Optional.empty();
    }

    private static boolean startsWith(byte[] bytes, int... beginning) {
        for (int i = 0; i < beginning.length; i++) {
            if (i >= bytes.length || (bytes[i] & 0xFF) != beginning[i]) {
                return false;
            }
        }
        return true;
    }

    private static String decode(byte[] bytes, int from) {
        CharsetDecoder decoder = StandardCharsets.UTF_8
                .newDecoder()
                .onMalformedInput(CodingErrorAction.REPLACE)
                .onUnmappableCharacter(CodingErrorAction.REPLACE)
                .replaceWith(String.valueOf(DAMAGED));
        // UTF-8 never has more characters than bytes
        CharBuffer characters = CharBuffer.allocate(bytes.length);
        CoderResult result = decoder.decode(ByteBuffer.wrap(bytes, from, bytes.length - from), characters, true);
        if (!result.isUnderflow() || !decoder.flush(characters).isUnderflow()) {
            throw new IllegalStateException("the decoder stopped at " + result);
        }
        return characters.flip().toString().replace("\r\n", "\n").replace('\r', '\n');
    }

    /** Names the first damaged character of each line; a control character ends the reading. */
    private boolean isText(Problems problems) {
        int damagedLine = -1;
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            if (Character.isISOControl(c) && c != '\n' && c != '\t') {
                String code = String.format(Locale.ROOT, "U+%04X", (int) c);
                problems.add(place(i), "control character " + code + "; wanted is a text file, this looks binary");
                return false;
            }
            if (c == DAMAGED && damagedLine != line(i)) {
                damagedLine = line(i);
                problems.add(place(i), "a byte here is no UTF-8; save the file as UTF-8");
            }
        }
        return true;
    }

    String file() {
        return file;
    }

    String text() {
        return text;
    }

    /** Where the line that starts at an offset ends: at its line feed or at the end of the text. */
    int lineEnd(int from) {
        int end = text.indexOf('\n', from);
        return end < 0 ? text.length() : end;
    }

    /** Line and column of the character at an offset, columns counted in characters from 1. */
    Place place(int offset) {
        int line = line(offset);
        int column = text.codePointCount(lineStarts[line - 1], offset) + 1;
        return new Place(file, line, column);
    }

    private int line(int offset) {
        int found = Arrays.binarySearch(lineStarts, offset);
        return found >= 0 ? found + 1 : -found - 1;
    }
}
