package undermask.unit;

import java.util.Optional;

/** The SI prefixes from pico to giga. */
enum Prefix {
    PICO("p", 1e-12),
    NANO("n", 1e-9),
    MICRO("µ", 1e-6),
    MILLI("m", 1e-3),
    NONE("", 1),
    KILO("k", 1e3),
    MEGA("M", 1e6),
    GIGA("G", 1e9);

    final String symbol;
    final double value;

    Prefix(String symbol, double value) {
        this.symbol = symbol;
        this.value = value;
    }

    /** The factor of a prefix symbol; {@code u} stands for micro. */
    static Optional<Double> factor(String symbol) {
        String wanted = symbol.equals("u") ? "µ" : symbol;
        for (Prefix prefix : values()) {
            if (prefix.symbol.equals(wanted)) {
                return Optional.of(prefix.value);
            }
        }
        return Optional.empty();
    }

    /** The largest prefix that leaves a modulus of at least 1; {@code NONE} for zero. */
    static Prefix fitting(double value) {
        double modulus = Math.abs(value) * (1 + 1e-12);
        if (modulus == 0 || !Double.isFinite(modulus)) {
            return NONE;
        }
        Prefix best = PICO;
        for (Prefix prefix : values()) {
            if (modulus >= prefix.value) {
                best = prefix;
            }
        }
        return best;
    }
}
