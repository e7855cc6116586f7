package undermask.installation;

import undermask.unit.Dimension;
import undermask.unit.Range;
import undermask.unit.Worded;

/**
 * A value of an installation that is never known well, with its relative standard deviation where nothing better is
 * said. The deviations are common practice: a tenth for capacitors bought by value, a third and more for what geometry and
 * luck decide.
 */
public enum Parasitic implements Worded {
    MAINS_LEAD("mains lead inductance", 0.2),
    LINE_REACTOR("line reactor", 0.1),
    FILTER_CHOKE("filter choke", 0.2),
    FILTER_LEAKAGE("filter choke leakage", 0.25),
    FILTER_WINDING("filter winding capacitance", 0.4),
    FILTER_LOSS("filter choke loss", 0.3),
    X_CAPACITOR("X capacitor", 0.1),
    Y_CAPACITOR("Y capacitor", 0.1),
    CAPACITOR_ESL("filter capacitor ESL", 0.3),
    CAPACITOR_ESR("filter capacitor ESR", 0.3),
    FILTER_EARTH_LEAD("filter earth lead inductance", 0.3),
    LINK_CHOKE("link choke", 0.1),
    LINK_ESR("link capacitor ESR", 0.3),
    LINK_ESL("link capacitor ESL", 0.3),
    LINK_TO_EARTH("link to earth capacitor", 0.1),
    HEATSINK("heatsink capacitance", 0.3),
    OUTPUT_FILTER("output filter", 0.15),
    RING_CORE("ring core permeability", 0.25),
    LEAD_CAPACITANCE("motor lead capacitance", 0.15),
    LEAD_INDUCTANCE("motor lead inductance", 0.15),
    LEAD_LOSS("motor lead resistance", 0.3),
    LEAD_OUTSIDE("motor lead outer inductance", 0.3),
    SHIELD_TAIL("shield termination inductance", 0.3),
    MOTOR_TERMINALS("motor terminal capacitance", 0.4),
    MOTOR_STAR("motor star capacitance", 0.3),
    MOTOR_WINDING("motor winding inductance", 0.3),
    MOTOR_LOSS("motor resistances", 0.4),
    FRAME_BOND("motor frame bond", 0.3);

    private final String words;
    private final double deviation;

    Parasitic(String words, double deviation) {
        this.words = words;
        this.deviation = deviation;
    }

    @Override
    public String words() {
        return words;
    }

    /** Relative standard deviation where an installation says nothing, a share. */
    public double deviation() {
        return deviation;
    }

    /** The row by which an installation says better: {@code filter choke tolerance}. */
    public Range tolerance() {
        return new Range(words + " tolerance", Dimension.NUMBER, 0, 1);
    }
}
