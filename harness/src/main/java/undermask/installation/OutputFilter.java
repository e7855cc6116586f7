package undermask.installation;

import java.util.Objects;
import undermask.unit.Dimension;
import undermask.unit.Range;

/**
 * A choke or filter between drive and motor lead.
 *
 * @param inductance per phase, H
 * @param commonModeShare of a phase's inductance that common mode sees: 1 for three single chokes, a few percent for one
 *     core of three legs
 * @param capacitance between each phase and the star of the capacitors, F; 0 for a choke
 * @param resistance that damps, in series with each capacitor, ohm
 */
public record OutputFilter(
        OutputFilterKind kind, double inductance, double commonModeShare, double capacitance, double resistance) {
    public static final Range INDUCTANCE = new Range("output filter inductance", Dimension.INDUCTANCE, 1e-6, 0.1);
    public static final Range SHARE = new Range("output filter common-mode share", Dimension.NUMBER, 0.001, 1);
    public static final Range CAPACITANCE = new Range("output filter capacitance", Dimension.CAPACITANCE, 0, 1e-3);
    public static final Range RESISTANCE = new Range("output filter resistance", Dimension.RESISTANCE, 0, 1000);

    /** Builds a filter; a choke has no capacitors, the others have. */
    public OutputFilter {
        Objects.requireNonNull(kind);
        INDUCTANCE.check(inductance);
        SHARE.check(commonModeShare);
        CAPACITANCE.check(capacitance);
        RESISTANCE.check(resistance);
        if ((kind == OutputFilterKind.CHOKE) != (capacitance == 0)) {
            throw new IllegalArgumentException(
                    kind == OutputFilterKind.CHOKE
                            ? "a choke has no output filter capacitance"
                            : "a " + kind.words() + " filter needs its output filter capacitance");
        }
    }
}
