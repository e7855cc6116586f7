package undermask.drive;

import java.util.Objects;
import java.util.Optional;
import undermask.unit.Dimension;
import undermask.unit.Range;

/**
 * How the output voltage gets from rail to rail. An edge that a switch forces by turning on has the set dv/dt, less
 * with current; one that the load current drives has what it charges the output capacitance with, at most the set dv/dt.
 *
 * @param slewRising dv/dt of an edge that raises the output at no current, V/s
 * @param slewFalling dv/dt of an edge that lowers it, V/s
 * @param form shape of all edges
 * @param turnOnSlowing by which share a forced edge takes longer at the reference current
 * @param referenceCurrent peak current of that, A
 * @param outputCapacitance of the switches of a leg, F
 * @param ringingRising what follows a forced rising edge, the upper switch's
 * @param ringingFalling what follows a forced falling edge, the lower switch's
 */
public record Edges(
        double slewRising,
        double slewFalling,
        EdgeForm form,
        double turnOnSlowing,
        double referenceCurrent,
        double outputCapacitance,
        Optional<Ringing> ringingRising,
        Optional<Ringing> ringingFalling) {
    public static final Range SLEW_RISING = new Range("dv/dt rising", Dimension.SLEW, 0.05e9, 200e9);
    public static final Range SLEW_FALLING = new Range("dv/dt falling", Dimension.SLEW, 0.05e9, 200e9);
    public static final Range TURN_ON_SLOWING = new Range("turn-on slowing", Dimension.NUMBER, 0, 5);
    public static final Range REFERENCE_CURRENT = new Range("turn-on reference current", Dimension.CURRENT, 0.1, 5000);
    public static final Range OUTPUT_CAPACITANCE = new Range("output capacitance", Dimension.CAPACITANCE, 0, 100e-9);

    /** Builds edges; each value must lie in its range. */
    public Edges {
        SLEW_RISING.check(slewRising);
        SLEW_FALLING.check(slewFalling);
        Objects.requireNonNull(form);
        TURN_ON_SLOWING.check(turnOnSlowing);
        REFERENCE_CURRENT.check(referenceCurrent);
        OUTPUT_CAPACITANCE.check(outputCapacitance);
        Objects.requireNonNull(ringingRising);
        Objects.requireNonNull(ringingFalling);
    }

    /** Edges of set dv/dt at any current, without ringing. */
    public static Edges of(double slewRising, double slewFalling, EdgeForm form) {
        return new Edges(slewRising, slewFalling, form, 0, 1, 0, Optional.empty(), Optional.empty());
    }
}
