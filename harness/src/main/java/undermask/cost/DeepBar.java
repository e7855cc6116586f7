package undermask.cost;

/**
 * How alternating current crowds in a bar in its slot.
 *
 * <p>Source: machine design textbooks (Richter, Alger, Pyrhönen), from memory.
 */
final class DeepBar {
    private static final double MU_0 = 4e-7 * Math.PI;
    /** From here on both factors are their asymptotes to rounding. */
    private static final double LARGE = 18;

    private DeepBar() {}

    /**
     * Reduced height ξ = h·√(πfµ0σ).
     *
     * @param height of the bar in m
     * @param conductivity in S/m, that of the bar over the slot's width
     */
    static double reducedHeight(double height, double frequency, double conductivity) {
        return height * Math.sqrt(Math.PI * frequency * MU_0 * conductivity);
    }

    /** Resistance over that of direct current, ξ(sinh2ξ + sin2ξ)/(cosh2ξ − cos2ξ). */
    static double resistance(double xi) {
        if (xi < 1e-3) {
            return 1;
        }
        return xi > LARGE ? xi : xi * (Math.sinh(2 * xi) + Math.sin(2 * xi)) / (Math.cosh(2 * xi) - Math.cos(2 * xi));
    }

    /** Slot leakage over that of direct current, 3/(2ξ)·(sinh2ξ − sin2ξ)/(cosh2ξ − cos2ξ). */
    static double leakage(double xi) {
        if (xi < 1e-3) {
            return 1;
        }
        return xi > LARGE
                ? 1.5 / xi
                : 1.5 / xi * (Math.sinh(2 * xi) - Math.sin(2 * xi)) / (Math.cosh(2 * xi) - Math.cos(2 * xi));
    }
}
