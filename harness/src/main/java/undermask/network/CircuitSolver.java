package undermask.network;

import java.util.Arrays;
import java.util.List;

/**
 * Computes a circuit at one frequency after another: {@link #tune} sets up and factors the equations, {@link #excite}
 * solves them for one source, {@link #voltage} reads the result. Its arrays are used again, so it belongs to one
 * thread.
 */
public final class CircuitSolver {
    private final Circuit circuit;
    private final Element[] elements;
    private final NodalEquations equations;
    private final double[] re;
    private final double[] im;
    private boolean tuned;

    CircuitSolver(Circuit circuit) {
        this.circuit = circuit;
        elements = circuit.elements().toArray(new Element[0]);
        equations = new NodalEquations(circuit.unknowns());
        re = new double[circuit.unknowns()];
        im = new double[circuit.unknowns()];
    }

    /**
     * Sets up the equations at a frequency.
     *
     * @param frequency in Hz, above 0
     * @throws IllegalStateException when the equations leave the voltage of a node undetermined; the message names it
     */
    public CircuitSolver tune(double frequency) {
        if (!(frequency > 0) || Double.isInfinite(frequency)) {
            throw new IllegalArgumentException("frequency is " + frequency + " Hz; it must be above 0");
        }
        tuned = false;
        equations.clear();
        for (Element element : elements) {
            element.stamp(equations, 2 * Math.PI * frequency);
        }
        for (Circuit.Source source : circuit.allSources()) {
            if (source.holdsVoltage()) {
                equations.source(source.plus(), source.minus(), row(source));
            }
        }
        int undetermined = equations.factor();
        if (undetermined >= 0) {
            throw new IllegalStateException(
                    "the circuit is singular at " + frequency + " Hz: " + describe(undetermined) + " is undetermined");
        }
        tuned = true;
        return this;
    }

    /** Lets one source act with 1 V or 1 A; all others rest. */
    public CircuitSolver excite(String source) {
        Circuit.Source acting = circuit.source(source);
        rest();
        if (acting.holdsVoltage()) {
            re[row(acting)] = 1;
        } else {
            inject(acting.plus(), acting.minus());
        }
        equations.solve(re, im);
        return this;
    }

    /** The voltage of a node against the reference, or of the reference itself, under the source that acts. */
    public Phasor voltage(String node) {
        int number = circuit.node(node);
        return number < 0 ? new Phasor(0, 0) : new Phasor(re[number], im[number]);
    }

    /** The impedance between two nodes at the tuned frequency, all sources at rest. */
    public Phasor impedance(String from, String to) {
        rest();
        inject(circuit.node(from), circuit.node(to));
        equations.solve(re, im);
        return voltage(from).minus(voltage(to));
    }

    private void rest() {
        if (!tuned) {
            throw new IllegalStateException("the solver is not tuned to a frequency");
        }
        Arrays.fill(re, 0);
        Arrays.fill(im, 0);
    }

    private void inject(int into, int from) {
        if (into >= 0) {
            re[into] += 1;
        }
        if (from >= 0) {
            re[from] -= 1;
        }
    }

    private int row(Circuit.Source source) {
        return circuit.nodes().size() + source.order();
    }

    private String describe(int unknown) {
        List<String> nodes = circuit.nodes();
        return unknown < nodes.size()
                ? "node " + nodes.get(unknown)
                : "the current of voltage source " + circuit.voltageSource(unknown - nodes.size());
    }
}
