package undermask.installation;

import java.util.List;
import java.util.Map;
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
 * @param motorLead type of motor lead
 * @param motorLeadLength in m
 * @param frameBond inductance of a bond from the motor frame to the earthed structure, H; empty when the frame is
 *     earthed through the motor lead alone
 * @param fitting how the motor lead is fitted
 * @param options what is fitted to or taken out of the drive
 * @param ownElements what somebody adds to the circuit
 * @param deviations relative standard deviations that differ from the usual ones
 * @param motorPlace what cools the motor
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
        OptionalDouble frameBond,
        LeadFitting fitting,
        DriveOptions options,
        List<OwnElement> ownElements,
        Map<Parasitic, Double> deviations,
        MotorPlace motorPlace) {
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
        Objects.requireNonNull(fitting);
        Objects.requireNonNull(options);
        ownElements = List.copyOf(ownElements);
        deviations = Map.copyOf(deviations);
        Objects.requireNonNull(motorPlace);
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

    /** An installation of good practice: shield bonded all round, nothing added, usual deviations. */
    public Installation(
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
        this(
                name,
                supply,
                mainsLead,
                filter,
                filterEarthLead,
                link,
                heatsinkCapacitance,
                motorLead,
                motorLeadLength,
                motor,
                frameBond,
                LeadFitting.PLAIN,
                DriveOptions.PLAIN,
                List.of(),
                Map.of(),
                MotorPlace.RATED);
    }

    /** Relative standard deviation of a value, a share. */
    public double deviation(Parasitic parasitic) {
        return deviations.getOrDefault(parasitic, parasitic.deviation());
    }

    /**
     * Current through the Y capacitors into PE at mains frequency, A: that of one line alone, as when the others are
     * switched later or interrupted; capacitors of the drive included where they are connected.
     */
    public double leakageCurrent() {
        double perLine = filter.map(FilterPart::yPerLine).orElse(0.0)
                + (options.linkEarthed() ? 2 * link.toEarth().capacitance() / supply.conductors() : 0);
        double volts = supply.phases() == 1 ? supply.voltage() : supply.voltage() / Math.sqrt(3);
        return 2 * Math.PI * supply.frequencyHz() * perLine * volts;
    }

    /**
     * What the current of a bridge leg has to charge outside the drive's switches: heatsink, lead and motor, F. Behind a
     * choke lead and motor are charged by the choke's current later on.
     */
    public double legCapacitance() {
        if (options.output().isPresent()) {
            return heatsinkCapacitance;
        }
        return heatsinkCapacitance
                + fitting.motors()
                        * (motorLead.capacitance() * motorLeadLength / MOTOR_PHASES + motor.terminalCapacitance());
    }

    /**
     * Leakage inductance of a motor phase as connected, star circuit, H. The catalogue's motors are for 400 V in star; a
     * drive on single-phase mains feeds them in delta.
     */
    public double phaseInductance() {
        double each = supply.phases() == 1 ? motor.leakageInductance() / MOTOR_PHASES : motor.leakageInductance();
        return each / fitting.motors()
                + options.output().map(OutputFilter::inductance).orElse(0.0);
    }
}
