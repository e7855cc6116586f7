package undermask.drive;

import undermask.unit.Worded;

/** What a drive does when more voltage is asked for than its scheme gives linearly. */
public enum Overmodulation implements Worded {
    /** The reference is raised until, clipped, it gives the fundamental asked for; at its end lies six-step. */
    COMPENSATED("compensated"),
    /** The reference stays as asked for and is clipped: the fundamental falls short. */
    CLIPPED("clipped");

    private final String words;

    Overmodulation(String words) {
        this.words = words;
    }

    @Override
    public String words() {
        return words;
    }
}
