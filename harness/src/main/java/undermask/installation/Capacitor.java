package undermask.installation;

/**
 * A capacitor with its losses and its lead.
 *
 * @param capacitance in F, not negative; 0 means none is fitted
 * @param esr equivalent series resistance in ohm
 * @param esl equivalent series inductance in H
 */
public record Capacitor(double capacitance, double esr, double esl) {
    /** Builds a capacitor of finite, non-negative values. */
    public Capacitor {
        for (double value : new double[] {capacitance, esr, esl}) {
            if (!(value >= 0) || Double.isInfinite(value)) {
                throw new IllegalArgumentException("a capacitor has a value of " + value);
            }
        }
    }

    public boolean fitted() {
        return capacitance > 0;
    }
}
