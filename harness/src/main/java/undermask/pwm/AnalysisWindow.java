package undermask.pwm;

import undermask.unit.Dimension;
import undermask.unit.Figures;

/**
 * The time over which everything repeats: the shortest whole number of output periods that holds a whole number of
 * carrier periods to 1e-4 of the carrier.
 *
 * @param fundamentalPeriods whole number of output periods in the window
 * @param carrierPeriods whole number of carrier periods in the window
 * @param seconds its length
 * @param nudgePpm by how much the carrier was moved to fit, parts per million, signed
 */
public record AnalysisWindow(int fundamentalPeriods, int carrierPeriods, double seconds, double nudgePpm) {
    /** An asynchronous carrier below so many times the output frequency is refused. */
    public static final double LOWEST_RATIO = 6;

    private static final double TOLERANCE = 1e-4;

    /**
     * Finds the window.
     *
     * @throws IllegalArgumentException when the carrier is below six times the output frequency
     */
    static AnalysisWindow of(double carrierHz, double outputHz) {
        double ratio = carrierHz / outputHz;
        if (ratio < LOWEST_RATIO) {
            throw new IllegalArgumentException("carrier frequency "
                    + Figures.withUnit(carrierHz, Dimension.FREQUENCY, 4) + " is below six times the output frequency "
                    + Figures.withUnit(outputHz, Dimension.FREQUENCY, 4) + "; allowed: at least "
                    + Figures.withUnit(LOWEST_RATIO * outputHz, Dimension.FREQUENCY, 4));
        }
        int periods = 1;
        while (Math.abs(nudge(periods, ratio)) > TOLERANCE) {
            periods++;
        }
        int carriers = (int) Math.round(periods * ratio);
        return new AnalysisWindow(periods, carriers, periods / outputHz, 1e6 * nudge(periods, ratio));
    }

    private static double nudge(int periods, double ratio) {
        return Math.rint(periods * ratio) / (periods * ratio) - 1;
    }

    /** The carrier frequency after the nudge, Hz. */
    public double carrierHz() {
        return carrierPeriods / seconds;
    }
}
