package undermask.network;

import java.util.ArrayList;
import java.util.List;
import undermask.installation.CablePart;
import undermask.installation.Capacitor;
import undermask.installation.FilterPart;
import undermask.installation.Installation;
import undermask.installation.MainsLead;

/** Wires an installation from the mains network to the motor. Names the nodes as a bench diagram would. */
final class InstallationCircuit {
    static final String COMMON_MODE_SOURCE = "common mode of the bridge";

    private static final String GROUND = "ground plane";
    private static final String DRIVE_PE = "drive PE";
    private static final String LINK_PLUS = "link plus";
    private static final String LINK_MINUS = "link minus";
    private static final String LINK_MIDDLE = "link mid-point";
    private static final String OUTPUT = "drive output";
    private static final String MOTOR_TERMINALS = "motor terminals";
    private static final String MOTOR_FRAME = "motor frame";
    private static final String FILTER_CASE = "filter case";

    /** Inductance of a conductor to earth, H/m: round wire, 0.7 to 1.0 µH/m (from memory). */
    private static final double EARTH_LEAD_INDUCTANCE = 0.8e-6;
    /** Inductance of a whole motor lead as a conductor above the earthed structure, H/m (common practice, 0.6 to 1.2). */
    private static final double LEAD_OUTER_INDUCTANCE = 0.9e-6;
    /** Resistance of shield and PE core in parallel to that current, ohm/m (common practice). */
    private static final double LEAD_OUTER_RESISTANCE = 10e-3;
    /** Resistance of a line to each rail through conducting diodes and their leads, ohm (common practice). */
    private static final double RECTIFIER_RESISTANCE = 50e-3;

    private InstallationCircuit() {}

    /** The mains conductors by name: {@code L1, L2, L3} or {@code L, N}. */
    static List<String> lines(Installation installation) {
        return installation.supply().phases() == 1 ? List.of("L", "N") : List.of("L1", "L2", "L3");
    }

    static Circuit of(Installation installation, MainsNetwork mains) {
        Circuit.Builder circuit = Circuit.around(GROUND);
        List<String> lines = lines(installation);
        for (String line : lines) {
            mains.addTo(circuit, line, GROUND);
        }
        addMainsLead(circuit, lines, installation);
        installation.filter().ifPresent(filter -> addFilter(circuit, lines, filter, installation.filterEarthLead()));
        addDrive(circuit, lines, installation);
        addMotorLead(circuit, installation.motorLead(), installation.motorLeadLength());
        CommonModeMotor.addTo(circuit, installation.motor(), MOTOR_TERMINALS, MOTOR_FRAME);
        installation.frameBond().ifPresent(bond -> circuit.inductor(MOTOR_FRAME, GROUND, bond));
        return circuit.build();
    }

    private static String leadEnd(String line) {
        return line + " lead end";
    }

    private static String driveInput(String line) {
        return line + " drive input";
    }

    private static void addMainsLead(Circuit.Builder circuit, List<String> lines, Installation installation) {
        MainsLead lead = installation.mainsLead();
        for (String line : lines) {
            String end = installation.filter().isPresent() ? leadEnd(line) : driveInput(line);
            circuit.inductor(MainsNetwork.terminal(line), end, lead.lineInductance() * lead.length());
        }
        circuit.inductor(GROUND, DRIVE_PE, lead.earthInductance() * lead.length());
    }

    private static void addFilter(Circuit.Builder circuit, List<String> lines, FilterPart filter, double earthLead) {
        addBetweenLines(
                circuit, lines.stream().map(InstallationCircuit::leadEnd).toList(), filter.xMains());
        addChoke(circuit, lines, filter);
        addBetweenLines(
                circuit, lines.stream().map(InstallationCircuit::driveInput).toList(), filter.xDrive());
        if (filter.y().fitted()) {
            for (String line : lines) {
                addCapacitor(circuit, driveInput(line), FILTER_CASE, filter.y());
            }
            circuit.inductor(FILTER_CASE, DRIVE_PE, EARTH_LEAD_INDUCTANCE * earthLead);
        }
    }

    /**
     * The current-compensated choke: one winding per line and a winding without leakage that carries the core's loss
     * resistance, so that the loss lies across the flux that all share.
     */
    private static void addChoke(Circuit.Builder circuit, List<String> lines, FilterPart filter) {
        String core = "choke core";
        int windings = lines.size() + 1;
        double shared = filter.chokeInductance() - filter.leakageInductance() / lines.size();
        double[][] inductance = new double[windings][windings];
        for (int i = 0; i < windings; i++) {
            for (int j = 0; j < windings; j++) {
                inductance[i][j] = shared + (i == j && i < lines.size() ? filter.leakageInductance() : 0);
            }
        }
        List<String> starts = new ArrayList<>();
        List<String> ends = new ArrayList<>();
        for (String line : lines) {
            starts.add(leadEnd(line));
            ends.add(driveInput(line));
            circuit.capacitor(leadEnd(line), driveInput(line), filter.windingCapacitance());
        }
        starts.add(core);
        ends.add(GROUND);
        circuit.coupledCoils(starts, ends, inductance);
        circuit.resistor(core, GROUND, filter.lossResistance());
    }

    /** Rectifier, link, heatsink and the source. For high frequency all diodes count as conducting, the worst case. */
    private static void addDrive(Circuit.Builder circuit, List<String> lines, Installation installation) {
        Capacitor link = installation.link().capacitor();
        Capacitor toEarth = installation.link().toEarth();
        for (String rail : List.of(LINK_PLUS, LINK_MINUS)) {
            for (String line : lines) {
                circuit.resistor(driveInput(line), rail, RECTIFIER_RESISTANCE);
            }
            circuit.seriesResonant(rail, LINK_MIDDLE, link.esr() / 2, link.esl() / 2, 2 * link.capacitance());
            if (toEarth.fitted()) {
                addCapacitor(circuit, rail, DRIVE_PE, toEarth);
            }
        }
        circuit.capacitor(OUTPUT, DRIVE_PE, 3 * installation.heatsinkCapacitance());
        circuit.voltageSource(COMMON_MODE_SOURCE, OUTPUT, LINK_MIDDLE);
    }

    private static void addMotorLead(Circuit.Builder circuit, CablePart lead, double length) {
        circuit.line(
                OUTPUT,
                DRIVE_PE,
                MOTOR_TERMINALS,
                MOTOR_FRAME,
                new LossyLine(
                        length,
                        lead.inductance(),
                        lead.capacitance(),
                        lead.resistance(),
                        lead.resistanceHz(),
                        lead.lossFactor()));
        circuit.coil(DRIVE_PE, MOTOR_FRAME, LEAD_OUTER_RESISTANCE * length, LEAD_OUTER_INDUCTANCE * length);
    }

    private static void addBetweenLines(Circuit.Builder circuit, List<String> nodes, Capacitor part) {
        if (!part.fitted()) {
            return;
        }
        for (int i = 0; i < nodes.size(); i++) {
            for (int j = i + 1; j < nodes.size(); j++) {
                addCapacitor(circuit, nodes.get(i), nodes.get(j), part);
            }
        }
    }

    private static void addCapacitor(Circuit.Builder circuit, String from, String to, Capacitor part) {
        circuit.seriesResonant(from, to, part.esr(), part.esl(), part.capacitance());
    }
}
