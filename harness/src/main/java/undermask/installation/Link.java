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
    public static final Range ESR = new Range("link capacitor ESR", Dimension.RESISTANCE, 0, 10);
    public static final Range ESL = new Range("link capacitor ESL", Dimension.INDUCTANCE, 0, 1e-6);
    public static final Range EARTH_ESR = new Range("link to earth ESR", Dimension.RESISTANCE, 0, 100);
    public static final Range EARTH_ESL = new Range("link to earth ESL", Dimension.INDUCTANCE, 0, 1e-6);

    /** Builds a link; each value must lie in its range. */
    public Link {
        Objects.requireNonNull(capacitor);
        Objects.requireNonNull(toEarth);
        CAPACITANCE.check(capacitor.capacitance());
        ESR.check(capacitor.esr());
        ESL.check(capacitor.esl());
        EARTH_CAPACITANCE.check(toEarth.capacitance());
        EARTH_ESR.check(toEarth.esr());
        EARTH_ESL.check(toEarth.esl());
    }
}
