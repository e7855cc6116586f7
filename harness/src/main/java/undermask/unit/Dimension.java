package undermask.unit;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/**
 * The physical dimensions of this trade, each with the unit symbols that files may use and the SI unit in which the
 * program computes.
 *
 * <p>Symbols are case sensitive, as in the SI. Prefixes p, n, u (or µ), m, k, M and G may precede a symbol that takes
 * prefixes.
 */
public enum Dimension {
    /** A pure number; files leave the unit column empty or write {@code 1} or {@code %}. */
    NUMBER("", plain("1"), scaled("%", 0.01)),
    FREQUENCY("Hz", prefixed("Hz")),
    TIME("s", prefixed("s"), scaled("min", 60), scaled("h", 3600)),
    VOLTAGE("V", prefixed("V")),
    CURRENT("A", prefixed("A")),
    POWER("W", prefixed("W")),
    RESISTANCE("ohm", prefixed("ohm"), prefixed("Ω")),
    CAPACITANCE("F", prefixed("F")),
    INDUCTANCE("H", prefixed("H")),
    LENGTH("m", prefixed("m"), scaled("cm", 0.01)),
    /** Voltage slew rate; files use {@code kV/us} or {@code V/ns}. */
    SLEW("V/s", ratio("V", "s")),
    CAPACITANCE_PER_LENGTH("F/m", ratio("F", "m")),
    INDUCTANCE_PER_LENGTH("H/m", ratio("H", "m")),
    RESISTANCE_PER_LENGTH("ohm/m", ratio("ohm", "m")),
    /** Degrees Celsius, a scale and not an interval; computed in degrees Celsius. */
    TEMPERATURE("degC", plain("degC"), plain("°C")),
    /** A ratio of levels. */
    DECIBEL("dB", plain("dB")),
    /** A level referred to 1 µV rms. */
    LEVEL("dBuV", plain("dBuV"), plain("dBµV"));

    private final String si;
    private final List<Symbol> symbols;

    Dimension(String si, Symbol... symbols) {
        this.si = si;
        this.symbols = List.of(symbols);
    }

    /** The symbol of the unit in which the program computes, empty for a pure number. */
    public String siSymbol() {
        return si;
    }

    /**
     * The factor that turns a number in the named unit into SI.
     *
     * @param symbol the unit as a file writes it, prefix included
     * @return the factor, or empty when the symbol is no unit of this dimension
     */
    public Optional<Double> factor(String symbol) {
        if (this == NUMBER && symbol.isEmpty()) {
            return Optional.of(1.0);
        }
        String wanted = symbol.replace('μ', 'µ');
        return symbols.stream()
                .map(candidate -> candidate.factor(wanted))
                .flatMap(Optional::stream)
                .findFirst();
    }

    /** The dimension that a unit symbol belongs to, or empty when no dimension knows it. */
    public static Optional<Dimension> of(String symbol) {
        return Arrays.stream(values())
                .filter(dimension -> dimension.factor(symbol).isPresent())
                .findFirst();
    }

    /** The name of the dimension in plain words, as messages use it: {@code capacitance per length}. */
    public String words() {
        return name().toLowerCase(java.util.Locale.ROOT).replace('_', ' ');
    }

    private sealed interface Symbol permits Plain, Prefixed, Ratio {
        Optional<Double> factor(String text);
    }

    private record Plain(String text, double value) implements Symbol {
        @Override
        public Optional<Double> factor(String symbol) {
            return symbol.equals(text) ? Optional.of(value) : Optional.empty();
        }
    }

    private record Prefixed(String base) implements Symbol {
        @Override
        public Optional<Double> factor(String symbol) {
            if (symbol.equals(base)) {
                return Optional.of(1.0);
            }
            if (!symbol.endsWith(base)) {
                return Optional.empty();
            }
            return Prefix.factor(symbol.substring(0, symbol.length() - base.length()));
        }
    }

    private record Ratio(Prefixed above, Prefixed below) implements Symbol {
        @Override
        public Optional<Double> factor(String symbol) {
            int slash = symbol.indexOf('/');
            if (slash < 0) {
                return Optional.empty();
            }
            Optional<Double> upper = above.factor(symbol.substring(0, slash));
            Optional<Double> lower = below.factor(symbol.substring(slash + 1));
            return upper.isPresent() && lower.isPresent() ? Optional.of(upper.get() / lower.get()) : Optional.empty();
        }
    }

    private static Symbol plain(String text) {
        return new Plain(text, 1);
    }

    private static Symbol scaled(String text, double value) {
        return new Plain(text, value);
    }

    private static Symbol prefixed(String base) {
        return new Prefixed(base);
    }

    private static Symbol ratio(String above, String below) {
        return new Ratio(new Prefixed(above), new Prefixed(below));
    }
}
