package undermask.network;

import static undermask.network.InstallationCircuit.EARTH_LEAD_INDUCTANCE;
import static undermask.network.InstallationNodes.DRIVE_PE;
import static undermask.network.InstallationNodes.GROUND;
import static undermask.network.InstallationNodes.LEAD_START;
import static undermask.network.InstallationNodes.MOTOR_FRAME;
import static undermask.network.InstallationNodes.MOTOR_TERMINALS;
import static undermask.network.InstallationNodes.OUTPUT;

import undermask.installation.CablePart;
import undermask.installation.Installation;
import undermask.installation.LeadFitting;
import undermask.installation.OutputFilter;
import undermask.installation.Parasitic;
import undermask.installation.RingCores;
import undermask.installation.ShieldTermination;

/** Wires what lies behind the bridge: output filter, ring cores, motor leads and motors. */
final class MotorSideCircuit {
    /** Inductance of a whole motor lead as a conductor above the earthed structure, H/m (common practice, 0.6 to 1.2). */
    private static final double LEAD_OUTER_INDUCTANCE = 0.9e-6;
    /** Resistance of shield and PE core in parallel to that current, ohm/m (common practice). */
    private static final double LEAD_OUTER_RESISTANCE = 10e-3;
    /** A shield that is not held to earth at an end has capacitance to its surroundings, F/m (50 to 150 pF/m). */
    private static final double OPEN_SHIELD = 60e-12;

    private final Circuit.Builder circuit;
    private final Installation installation;
    private final Variation variation;
    private final double peakCurrent;

    /**
     * Prepares.
     *
     * @param peakCurrent of a conductor, A; it saturates cores that sit on single conductors
     */
    MotorSideCircuit(Circuit.Builder circuit, Installation installation, Variation variation, double peakCurrent) {
        this.peakCurrent = peakCurrent;
        this.circuit = circuit;
        this.installation = installation;
        this.variation = variation;
    }

    void add() {
        String from = OUTPUT;
        if (installation.options().output().isPresent()) {
            from = addOutputFilter(from, installation.options().output().get());
        }
        if (installation.fitting().cores().isPresent()) {
            RingCores cores = installation.fitting().cores().get();
            double share = variation.factor(Parasitic.RING_CORE) * cores.unsaturated(peakCurrent);
            double[] value = new double[2];
            circuit.impedance(from, LEAD_START, frequency -> {
                cores.impedance(frequency, share, value);
                return new Phasor(value[0], value[1]);
            });
            from = LEAD_START;
        }
        for (int motor = 1; motor <= installation.fitting().motors(); motor++) {
            addMotor(from, motor == 1 ? "" : " " + motor);
        }
    }

    /** In common mode only a share of the choke acts, and capacitors whose star floats do nothing. */
    private String addOutputFilter(String from, OutputFilter filter) {
        String behind = "output filter end";
        double inductance =
                variation.factor(Parasitic.OUTPUT_FILTER) * filter.inductance() * filter.commonModeShare() / 3;
        circuit.inductor(from, behind, inductance);
        circuit.capacitor(from, behind, 3 * InstallationCircuit.POWER_CHOKE_CAPACITANCE);
        return behind;
    }

    private void addMotor(String from, String suffix) {
        LeadFitting fitting = installation.fitting();
        CablePart lead = installation.motorLead();
        String terminals = MOTOR_TERMINALS + suffix;
        String frame = MOTOR_FRAME + suffix;
        double length = installation.motorLeadLength();
        String near = returnEnd(DRIVE_PE, fitting.shield(), "shield at drive" + suffix, true);
        String far = returnEnd(frame, fitting.shield(), "shield at motor" + suffix, false);
        circuit.line(
                from,
                near,
                terminals,
                far,
                new LossyLine(
                        length,
                        variation.factor(Parasitic.LEAD_INDUCTANCE) * lead.inductance(),
                        variation.factor(Parasitic.LEAD_CAPACITANCE) * lead.capacitance(),
                        variation.factor(Parasitic.LEAD_LOSS) * lead.resistance(),
                        lead.resistanceHz(),
                        lead.lossFactor()));
        circuit.coil(
                DRIVE_PE,
                frame,
                LEAD_OUTER_RESISTANCE * length,
                variation.factor(Parasitic.LEAD_OUTSIDE) * LEAD_OUTER_INDUCTANCE * length);
        CommonModeMotor.addTo(circuit, installation.motor(), terminals, frame, "motor star point" + suffix, variation);
        installation
                .frameBond()
                .ifPresent(bond -> circuit.inductor(frame, GROUND, variation.factor(Parasitic.FRAME_BOND) * bond));
    }

    /**
     * Where the current that returns along the lead flows at one end: into the shield's connection, or for an unshielded
     * lead into the plane that it lies on.
     */
    private String returnEnd(String earth, ShieldTermination shield, String open, boolean atDrive) {
        if (!installation.motorLead().shielded()) {
            return GROUND;
        }
        return switch (shield) {
            case ALL_ROUND -> earth;
            case PIGTAIL -> {
                circuit.inductor(
                        earth,
                        open,
                        variation.factor(Parasitic.SHIELD_TAIL)
                                * EARTH_LEAD_INDUCTANCE
                                * installation.fitting().pigtailLength());
                yield hanging(open);
            }
            case ONE_END -> atDrive ? earth : hanging(open);
            case NONE -> hanging(open);
        };
    }

    /** Half of the shield's capacitance to its surroundings lies at each end. */
    private String hanging(String open) {
        circuit.capacitor(open, GROUND, OPEN_SHIELD * installation.motorLeadLength() / 2);
        return open;
    }
}
