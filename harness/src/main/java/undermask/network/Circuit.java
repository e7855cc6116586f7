package undermask.network;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import undermask.installation.Material;

/**
 * A linear circuit: named nodes, elements between them, ideal sources. It never changes; {@link #solver()} computes it,
 * and several solvers may run at once.
 */
public final class Circuit {
    private final String reference;
    private final List<String> nodes;
    private final Map<String, Integer> numbers;
    private final List<Element> elements;
    private final Map<String, Source> sources;

    private Circuit(Builder builder) {
        reference = builder.reference;
        nodes = List.copyOf(builder.numbers.keySet());
        numbers = new HashMap<>(builder.numbers);
        elements = List.copyOf(builder.elements);
        sources = new LinkedHashMap<>(builder.sources);
    }

    /**
     * Begins a circuit.
     *
     * @param reference name of the node that counts as zero volts
     */
    public static Builder around(String reference) {
        return new Builder(reference);
    }

    /** The name of the node that counts as zero volts. */
    public String reference() {
        return reference;
    }

    /** The names of all other nodes in the order in which they were first used. */
    public List<String> nodes() {
        return nodes;
    }

    /** The names of the sources in the order in which they were added. */
    public List<String> sources() {
        return List.copyOf(sources.keySet());
    }

    /** A workspace that computes this circuit; one per thread. */
    public CircuitSolver solver() {
        return new CircuitSolver(this);
    }

    List<Element> elements() {
        return elements;
    }

    Iterable<Source> allSources() {
        return sources.values();
    }

    /** How many equations the circuit has. */
    int unknowns() {
        return nodes.size()
                + (int) sources.values().stream().filter(Source::holdsVoltage).count();
    }

    /** The number of a node, −1 for the reference. */
    int node(String name) {
        if (name.equals(reference)) {
            return -1;
        }
        Integer number = numbers.get(name);
        if (number == null) {
            throw new IllegalArgumentException("the circuit has no node " + name);
        }
        return number;
    }

    Source source(String name) {
        Source source = sources.get(name);
        if (source == null) {
            throw new IllegalArgumentException("the circuit has no source " + name);
        }
        return source;
    }

    /** The name of a voltage source by its order. */
    String voltageSource(int order) {
        return sources.entrySet().stream()
                .filter(entry -> entry.getValue().order() == order)
                .map(Map.Entry::getKey)
                .findFirst()
                .orElseThrow();
    }

    /**
     * An ideal source.
     *
     * @param order among the voltage sources, −1 for a current source
     */
    record Source(int plus, int minus, int order) {
        boolean holdsVoltage() {
            return order >= 0;
        }
    }

    /** Collects the elements of a circuit. A node comes into being when it is first named. */
    public static final class Builder {
        private final String reference;
        private final Map<String, Integer> numbers = new LinkedHashMap<>();
        private final List<Element> elements = new ArrayList<>();
        private final Map<String, Source> sources = new LinkedHashMap<>();
        private int voltageSources;

        private Builder(String reference) {
            this.reference = reference;
        }

        /** Adds a resistance above 0 in ohm. */
        public Builder resistor(String from, String to, double resistance) {
            return branch(from, to, positive(resistance, "resistance"), 0, Double.POSITIVE_INFINITY);
        }

        /** Adds an inductance above 0 in H. */
        public Builder inductor(String from, String to, double inductance) {
            return branch(from, to, 0, positive(inductance, "inductance"), Double.POSITIVE_INFINITY);
        }

        /** Adds a capacitance above 0 in F. */
        public Builder capacitor(String from, String to, double capacitance) {
            return branch(from, to, 0, 0, positive(capacitance, "capacitance"));
        }

        /** Adds resistance and inductance in series; one of them may be 0. */
        public Builder coil(String from, String to, double resistance, double inductance) {
            positive(resistance + inductance, "resistance and inductance");
            return branch(
                    from,
                    to,
                    notNegative(resistance, "resistance"),
                    notNegative(inductance, "inductance"),
                    Double.POSITIVE_INFINITY);
        }

        /** Adds resistance, inductance and capacitance in series; the first two may be 0. */
        public Builder seriesResonant(
                String from, String to, double resistance, double inductance, double capacitance) {
            return branch(
                    from,
                    to,
                    notNegative(resistance, "resistance"),
                    notNegative(inductance, "inductance"),
                    positive(capacitance, "capacitance"));
        }

        /** Adds an impedance that depends on frequency. */
        public Builder impedance(String from, String to, Impedance impedance) {
            elements.add(new ImpedanceBranch(number(from), number(to), impedance));
            return this;
        }

        /**
         * Adds windings on a common core.
         *
         * @param starts node at the dotted end of each winding
         * @param ends node at its other end, likewise
         * @param inductance symmetric, positive definite matrix in H
         */
        public Builder coupledCoils(List<String> starts, List<String> ends, double[][] inductance) {
            if (starts.size() != ends.size()) {
                throw new IllegalArgumentException(starts.size() + " windings begin and " + ends.size() + " end");
            }
            elements.add(new CoupledCoils(
                    starts.stream().mapToInt(this::number).toArray(),
                    ends.stream().mapToInt(this::number).toArray(),
                    inductance));
            return this;
        }

        /**
         * Adds equal windings on a core of a material.
         *
         * @param leakage per winding in H
         * @param shared inductance of the flux that all share, at low frequency, in H
         */
        Builder commonCore(List<String> starts, List<String> ends, double leakage, double shared, Material material) {
            elements.add(new CommonCore(
                    starts.stream().mapToInt(this::number).toArray(),
                    ends.stream().mapToInt(this::number).toArray(),
                    positive(leakage, "leakage inductance"),
                    positive(shared, "shared inductance"),
                    material));
            return this;
        }

        /** The nodes named so far, in their order, the reference first. */
        List<String> names() {
            List<String> names = new ArrayList<>(List.of(reference));
            names.addAll(numbers.keySet());
            return names;
        }

        /** Whether a node has been named. */
        boolean knows(String node) {
            return node.equals(reference) || numbers.containsKey(node);
        }

        /** Adds a line; current that enters a core at an end leaves the return conductor at the same end. */
        public Builder line(String nearCore, String nearReturn, String farCore, String farReturn, LossyLine line) {
            elements.add(
                    new LineSection(number(nearCore), number(nearReturn), number(farCore), number(farReturn), line));
            return this;
        }

        /** Adds an ideal voltage source, a short circuit while another source acts. */
        public Builder voltageSource(String name, String plus, String minus) {
            return source(name, new Source(number(plus), number(minus), voltageSources++));
        }

        /** Adds an ideal source of current that flows into {@code plus}; open while another source acts. */
        public Builder currentSource(String name, String plus, String minus) {
            return source(name, new Source(number(plus), number(minus), -1));
        }

        /** The circuit as collected so far. */
        public Circuit build() {
            return new Circuit(this);
        }

        private Builder branch(String from, String to, double resistance, double inductance, double capacitance) {
            elements.add(new SeriesBranch(number(from), number(to), resistance, inductance, capacitance));
            return this;
        }

        private Builder source(String name, Source source) {
            if (sources.putIfAbsent(name, source) != null) {
                throw new IllegalArgumentException("the circuit has two sources named " + name);
            }
            return this;
        }

        private int number(String node) {
            if (node.equals(reference)) {
                return -1;
            }
            return numbers.computeIfAbsent(node, fresh -> numbers.size());
        }

        private static double positive(double value, String quantity) {
            if (!(value > 0) || Double.isInfinite(value)) {
                throw new IllegalArgumentException(quantity + " of an element is " + value + "; it must be above 0");
            }
            return value;
        }

        private static double notNegative(double value, String quantity) {
            if (!(value >= 0) || Double.isInfinite(value)) {
                throw new IllegalArgumentException(
                        quantity + " of an element is " + value + "; it must not be below 0");
            }
            return value;
        }
    }
}
