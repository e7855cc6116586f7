package undermask.pwm;

/**
 * The time over which everything repeats.
 *
 * @param fundamentalPeriods whole number of output periods in the window
 * @param carrierPeriods whole number of carrier periods in the window
 * @param seconds its length
 * @param nudgePpm by how much the carrier was moved to fit, parts per million, signed
 */
public record AnalysisWindow(int fundamentalPeriods, int carrierPeriods, double seconds, double nudgePpm) {}
