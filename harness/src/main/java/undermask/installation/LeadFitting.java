package undermask.installation;

import java.util.Objects;
import java.util.Optional;
import undermask.unit.Dimension;
import undermask.unit.Range;

/**
 * How the motor lead is fitted.
 *
 * @param shield how its shield is connected; of no effect for an unshielded lead
 * @param pigtailLength of each twisted tail, m
 * @param cores ring cores at the drive's end
 * @param motors in parallel on one drive, each with a lead of its own of the same length
 */
public record LeadFitting(ShieldTermination shield, double pigtailLength, Optional<RingCores> cores, int motors) {
    public static final Range PIGTAIL = new Range("pigtail length", Dimension.LENGTH, 0.005, 2);
    public static final Range MOTORS = new Range("motors in parallel", Dimension.NUMBER, 1, 50);

    /** Shield bonded all round, no cores, one motor. */
    public static final LeadFitting PLAIN = new LeadFitting(ShieldTermination.ALL_ROUND, 0.1, Optional.empty(), 1);

    /** Builds a fitting. */
    public LeadFitting {
        Objects.requireNonNull(shield);
        PIGTAIL.check(pigtailLength);
        Objects.requireNonNull(cores);
        MOTORS.check(motors);
    }
}
