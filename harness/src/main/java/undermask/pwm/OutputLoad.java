package undermask.pwm;

/**
 * What hangs on the bridge's output as its switching sees it.
 *
 * @param inductance of a motor phase that the carrier ripple flows in, leakage of stator and rotor together, H; infinite
 *     for a current without ripple
 * @param legCapacitance that the current of a leg has to charge at each edge, F; 0 for edges that no current slows
 */
public record OutputLoad(double inductance, double legCapacitance) {
    /** A load of sinusoidal current that slows no edge. */
    public static final OutputLoad IDEAL = new OutputLoad(Double.POSITIVE_INFINITY, 0);

    /** Builds a load. */
    public OutputLoad {
        if (!(inductance > 0) || !(legCapacitance >= 0) || Double.isInfinite(legCapacitance)) {
            throw new IllegalArgumentException(
                    "output load of " + inductance + " H per phase and " + legCapacitance + " F per leg");
        }
    }
}
