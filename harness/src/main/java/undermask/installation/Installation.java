package undermask.installation;

import java.util.Objects;
import java.util.Optional;
import java.util.OptionalDouble;
import undermask.unit.Dimension;
import undermask.unit.Range;

/**
 * What is bolted down around a drive.
 *
 * @param name as profiles name it
 * @param filter mains filter; empty when none is fitted
 * @param filterEarthLead length of the conductor from the filter's case to the drive's PE, m
 * @param heatsinkCapacitance from each bridge leg to the heatsink, F
 * @param motorLead type of motor lead; its shield is bonded all round at both ends
 * @param motorLeadLength in m
 * @param frameBond inductance of a bond from the motor frame to the earthed structure, H; empty when the frame is
 *     earthed through the motor lead alone
 */
public record Installation(
        String name,
        Supply supply,
        MainsLead mainsLead,
        Optional<FilterPart> filter,
        double filterEarthLead,
        Link link,
        double heatsinkCapacitance,
        CablePart motorLead,
        double motorLeadLength,
        MotorPart motor,
        OptionalDouble frameBond) {
    public static final Range FILTER_EARTH_LEAD = new Range("filter earth lead length", Dimension.LENGTH, 0.005, 5);
    public static final Range HEATSINK = new Range("heatsink capacitance", Dimension.CAPACITANCE, 1e-12, 10e-9);
    public static final Range MOTOR_LEAD_LENGTH = new Range("motor lead length", Dimension.LENGTH, 0.1, 300);
    public static final Range FRAME_BOND = new Range("motor frame bond inductance", Dimension.INDUCTANCE, 1e-9, 100e-6);

    private static final int MOTOR_PHASES = 3;

    /** Builds an installation; ranges hold and the filter fits the supply. */
    public Installation {
        Objects.requireNonNull(name);
        Objects.requireNonNull(supply);
        Objects.requireNonNull(mainsLead);
        Objects.requireNonNull(link);
        Objects.requireNonNull(motorLead);
        Objects.requireNonNull(motor);
        FILTER_EARTH_LEAD.check(filterEarthLead);
        HEATSINK.check(heatsinkCapacitance);
        MOTOR_LEAD_LENGTH.check(motorLeadLength);
        frameBond.ifPresent(FRAME_BOND::check);
        filter.ifPresent(part -> {
            if (part.phases() != supply.phases()) {
                throw new IllegalArgumentException("mains filter " + part.name() + " is for " + part.phases()
                        + "-phase mains, the supply has " + supply.phases());
            }
        });
    }

    /** What the current of a bridge leg has to charge outside the drive's switches: heatsink, lead and motor, F. */
    public double legCapacitance() {
        return heatsinkCapacitance
                + motorLead.capacitance() * motorLeadLength / MOTOR_PHASES
                + motor.terminalCapacitance();
    }

    /**
     * Leakage inductance of a motor phase as connected, star circuit, H. The catalogue's motors are for 400 V in star; a
     * drive on single-phase mains feeds them in delta.
     */
    public double phaseInductance() {
        return supply.phases() == 1 ? motor.leakageInductance() / MOTOR_PHASES : motor.leakageInductance();
    }
}
