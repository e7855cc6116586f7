package undermask.unit;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/**
 * The physical dimensions of this trade, each with the unit symbols that files may use and the SI unit in which the
 * program computes.
 *
 * <p>Symbols are case sensitive, as in the SI; {@code Ω} is read as {@code ohm}. Prefixes p, n, u (or µ), m, k, M and G may precede a symbol that takes
 * prefixes.
 */
public enum Dimension {
    /** A pure number; files leave the unit column empty or write {@code %}. */
    NUMBER("", "none or %", scaled("%", 0.01)),
    FREQUENCY("Hz", "Hz, kHz or MHz", prefixed("Hz")),
    TIME("s", "ns, us, ms or s", prefixed("s"), scaled("min", 60), scaled("h", 3600)),
    VOLTAGE("V", "V or kV", prefixed("V")),
    CURRENT("A", "mA or A", prefixed("A")),
    POWER("W", "W or kW", prefixed("W")),
    RESISTANCE("ohm", "mohm, ohm or kohm", prefixed("ohm")),
    CAPACITANCE("F", "pF, nF or uF", prefixed("F")),
    INDUCTANCE("H", "nH, uH or mH", prefixed("H")),
    LENGTH("m", "mm, cm or m", prefixed("m"), scaled("cm", 0.01)),
    /** Voltage slew rate; files use {@code kV/us} or {@code V/ns}. */
    SLEW("V/s", "kV/us or V/ns", ratio("V", "s")),
    CAPACITANCE_PER_LENGTH("F/m", "pF/m or nF/m", ratio("F", "m")),
    INDUCTANCE_PER_LENGTH("H/m", "nH/m or uH/m", ratio("H", "m")),
    RESISTANCE_PER_LENGTH("ohm/m", "mohm/m or ohm/m", ratio("ohm", "m")),
    /** Degrees Celsius, a scale and not an interval; computed in degrees Celsius. */
    TEMPERATURE("degC", "degC", plain("degC"), plain("°C")),
    /** A ratio of levels. */
    DECIBEL("dB", "dB", plain("dB")),
    /** A level referred to 1 µV rms. */
    LEVEL("dBuV", "dBuV", plain("dBuV"), plain("dBµV"));

    private final String si;
    private final String examples;
    private final List<Symbol> symbols;

    Dimension(String si, String examples, Symbol... symbols) {
        this.si = si;
        this.examples = examples;
        this.symbols = List.of(symbols);
    }

    /** The symbol of the unit in which the program computes, empty for a pure number. */
    public String siSymbol() {
        return si;
    }

    /** The units that files mostly use for it, in words: {@code Hz, kHz or MHz}. */
    public String examples() {
        return examples;
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
        // Greek mu and micro sign, Greek omega and ohm sign look alike in an editor
        String wanted = symbol.replace('\u03bc', 'µ').replace("\u03a9", "ohm").replace("\u2126", "ohm");
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
