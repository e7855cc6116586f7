package undermask.installation;

import undermask.unit.Worded;

/** Where ring cores sit on the motor lead. */
public enum CorePlace implements Worded {
    AROUND_ALL("around-all"),
    ON_EACH("on-each");

    private final String words;

    CorePlace(String words) {
        this.words = words;
    }

    @Override
    public String words() {
        return words;
    }
}
