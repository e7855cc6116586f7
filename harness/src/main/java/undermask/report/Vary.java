package undermask.report;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import undermask.unit.Figures;

/**
 * What a sweep varies: a quantity and the values it takes.
 *
 * @param quantity as it is written, a short form allowed
 * @param values as a file would have them, at least two
 * @param unit empty for none
 */
public record Vary(String quantity, List<String> values, String unit) {
    /** Most values of one quantity. */
    public static final int MOST = 1_000_000;

    private static final Pattern RANGE =
            Pattern.compile("\\s*(\\S+?)\\s*\\.\\.\\s*(\\S+)\\s+by\\s+(\\S+)\\s*(\\S*)\\s*");
    /** Short forms that the trade uses at the bench. */
    private static final Map<String, String> SHORT =
            Map.of("carrier", "carrier frequency", "lead length", "motor lead length", "filter", "mains filter");

    /** Takes a copy. */
    public Vary {
        values = List.copyOf(values);
    }

    /**
     * Reads {@code QUANTITY=FROM..TO by STEP UNIT} or {@code QUANTITY=A,B,C UNIT}.
     *
     * @throws IllegalArgumentException saying what is wrong
     */
    public static Vary of(String text) {
        int equals = text.indexOf('=');
        if (equals <= 0) {
            throw new IllegalArgumentException(
                    "\"" + text + "\": wanted is QUANTITY=FROM..TO by STEP UNIT, or" + " QUANTITY=A,B,C UNIT");
        }
        String written = text.substring(0, equals).strip();
        String quantity = SHORT.getOrDefault(written, written);
        String values = text.substring(equals + 1);
        Matcher range = RANGE.matcher(values);
        Vary vary = values.contains("..") ? range(text, quantity, range) : list(quantity, values);
        if (vary.values.size() < 2) {
            throw new IllegalArgumentException("\"" + text + "\": one value is no sweep; give two or more");
        }
        return vary;
    }

    private static Vary range(String text, String quantity, Matcher range) {
        if (!range.matches()) {
            throw new IllegalArgumentException("\"" + text + "\": wanted is QUANTITY=FROM..TO by STEP UNIT");
        }
        double from = number(text, range.group(1));
        double to = number(text, range.group(2));
        double step = number(text, range.group(3));
        if (!(step > 0) || !(to > from)) {
            throw new IllegalArgumentException("\"" + text + "\": runs backwards or stands still; wanted is FROM below"
                    + " TO and a STEP above 0");
        }
        double count = Math.floor((to - from) / step * (1 + 1e-12)) + 1;
        if (count > MOST) {
            throw new IllegalArgumentException(
                    "\"" + text + "\": " + Figures.significant(count, 3) + " values; at most " + MOST + " are swept");
        }
        List<String> values = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            values.add(Figures.significant(from + i * step, 9));
        }
        return new Vary(quantity, values, range.group(4));
    }

    private static double number(String text, String written) {
        try {
            return Double.parseDouble(written);
        } catch (NumberFormatException e) {
            throw new IllegalArgumentException("\"" + text + "\": \"" + written + "\" is no number");
        }
    }

    private static Vary list(String quantity, String values) {
        String list = values.strip();
        int space = list.lastIndexOf(' ');
        boolean unit = space > 0 && !list.substring(space).contains(",");
        List<String> parts = Arrays.stream((unit ? list.substring(0, space) : list).split(","))
                .map(String::strip)
                .filter(part -> !part.isEmpty())
                .toList();
        return new Vary(quantity, parts, unit ? list.substring(space + 1) : "");
    }
}
