package undermask.installation;

/**
 * An element that somebody adds to the circuit.
 *
 * @param from name of a node, known or new
 * @param to likewise, another one
 * @param value in SI, positive
 */
public record OwnElement(String from, String to, ElementKind kind, double value) {
    /** Builds an element between two nodes. */
    public OwnElement {
        if (from.isEmpty() || to.isEmpty() || from.equals(to)) {
            throw new IllegalArgumentException("an element needs two different nodes");
        }
        if (!(value > 0) || Double.isInfinite(value)) {
            throw new IllegalArgumentException("value of an element is " + value);
        }
    }
}
