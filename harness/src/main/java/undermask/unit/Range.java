package undermask.unit;

/**
 * What a quantity may be: its name at the bench, its dimension and its closed interval in SI. Constructors, readers and
 * messages share one constant.
 *
 * @param quantity the name as files write it
 * @param low the smallest value allowed, SI
 * @param high the largest value allowed, SI
 */
public record Range(String quantity, Dimension dimension, double low, double high) {
    /** Builds a range; {@code low} must not exceed {@code high}. */
    public Range {
        if (!(low <= high)) {
            throw new IllegalArgumentException(quantity + ": range " + low + " to " + high + " is empty");
        }
    }

    /** The same interval under another name. */
    public Range named(String other) {
        return new Range(other, dimension, low, high);
    }

    public boolean contains(double value) {
        return value >= low && value <= high;
    }

    /**
     * The value itself when it lies inside.
     *
     * @throws IllegalArgumentException naming quantity, value and range otherwise, also for NaN
     */
    public double check(double value) {
        if (!contains(value)) {
            throw new IllegalArgumentException(
                    quantity + " is " + Figures.withUnit(value, dimension, 6) + "; allowed: " + text());
        }
        return value;
    }

    /** The interval in words: {@code 500 Hz to 40 kHz}. */
    public String text() {
        return Figures.withUnit(low, dimension, 4) + " to " + Figures.withUnit(high, dimension, 4);
    }
}
