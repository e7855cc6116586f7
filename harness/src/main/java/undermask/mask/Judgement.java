package undermask.mask;

import java.util.Optional;
import java.util.OptionalDouble;
import undermask.receiver.Detector;
import undermask.receiver.Trace;

/**
 * The worst frequency of one detector: where the margin to the mask is smallest.
 *
 * @param frequencyHz where
 * @param levelDbuv reading there
 * @param limitDbuv limit there
 * @param requiredDb margin that the policy asks for
 */
public record Judgement(Detector detector, double frequencyHz, double levelDbuv, double limitDbuv, double requiredDb) {

    /** Limit minus level, dB. */
    public double marginDb() {
        return limitDbuv - levelDbuv;
    }

    public Verdict verdict() {
        return Verdict.of(marginDb(), requiredDb);
    }

    /**
     * Judges a trace.
     *
     * @return the judgement at the smallest margin (the lowest frequency of equals), or empty when no step of the trace
     *     lies under the mask's limits of this detector
     * @throws IllegalArgumentException when the trace has no reading where the mask sets a limit
     */
    public static Optional<Judgement> worst(Trace trace, Mask mask, Detector detector, double requiredDb) {
        Judgement worst = null;
        for (int step = 0; step < trace.size(); step++) {
            double frequency = trace.frequency(step);
            OptionalDouble limit = mask.limitDbuv(detector, frequency);
            if (limit.isEmpty()) {
                continue;
            }
            double level = trace.levelDbuv(detector, step);
            if (Double.isNaN(level)) {
                throw new IllegalArgumentException(
                        "no " + detector.words() + " reading at " + frequency + " Hz for mask " + mask.name());
            }
            if (worst == null || limit.getAsDouble() - level < worst.marginDb()) {
                worst = new Judgement(detector, frequency, level, limit.getAsDouble(), requiredDb);
            }
        }
        return Optional.ofNullable(worst);
    }
}
