package undermask.network;

/** Nodes of an installation's circuit that installations may name. */
final class InstallationNodes {
    static final String GROUND = "ground plane";
    static final String DRIVE_PE = "drive PE";
    static final String FILTER_CASE = "filter case";
    static final String LINK_PLUS = "link plus";
    static final String LINK_MINUS = "link minus";
    static final String LINK_MIDDLE = "link mid-point";
    static final String OUTPUT = "drive output";
    static final String LEAD_START = "motor lead start";
    static final String MOTOR_TERMINALS = "motor terminals";
    static final String MOTOR_FRAME = "motor frame";

    private InstallationNodes() {}
}
