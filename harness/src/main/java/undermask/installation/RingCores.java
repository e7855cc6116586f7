package undermask.installation;

import java.util.Objects;
import undermask.unit.Dimension;
import undermask.unit.Range;

/**
 * Ring cores on the motor lead.
 *
 * @param number of cores in a row
 * @param turns of the lead, or of each conductor, through each
 * @param place around all conductors together, where load currents cancel, or a set on each conductor
 */
public record RingCores(CorePart core, int number, int turns, CorePlace place) {
    public static final Range NUMBER = new Range("ring core count", Dimension.NUMBER, 1, 100);
    public static final Range TURNS = new Range("ring core turns", Dimension.NUMBER, 1, 50);
    private static final int CONDUCTORS = 3;

    /** Builds a set of cores. */
    public RingCores {
        Objects.requireNonNull(core);
        Objects.requireNonNull(place);
        NUMBER.check(number);
        TURNS.check(turns);
    }

    /** Peak field of a conductor's current, A/m; 0 around all conductors, whose load currents cancel. */
    public double field(double peakCurrent) {
        return place == CorePlace.ON_EACH ? turns * peakCurrent / core.length() : 0;
    }

    /** The share of the permeability that is left at a peak load current: flux no longer rises beyond saturation. */
    public double unsaturated(double peakCurrent) {
        double field = field(peakCurrent);
        return field <= core.saturationField() ? 1 : core.saturationField() / field;
    }

    /**
     * Impedance of all cores in common mode, ohm; three sets on single conductors are in parallel.
     *
     * @param share of the permeability that is left, 0 to 1
     * @param out receives real and imaginary part
     */
    public void impedance(double frequency, double share, double[] out) {
        core.impedance(frequency, share, out);
        double scale = number * (double) turns * turns / (place == CorePlace.ON_EACH ? CONDUCTORS : 1);
        out[0] *= scale;
        out[1] *= scale;
    }
}
