package undermask.unit;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/** Numbers as text, rounded once and independent of the locale. */
public final class Figures {
    private static final double LARGEST_EXACT = 1L << 53;

    private Figures() {}

    /**
     * A number with its unit and a fitting SI prefix: {@code 4 kHz}, {@code 2.5 kV/us}, {@code 470 µF}.
     *
     * @param value in SI
     * @param digits significant digits, at least 1; trailing zeros are left out
     */
    public static String withUnit(double value, Dimension dimension, int digits) {
        if (!Double.isFinite(value)) {
            return Double.toString(value) + " " + dimension.siSymbol();
        }
        return switch (dimension) {
            case NUMBER -> significant(value, digits);
            case TEMPERATURE -> significant(value, digits) + " degC";
            case DECIBEL, LEVEL -> significant(value, digits) + " " + dimension.siSymbol();
            case SLEW -> significant(value * 1e-9, digits) + " kV/us";
            default -> {
                Prefix prefix = Prefix.fitting(value);
                // 999.97 rounds to 1000: ask again with the rounded value
                double rounded = value == 0 ? 0 : round(value / prefix.value, digits) * prefix.value;
                prefix = Prefix.fitting(rounded);
                yield significant(value / prefix.value, digits) + " " + prefix.symbol + dimension.siSymbol();
            }
        };
    }

    /** A number with so many significant digits and no exponent: {@code 0.00125}, {@code 4000}. */
    public static String significant(double value, int digits) {
        if (!Double.isFinite(value)) {
            return Double.toString(value);
        }
        if (value == 0) {
            return "0";
        }
        return new BigDecimal(value)
                .round(new MathContext(digits, RoundingMode.HALF_EVEN))
                .stripTrailingZeros()
                .toPlainString();
    }

    /** A number with a fixed count of decimals, ties rounded to even, never {@code -0.0}: {@code 12.3}. */
    public static String fixed(double value, int decimals) {
        long scale = 1;
        for (int i = 0; i < decimals; i++) {
            scale *= 10;
        }
        double scaled = Math.rint(Math.abs(value) * scale);
        if (!(scaled < LARGEST_EXACT)) {
            return Double.isFinite(value)
                    ? new BigDecimal(value)
                            .setScale(decimals, RoundingMode.HALF_EVEN)
                            .toPlainString()
                    : Double.toString(value);
        }
        long digits = (long) scaled;
        StringBuilder text = new StringBuilder();
        if (value < 0 && digits > 0) {
            text.append('-');
        }
        text.append(digits / scale);
        if (decimals > 0) {
            String fraction = Long.toString(digits % scale);
            text.append('.').append("0".repeat(decimals - fraction.length())).append(fraction);
        }
        return text.toString();
    }

    private static double round(double value, int digits) {
        return new BigDecimal(value)
                .round(new MathContext(digits, RoundingMode.HALF_EVEN))
                .doubleValue();
    }
}
