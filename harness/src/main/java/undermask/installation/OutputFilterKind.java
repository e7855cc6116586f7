package undermask.installation;

import undermask.unit.Worded;

/** What is fitted between drive and motor lead. */
public enum OutputFilterKind implements Worded {
    CHOKE("choke"),
    /** A choke with small capacitors that slow the edges. */
    DV_DT("dv/dt"),
    /** A choke with capacitors that leave the fundamental. */
    SINE("sine");

    private final String words;

    OutputFilterKind(String words) {
        this.words = words;
    }

    @Override
    public String words() {
        return words;
    }
}
