package undermask.check;

import org.hipparchus.ode.OrdinaryDifferentialEquation;
import undermask.installation.CablePart;
import undermask.installation.Capacitor;
import undermask.installation.FilterStage;
import undermask.installation.Installation;
import undermask.installation.MotorPart;

/**
 * The common-mode circuit of an installation as state equations in time, worked out by hand. All mains lines are in
 * parallel, so are the two rails; X capacitors carry nothing. The motor lead is a chain of sections with constant
 * resistance and no conductance.
 *
 * <p>The Y capacitors are in series with the filter's earth lead, the outer current of the motor lead with the frame
 * bond, and what flows out through the mains lead comes back through PE and bond: three currents that are no states of
 * their own. The installation has a filter and a frame bond, and its link capacitors to PE have no inductance.
 */
final class CommonModeInTime implements OrdinaryDifferentialEquation {
    // mains network: voltages of coupling capacitor and two shunts, currents of two coils
    private static final int V_COUPLING = 0;
    private static final int I_COIL = 1;
    private static final int V_SHUNT = 2;
    private static final int I_SECOND_COIL = 3;
    private static final int V_SECOND_SHUNT = 4;
    // mains lead and filter
    private static final int I_LEAD = 5;
    private static final int V_WINDING = 6;
    private static final int I_LEAKAGE = 7;
    private static final int I_CORE = 8;
    private static final int V_Y = 9;
    private static final int I_Y = 10;
    // drive and earth
    private static final int V_TO_EARTH = 11;
    private static final int I_LINK = 12;
    private static final int V_LINK = 13;
    private static final int I_OUTER = 14;
    private static final int V_OUTPUT = 15;
    // motor
    private static final int V_TERMINAL = 16;
    private static final int I_MOTOR = 17;
    private static final int V_STAR = 18;
    /** Current and far voltage of each section of the motor lead. */
    private static final int SECTIONS = 19;

    /** The bridge's common-mode voltage, output against link mid-point. */
    interface Source {
        double at(double time);
    }

    private final int sections;
    private final Source source;
    private final double lines;
    private final Installation installation;
    private final FilterStage filter;
    private final MotorPart motor;
    private final Capacitor toEarth;
    private final Capacitor link;
    private final double sectionInductance;
    private final double sectionCapacitance;
    private final double sectionResistance;

    CommonModeInTime(Installation installation, int sections, Source source) {
        this.installation = installation;
        this.sections = sections;
        this.source = source;
        lines = installation.supply().conductors();
        filter = installation.filter().orElseThrow().stages().get(0);
        motor = installation.motor();
        toEarth = installation.link().toEarth();
        link = installation.link().capacitor();
        CablePart lead = installation.motorLead();
        double section = installation.motorLeadLength() / sections;
        sectionInductance = lead.inductance() * section;
        sectionCapacitance = lead.capacitance() * section;
        sectionResistance = lead.resistance() * section;
    }

    @Override
    public int getDimension() {
        return SECTIONS + 2 * sections;
    }

    /** Whether a state belongs to motor lead and motor. */
    boolean belongsToLead(int state) {
        return state >= V_OUTPUT;
    }

    /** Voltage of the mains terminals against the ground plane; 50 Ω per line in all behind the coupling capacitor. */
    double terminal(double[] x) {
        return x[V_COUPLING] + 50 / lines * (x[I_LEAD] - x[I_COIL]);
    }

    @Override
    public double[] computeDerivatives(double time, double[] x) {
        double[] d = new double[x.length];
        mainsNetwork(x, d);
        drive(source.at(time), x, d);
        motorLead(x, d);
        return d;
    }

    private void mainsNetwork(double[] x, double[] d) {
        double shunt = x[I_COIL] - x[I_SECOND_COIL];
        double behindCoil = x[V_SHUNT] + 5 / lines * shunt;
        d[V_COUPLING] = (x[I_LEAD] - x[I_COIL]) / (lines * 2.2e-6);
        d[I_COIL] = (terminal(x) - behindCoil) * lines / 50e-6;
        d[V_SHUNT] = shunt / (lines * 8e-6);
        d[I_SECOND_COIL] = (behindCoil - x[V_SECOND_SHUNT] - 5 / lines * x[I_SECOND_COIL]) * lines / 250e-6;
        d[V_SECOND_SHUNT] = x[I_SECOND_COIL] / (lines * 4e-6);
    }

    private void drive(double commonMode, double[] x, double[] d) {
        // from the rails to PE, through diodes to the lines, through the lines' Y capacitors to PE
        double throughDiodes = x[I_LEAD] + x[I_Y];
        double toPe = x[I_LINK] - throughDiodes;
        double rails = x[V_TO_EARTH] + toEarth.esr() / 2 * toPe;
        double inputs = rails - 50e-3 / lines * throughDiodes;
        d[V_TO_EARTH] = toPe / (2 * toEarth.capacitance());
        d[I_Y] = (inputs - x[V_Y] - filter.y().esr() / lines * x[I_Y])
                / (filter.y().esl() / lines + 0.8e-6 * installation.filterEarthLead());
        d[V_Y] = x[I_Y] / (lines * filter.y().capacitance());
        d[I_LINK] = (x[V_OUTPUT] - commonMode - rails - x[V_LINK] - link.esr() / 4 * x[I_LINK]) / (link.esl() / 4);
        d[V_LINK] = x[I_LINK] / (4 * link.capacitance());
        // the choke: leakage, then core inductance beside core loss; winding capacitance across all
        double core = filter.lossResistance() * (x[I_LEAKAGE] - x[I_CORE]);
        d[V_WINDING] = (x[I_LEAD] - x[I_LEAKAGE]) / (lines * filter.windingCapacitance());
        d[I_LEAKAGE] = (x[V_WINDING] - core) * lines / filter.leakage();
        d[I_CORE] = core / (filter.choke() - filter.leakage() / lines);
        // PE of the drive above the ground plane: the mains lead's PE and the bonded motor lead in parallel
        double length = installation.mainsLead().length();
        double perLead = lines / (installation.mainsLead().lineInductance() * length);
        double earth = installation.mainsLead().earthInductance() * length;
        double perOuter = 1
                / (0.9e-6 * installation.motorLeadLength()
                        + installation.frameBond().orElseThrow());
        double outerDrop = 10e-3 * installation.motorLeadLength() * x[I_OUTER];
        double abovePe = inputs - x[V_WINDING] - terminal(x);
        double pe = -earth * (perLead * abovePe - perOuter * outerDrop) / (1 + earth * (perLead + perOuter));
        d[I_LEAD] = perLead * (pe + abovePe);
        d[I_OUTER] = perOuter * (pe - outerDrop);
    }

    private void motorLead(double[] x, double[] d) {
        double near = x[V_OUTPUT];
        double arriving = -x[I_LINK];
        double capacitance = 3 * installation.heatsinkCapacitance() + sectionCapacitance / 2;
        int nearVoltage = V_OUTPUT;
        for (int k = 0; k < sections; k++) {
            int current = SECTIONS + 2 * k;
            int far = current + 1;
            d[nearVoltage] = (arriving - x[current]) / capacitance;
            d[current] = (near - x[far] - sectionResistance * x[current]) / sectionInductance;
            arriving = x[current];
            near = x[far];
            nearVoltage = far;
            capacitance = sectionCapacitance;
        }
        double toFrame = (near - x[V_TERMINAL]) / motor.frameResistance();
        double winding = near - x[V_STAR];
        double toStar = x[I_MOTOR] + winding / motor.windingResistance();
        d[V_TERMINAL] = toFrame / (3 * motor.terminalCapacitance());
        d[I_MOTOR] = winding / motor.windingInductance();
        d[V_STAR] = toStar / motor.starCapacitance();
        d[nearVoltage] = (arriving - toFrame - toStar) / (sectionCapacitance / 2);
    }
}
