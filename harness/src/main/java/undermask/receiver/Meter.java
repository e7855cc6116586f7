package undermask.receiver;

/**
 * The critically damped indicating instrument behind the detectors: two equal time constants of 160 ms in bands A and B
 * (CISPR 16-1-1, Table 1).
 */
final class Meter {
    static final double TIME_CONSTANT = 160e-3;

    private Meter() {}

    /**
     * The highest deflection over a period that repeats for ever.
     *
     * <p>Each input is taken as constant over its share of the period, for which the response is exact; the state at the
     * start of the period follows from one period begun at rest.
     *
     * @param input array that holds the inputs, V
     * @param first index of the first one
     * @param stride distance of one input from the next
     * @param count how many inputs make up the period
     * @param period in s
     */
    static double highest(double[] input, int first, int stride, int count, double period) {
        double share = period / count / TIME_CONSTANT;
        double decay = Math.exp(-share);
        double inner = 0;
        double outer = 0;
        double highest = Double.NEGATIVE_INFINITY;
        for (int turn = 0; turn < 2; turn++) {
            for (int i = 0, at = first; i < count; i++, at += stride) {
                double innerGap = inner - input[at];
                double outerGap = outer - input[at];
                inner = input[at] + innerGap * decay;
                outer = input[at] + (outerGap + innerGap * share) * decay;
                highest = Math.max(highest, outer);
            }
            if (turn == 0) {
                double turns = period / TIME_CONSTANT;
                double left = -Math.expm1(-turns);
                inner /= left;
                outer = (outer + turns * (1 - left) * inner) / left;
                highest = outer;
            }
        }
        return highest;
    }
}
