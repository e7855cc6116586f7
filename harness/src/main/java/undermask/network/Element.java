package undermask.network;

/** Something linear between nodes of a {@link Circuit}. Nodes are numbers, the reference node is below zero. */
interface Element {
    /**
     * Adds this element's admittances.
     *
     * @param equations of the circuit at one frequency
     * @param omega angular frequency in rad/s, above 0
     */
    void stamp(NodalEquations equations, double omega);
}
