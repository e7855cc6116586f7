package undermask.receiver;

/**
 * What the detectors show at one tuning step, as the rms value in V of the sine that would give the same.
 *
 * @param quasiPeak NaN where the receiver has no quasi-peak detector
 */
public record Reading(double peak, double quasiPeak, double average) {
    /** What a detector reads, V rms. */
    public double of(Detector detector) {
        return switch (detector) {
            case PEAK -> peak;
            case QUASI_PEAK -> quasiPeak;
            case AVERAGE -> average;
        };
    }
}
