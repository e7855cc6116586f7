package undermask.installation;

import undermask.unit.Worded;

/** What cools a motor. */
public enum MotorCooling implements Worded {
    /** A fan on its own shaft, which slows down with it. */
    SHAFT_FAN("shaft-fan"),
    /** A fan of its own. */
    FORCED("forced");

    private final String words;

    MotorCooling(String words) {
        this.words = words;
    }

    @Override
    public String words() {
        return words;
    }
}
