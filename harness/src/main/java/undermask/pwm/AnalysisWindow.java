package undermask.pwm;

import undermask.unit.Dimension;
import undermask.unit.Figures;

/**
 * The time over which everything repeats: the shortest whole number of output periods that holds a whole number of
 * carrier periods to 1e-4 of the carrier, and what else has to repeat in it.
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
    /** Slow companions, link ripple and spread, may be moved by this share: only their sidebands move along. */
    private static final double COMPANION_TOLERANCE = 0.1;

    /**
     * Finds the window.
     *
     * @param atLeast shortest length in s
     * @param companions frequencies in Hz that must fit roughly; those of 0 do not count
     */
    static AnalysisWindow of(double carrierHz, double outputHz, double atLeast, double... companions) {
        double ratio = carrierHz / outputHz;
        int periods = Math.max(1, (int) Math.ceil(atLeast * outputHz * (1 - TOLERANCE)));
        while (!fits(periods, outputHz, ratio, companions)) {
            periods++;
        }
        int carriers = (int) Math.round(periods * ratio);
        return new AnalysisWindow(periods, carriers, periods / outputHz, 1e6 * nudge(periods * ratio));
    }

    /**
     * Refuses a carrier that an output runs away from.
     *
     * @throws IllegalArgumentException when the carrier is below six times the output frequency
     */
    static void refuseSlowCarrier(double carrierHz, double outputHz) {
        if (carrierHz < LOWEST_RATIO * outputHz) {
            throw new IllegalArgumentException("carrier frequency "
                    + Figures.withUnit(carrierHz, Dimension.FREQUENCY, 4) + " is below six times the output frequency "
                    + Figures.withUnit(outputHz, Dimension.FREQUENCY, 4) + "; allowed: at least "
                    + Figures.withUnit(LOWEST_RATIO * outputHz, Dimension.FREQUENCY, 4));
        }
    }

    private static boolean fits(int periods, double outputHz, double ratio, double[] companions) {
        boolean fits = Math.abs(nudge(periods * ratio)) <= TOLERANCE;
        for (double companion : companions) {
            fits &= companion == 0 || Math.abs(nudge(periods * companion / outputHz)) <= COMPANION_TOLERANCE;
        }
        return fits;
    }

    /** By which share a count must be moved to be whole. */
    private static double nudge(double count) {
        return Math.rint(count) / count - 1;
    }

    /** A frequency moved so that whole periods of it fill the window, Hz. */
    double fitted(double hz) {
        return Math.rint(hz * seconds) / seconds;
    }

    /** The mean carrier frequency after the nudge, Hz. */
    public double carrierHz() {
        return carrierPeriods / seconds;
    }
}
