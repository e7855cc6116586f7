package undermask.cost;

import java.util.Optional;
import undermask.installation.Installation;
import undermask.installation.OutputFilter;
import undermask.installation.OutputFilterKind;
import undermask.pwm.Bridge;

/**
 * The voltage between two motor terminals at the end of a lead: an edge that is over before its echo is back doubles.
 *
 * <p>Source: Persson, IEEE Trans. Ind. Appl. 28 (1992); Kerkman, Leggate and Skibinski, IEEE Trans. Ind. Appl. 33 (1997);
 * reflection by motor size from the same and from trade guides; from memory.
 *
 * @param peak line to line in V
 * @param riseTime of the edge that arrives, s
 * @param reflection coefficient of the motor on its lead
 * @param criticalLength of lead beyond which the echo adds in full, m
 */
public record MotorTerminals(double peak, double riseTime, double reflection, double criticalLength) {
    /** Propagation on motor leads, m/s. */
    private static final double VELOCITY = 150e6;
    /** Rated power in W and reflection coefficient there. */
    private static final double[][] REFLECTION = {{3.7e3, 0.945}, {90e3, 0.82}, {355e3, 0.60}};
    /** Rise of an LC low-pass from tenth to nine tenths over the root of LC, stretched to the whole transition. */
    private static final double RISE_OF_LOW_PASS = 2.2;

    /** Works it out for the fastest edge of a bridge; one that never switches gives its link voltage. */
    public static MotorTerminals of(Installation installation, Bridge bridge) {
        double fastest = bridge.fastestTransition();
        return Double.isFinite(fastest)
                ? of(installation, bridge.link().mean(), fastest)
                : new MotorTerminals(bridge.link().mean(), 0, 0, 0);
    }

    /**
     * Works it out.
     *
     * @param linkVoltage in V
     * @param transition of the drive's fastest edge, s
     */
    public static MotorTerminals of(Installation installation, double linkVoltage, double transition) {
        double reflection = reflection(installation.motor().ratedPower());
        Optional<OutputFilter> filter = installation.options().output();
        double leadCapacitance = installation.motorLead().capacitance() / 3 * installation.motorLeadLength();
        double rise = filter.map(part -> Math.hypot(
                        transition,
                        RISE_OF_LOW_PASS * Math.sqrt(part.inductance() * (part.capacitance() + leadCapacitance))))
                .orElse(transition);
        double critical = VELOCITY * rise / 2;
        double echo = Math.min(1, installation.motorLeadLength() / critical);
        if (filter.isPresent() && filter.get().kind() == OutputFilterKind.SINE) {
            // the pulses stay in the filter; what leaves it is the fundamental
            return new MotorTerminals(linkVoltage, rise, reflection, critical);
        }
        return new MotorTerminals(linkVoltage * (1 + reflection * echo), rise, reflection, critical);
    }

    /** Reflection coefficient of a motor on a usual lead, straight over the logarithm of its power. */
    static double reflection(double ratedPower) {
        int last = REFLECTION.length - 1;
        if (ratedPower <= REFLECTION[0][0]) {
            return REFLECTION[0][1];
        }
        if (ratedPower >= REFLECTION[last][0]) {
            return REFLECTION[last][1];
        }
        int upper = 1;
        while (REFLECTION[upper][0] < ratedPower) {
            upper++;
        }
        double place = Math.log(ratedPower / REFLECTION[upper - 1][0])
                / Math.log(REFLECTION[upper][0] / REFLECTION[upper - 1][0]);
        return REFLECTION[upper - 1][1] + place * (REFLECTION[upper][1] - REFLECTION[upper - 1][1]);
    }
}
