package undermask.installation;

import java.util.Objects;

/**
 * A motor of the catalogue as common mode sees it: a small capacitance at the terminals, the rest at the star point
 * behind the winding.
 *
 * @param name as installations name it
 * @param ratedPower shaft power in W
 * @param terminalCapacitance winding to frame at the terminals, per phase, in F
 * @param starCapacitance residual winding-to-frame capacitance at the star point in F
 * @param windingInductance common-mode inductance of the three windings together in H
 * @param windingResistance in parallel to it, ohm
 * @param frameResistance in series with the terminal capacitances together, ohm (lamination and frame)
 * @param leakageInductance of stator and rotor together, per phase of the star circuit, H
 * @param source where the values come from
 */
public record MotorPart(
        String name,
        double ratedPower,
        double terminalCapacitance,
        double starCapacitance,
        double windingInductance,
        double windingResistance,
        double frameResistance,
        double leakageInductance,
        String source) {
    /** Builds a part of positive, finite values. */
    public MotorPart {
        Objects.requireNonNull(name);
        Objects.requireNonNull(source);
        for (double value : new double[] {
            ratedPower,
            terminalCapacitance,
            starCapacitance,
            windingInductance,
            windingResistance,
            frameResistance,
            leakageInductance
        }) {
            if (!(value > 0) || Double.isInfinite(value)) {
                throw new IllegalArgumentException("motor " + name + " has a value of " + value);
            }
        }
    }

    /** Winding-to-frame capacitance of all phases at low frequency, F. */
    public double totalCapacitance() {
        return 3 * terminalCapacitance + starCapacitance;
    }
}
