package undermask.drive;

import undermask.unit.Dimension;
import undermask.unit.Range;

/**
 * The damped oscillation that follows a forced edge.
 *
 * @param frequency undamped, Hz
 * @param damping ratio ζ
 * @param overshoot first amplitude over the height of the edge, before damping
 */
public record Ringing(double frequency, double damping, double overshoot) {
    public static final Range FREQUENCY = new Range("ringing frequency", Dimension.FREQUENCY, 0.5e6, 100e6);
    public static final Range DAMPING = new Range("ringing damping ratio", Dimension.NUMBER, 0.005, 0.99);
    public static final Range OVERSHOOT = new Range("ringing overshoot", Dimension.NUMBER, 0, 1);

    /** Builds ringing; each value must lie in its range. */
    public Ringing {
        FREQUENCY.check(frequency);
        DAMPING.check(damping);
        OVERSHOOT.check(overshoot);
    }
}
