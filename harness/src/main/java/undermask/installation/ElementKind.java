package undermask.installation;

import undermask.unit.Worded;

/** What an element of an own network is. */
public enum ElementKind implements Worded {
    RESISTOR("resistor"),
    INDUCTOR("inductor"),
    CAPACITOR("capacitor");

    private final String words;

    ElementKind(String words) {
        this.words = words;
    }

    @Override
    public String words() {
        return words;
    }
}
