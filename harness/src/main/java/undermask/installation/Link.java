package undermask.installation;

import java.util.Objects;
import undermask.unit.Dimension;
import undermask.unit.Range;

/**
 * The DC link.
 *
 * @param capacitor between the rails
 * @param toEarth from each rail to PE inside the drive
 */
public record Link(Capacitor capacitor, Capacitor toEarth) {
    public static final Range CAPACITANCE = new Range("link capacitance", Dimension.CAPACITANCE, 1e-6, 0.1);
    public static final Range EARTH_CAPACITANCE =
            new Range("link to earth capacitance", Dimension.CAPACITANCE, 0, 2e-6);

    /** Builds a link; both capacitances must lie in their ranges. */
    public Link {
        Objects.requireNonNull(capacitor);
        Objects.requireNonNull(toEarth);
        CAPACITANCE.check(capacitor.capacitance());
        EARTH_CAPACITANCE.check(toEarth.capacitance());
    }
}
