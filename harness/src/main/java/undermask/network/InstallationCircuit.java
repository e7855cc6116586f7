package undermask.network;

import static undermask.network.InstallationNodes.DRIVE_PE;
import static undermask.network.InstallationNodes.FILTER_CASE;
import static undermask.network.InstallationNodes.GROUND;
import static undermask.network.InstallationNodes.LINK_MIDDLE;
import static undermask.network.InstallationNodes.LINK_MINUS;
import static undermask.network.InstallationNodes.LINK_PLUS;
import static undermask.network.InstallationNodes.OUTPUT;

import java.util.ArrayList;
import java.util.List;
import undermask.installation.Capacitor;
import undermask.installation.FilterPart;
import undermask.installation.FilterStage;
import undermask.installation.Installation;
import undermask.installation.MainsLead;
import undermask.installation.OwnElement;
import undermask.installation.Parasitic;

/** Wires an installation from the mains network to the motor. Names the nodes as a bench diagram would. */
final class InstallationCircuit {
    static final String COMMON_MODE_SOURCE = "common mode of the bridge";
    static final String LINK_CURRENT_SOURCE = "current of the bridge from the link";

    /** Inductance of a conductor to earth, H/m: round wire, 0.7 to 1.0 µH/m (from memory). */
    static final double EARTH_LEAD_INDUCTANCE = 0.8e-6;
    /** Resistance of a line to a rail through a conducting diode and its leads, ohm (common practice). */
    private static final double RECTIFIER_RESISTANCE = 50e-3;
    /** Capacitance across a choke of the power circuit, F (common practice, 50 to 200 pF). */
    static final double POWER_CHOKE_CAPACITANCE = 100e-12;

    private final Installation installation;
    private final Variation variation;
    private final Circuit.Builder circuit = Circuit.around(GROUND);
    private final List<String> lines;
    private final double peakCurrent;

    private InstallationCircuit(Installation installation, Variation variation, double peakCurrent) {
        this.peakCurrent = peakCurrent;
        this.installation = installation;
        this.variation = variation;
        this.lines = lines(installation);
    }

    /** The mains conductors by name: {@code L1, L2, L3} or {@code L, N}. */
    static List<String> lines(Installation installation) {
        return installation.supply().phases() == 1 ? List.of("L", "N") : List.of("L1", "L2", "L3");
    }

    /**
     * Wires it.
     *
     * @param peakCurrent of a motor conductor, A
     * @throws IllegalArgumentException when an element of the installation's own names a node that nothing else does and
     *     only once: it would hang in the air
     */
    static Circuit of(Installation installation, MainsNetwork mains, Variation variation, double peakCurrent) {
        return new InstallationCircuit(installation, variation, peakCurrent).wire(mains);
    }

    private Circuit wire(MainsNetwork mains) {
        for (String line : lines) {
            mains.addTo(circuit, line, GROUND);
        }
        addMainsLead();
        installation.filter().ifPresent(this::addFilter);
        addRectifier();
        addLink();
        new MotorSideCircuit(circuit, installation, variation, peakCurrent).add();
        addOwnElements();
        return circuit.build();
    }

    private double varied(Parasitic parasitic, double value) {
        return variation.factor(parasitic) * value;
    }

    private static String leadEnd(String line) {
        return line + " lead end";
    }

    private static String driveInput(String line) {
        return line + " drive input";
    }

    private void addMainsLead() {
        MainsLead lead = installation.mainsLead();
        double length = varied(Parasitic.MAINS_LEAD, lead.length());
        for (String line : lines) {
            String end = installation.filter().isPresent() ? leadEnd(line) : driveInput(line);
            circuit.inductor(MainsNetwork.terminal(line), end, lead.lineInductance() * length);
        }
        circuit.inductor(GROUND, DRIVE_PE, lead.earthInductance() * length);
    }

    private void addFilter(FilterPart filter) {
        addBetweenLines(InstallationCircuit::leadEnd, filter.xMains());
        if (Double.isFinite(filter.dischargeResistance())) {
            for (int i = 1; i < lines.size(); i++) {
                circuit.resistor(leadEnd(lines.get(i - 1)), leadEnd(lines.get(i)), filter.dischargeResistance());
            }
        }
        boolean earthed = false;
        int last = filter.stages().size();
        for (int stage = 1; stage <= last; stage++) {
            int before = stage - 1;
            int after = stage;
            FilterStage part = filter.stages().get(before);
            addChoke(part, line -> between(line, before, last), line -> between(line, after, last), stage);
            addBetweenLines(line -> between(line, after, last), part.x());
            if (part.y().fitted()) {
                lines.forEach(line ->
                        addFilterCapacitor(between(line, after, last), FILTER_CASE, part.y(), Parasitic.Y_CAPACITOR));
                earthed = true;
            }
        }
        if (earthed) {
            circuit.inductor(
                    FILTER_CASE,
                    DRIVE_PE,
                    varied(Parasitic.FILTER_EARTH_LEAD, EARTH_LEAD_INDUCTANCE * installation.filterEarthLead()));
        }
    }

    /** The node of a line before the first stage, between stages, or behind the last one. */
    private static String between(String line, int stage, int last) {
        if (stage == 0) {
            return leadEnd(line);
        }
        return stage == last ? driveInput(line) : line + " behind filter stage " + stage;
    }

    private interface Node {
        String of(String line);
    }

    /**
     * The current-compensated choke. Without a material, a winding without leakage carries the core's loss resistance, so
     * that the loss lies across the flux that all share.
     */
    private void addChoke(FilterStage stage, Node before, Node after, int number) {
        double leakage = varied(Parasitic.FILTER_LEAKAGE, stage.leakage());
        double shared = varied(Parasitic.FILTER_CHOKE, stage.choke()) - leakage / lines.size();
        if (!(shared > 0)) {
            shared = stage.choke() * 1e-3;
        }
        List<String> starts = new ArrayList<>();
        List<String> ends = new ArrayList<>();
        for (String line : lines) {
            starts.add(before.of(line));
            ends.add(after.of(line));
            circuit.capacitor(
                    before.of(line), after.of(line), varied(Parasitic.FILTER_WINDING, stage.windingCapacitance()));
        }
        if (stage.core().isPresent()) {
            circuit.commonCore(starts, ends, leakage, shared, stage.core().get());
            return;
        }
        String core = "choke core " + number;
        int windings = lines.size() + 1;
        double[][] inductance = new double[windings][windings];
        for (int i = 0; i < windings; i++) {
            for (int j = 0; j < windings; j++) {
                inductance[i][j] = shared + (i == j && i < lines.size() ? leakage : 0);
            }
        }
        starts.add(core);
        ends.add(GROUND);
        circuit.coupledCoils(starts, ends, inductance);
        circuit.resistor(core, GROUND, varied(Parasitic.FILTER_LOSS, stage.lossResistance()));
    }

    /**
     * The rectifier with one line on the lower rail and the others on the upper one: as in a single-phase bridge, and in
     * a three-phase one while two diodes hand over. Common mode then finds all lines, and the differential mode has a
     * line that carries all of it.
     */
    private void addRectifier() {
        double reactor = installation.options().lineReactor();
        String upper = installation.options().linkChoke() > 0 ? "rectifier plus" : LINK_PLUS;
        for (int i = 0; i < lines.size(); i++) {
            String from = driveInput(lines.get(i));
            if (reactor > 0) {
                String behind = lines.get(i) + " rectifier input";
                circuit.inductor(from, behind, varied(Parasitic.LINE_REACTOR, reactor));
                circuit.capacitor(from, behind, POWER_CHOKE_CAPACITANCE);
                from = behind;
            }
            circuit.resistor(from, i == 1 ? LINK_MINUS : upper, RECTIFIER_RESISTANCE);
        }
        if (installation.options().linkChoke() > 0) {
            circuit.inductor(
                    upper,
                    LINK_PLUS,
                    varied(Parasitic.LINK_CHOKE, installation.options().linkChoke()));
            circuit.capacitor(upper, LINK_PLUS, POWER_CHOKE_CAPACITANCE);
        }
    }

    /** Link, heatsink and the two sources. */
    private void addLink() {
        Capacitor link = installation.link().capacitor();
        Capacitor toEarth = installation.link().toEarth();
        for (String rail : List.of(LINK_PLUS, LINK_MINUS)) {
            circuit.seriesResonant(
                    rail,
                    LINK_MIDDLE,
                    varied(Parasitic.LINK_ESR, link.esr() / 2),
                    varied(Parasitic.LINK_ESL, link.esl() / 2),
                    2 * link.capacitance());
            if (toEarth.fitted() && installation.options().linkEarthed()) {
                circuit.seriesResonant(
                        rail,
                        DRIVE_PE,
                        toEarth.esr(),
                        toEarth.esl(),
                        varied(Parasitic.LINK_TO_EARTH, toEarth.capacitance()));
            }
        }
        circuit.capacitor(OUTPUT, DRIVE_PE, varied(Parasitic.HEATSINK, 3 * installation.heatsinkCapacitance()));
        circuit.voltageSource(COMMON_MODE_SOURCE, OUTPUT, LINK_MIDDLE);
        circuit.currentSource(LINK_CURRENT_SOURCE, LINK_MINUS, LINK_PLUS);
    }

    private void addBetweenLines(Node node, Capacitor part) {
        if (!part.fitted()) {
            return;
        }
        for (int i = 0; i < lines.size(); i++) {
            for (int j = i + 1; j < lines.size(); j++) {
                addFilterCapacitor(node.of(lines.get(i)), node.of(lines.get(j)), part, Parasitic.X_CAPACITOR);
            }
        }
    }

    private void addFilterCapacitor(String from, String to, Capacitor part, Parasitic kind) {
        circuit.seriesResonant(
                from,
                to,
                varied(Parasitic.CAPACITOR_ESR, part.esr()),
                varied(Parasitic.CAPACITOR_ESL, part.esl()),
                varied(kind, part.capacitance()));
    }

    private void addOwnElements() {
        for (OwnElement own : installation.ownElements()) {
            for (String node : List.of(own.from(), own.to())) {
                long named = installation.ownElements().stream()
                        .filter(other -> other.from().equals(node) || other.to().equals(node))
                        .count();
                if (named < 2 && !circuit.knows(node)) {
                    throw new IllegalArgumentException("own element from " + own.from() + " to " + own.to()
                            + ": nothing else is connected to \"" + node + "\"; nodes of this installation are "
                            + String.join(", ", circuit.names()));
                }
            }
        }
        for (OwnElement own : installation.ownElements()) {
            switch (own.kind()) {
                case RESISTOR -> circuit.resistor(own.from(), own.to(), own.value());
                case INDUCTOR -> circuit.inductor(own.from(), own.to(), own.value());
                case CAPACITOR -> circuit.capacitor(own.from(), own.to(), own.value());
            }
        }
    }
}
