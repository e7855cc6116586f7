package undermask.installation;

import undermask.unit.Dimension;
import undermask.unit.Range;

/**
 * The lead between mains network and drive.
 *
 * @param length in m
 * @param lineInductance of each line conductor in H/m
 * @param earthInductance of the PE conductor in H/m
 */
public record MainsLead(double length, double lineInductance, double earthInductance) {
    public static final Range LENGTH = new Range("mains lead length", Dimension.LENGTH, 0.01, 50);
    public static final Range LINE_INDUCTANCE =
            new Range("mains lead line inductance", Dimension.INDUCTANCE_PER_LENGTH, 0.05e-6, 2e-6);
    public static final Range EARTH_INDUCTANCE =
            new Range("mains lead PE inductance", Dimension.INDUCTANCE_PER_LENGTH, 0.05e-6, 2e-6);

    /** Builds a lead; each value must lie in its range. */
    public MainsLead {
        LENGTH.check(length);
        LINE_INDUCTANCE.check(lineInductance);
        EARTH_INDUCTANCE.check(earthInductance);
    }
}
