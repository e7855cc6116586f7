package undermask.pwm;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import undermask.drive.EdgeForm;
import undermask.drive.Edges;
import undermask.drive.Ringing;
import undermask.drive.Switching;
import undermask.signal.EdgeShape;
import undermask.signal.EdgeTrain;
import undermask.signal.ExponentialEdge;
import undermask.signal.RaisedCosineEdge;
import undermask.signal.RampEdge;
import undermask.signal.RingingEdge;

/**
 * The voltage edges of one leg. A leg is forced to a rail by the switch that turns on, dead time after the command, when
 * the current keeps it at the other rail until then: rising with current out of the leg, falling with current into it.
 * Otherwise the current itself charges the output capacitance across as soon as the other switch lets go, and what is
 * left when the dead time ends is forced.
 */
final class LegEdges {
    /** A part of an edge below this share is none. */
    private static final double NOTHING = 1e-3;

    private final Edges edges;
    private final Switching switching;
    private final LinkVoltage link;
    private final double legCapacitance;
    private final double window;
    private final List<Double> times = new ArrayList<>();
    private final List<Double> steps = new ArrayList<>();
    private final List<EdgeShape> shapes = new ArrayList<>();
    /** Whether the rail that the leg lies at changes here: 1 up, −1 down, 0 for what goes on. */
    private final List<Integer> turns = new ArrayList<>();

    private int forcedRests;
    private double slowest;

    LegEdges(Edges edges, Switching switching, LinkVoltage link, double legCapacitance, double window) {
        this.edges = edges;
        this.switching = switching;
        this.link = link;
        this.legCapacitance = legCapacitance;
        this.window = window;
    }

    /** From the command that lets one switch go to the moment when the other one acts, s. */
    private double delay(boolean up) {
        return switching.deadTime() + (up ? switching.upperDelay() : switching.lowerDelay());
    }

    /**
     * The edges of a leg in units of the link voltage, between −1/2 and 1/2.
     *
     * @param commands instants before dead time
     * @param currents current out of the leg at each of them, A
     */
    EdgeTrain of(SwitchingInstants commands, double[] currents) {
        SwitchingInstants actual =
                commands.delayed(i -> commands.up(i) == (currents[i] > 0) ? delay(commands.up(i)) : 0);
        for (int i = 0; i < actual.size(); i++) {
            double current = currents[actual.origin(i)];
            boolean up = actual.up(i);
            if (up == (current > 0)) {
                forced(actual.time(i), up, 1, Math.abs(current), true);
            } else {
                charged(actual.time(i), up, Math.abs(current));
            }
        }
        return train(actual);
    }

    private void forced(double from, boolean up, double share, double current, boolean begins) {
        double slewed = share * link.at(from) / slew(up);
        double transition = slewed * (1 + edges.turnOnSlowing() * current / edges.referenceCurrent());
        Optional<Ringing> ringing = up ? edges.ringingRising() : edges.ringingFalling();
        EdgeShape shape = shape(transition);
        add(
                from + transition / 2,
                up,
                share,
                ringing.<EdgeShape>map(
                                ring -> new RingingEdge(shape, ring.frequency(), ring.damping(), ring.overshoot()))
                        .orElse(shape),
                begins);
    }

    private void charged(double from, boolean up, double current) {
        double slew = legCapacitance > 0 ? Math.min(slew(up), current / legCapacitance) : slew(up);
        double available = delay(up);
        double needed = link.at(from) / slew;
        if (needed <= available || legCapacitance == 0) {
            add(from + needed / 2, up, 1, shape(needed), true);
            return;
        }
        double share = available / needed;
        if (share > NOTHING) {
            add(from + available / 2, up, share, shape(available), true);
        }
        forcedRests++;
        forced(from + available, up, share > NOTHING ? 1 - share : 1, 0, share <= NOTHING);
    }

    private double slew(boolean up) {
        return up ? edges.slewRising() : edges.slewFalling();
    }

    private EdgeShape shape(double transition) {
        return shape(edges.form(), transition);
    }

    private static EdgeShape shape(EdgeForm form, double transition) {
        return switch (form) {
            case EXPONENTIAL -> new ExponentialEdge(transition);
            case RAMP -> new RampEdge(transition);
            case RAISED_COSINE -> new RaisedCosineEdge(transition);
        };
    }

    private void add(double time, boolean up, double share, EdgeShape shape, boolean begins) {
        double inside = time / window;
        times.add(Math.min(inside - Math.floor(inside), Math.nextDown(1.0)) * window);
        steps.add(up ? share : -share);
        shapes.add(shape);
        turns.add(begins ? (up ? 1 : -1) : 0);
        slowest = Math.max(slowest, shape.transitionTime());
    }

    private EdgeTrain train(SwitchingInstants actual) {
        int count = times.size();
        double[] at = new double[count];
        double[] heights = new double[count];
        int[] shapeOf = new int[count];
        int first = -1;
        for (int i = 0; i < count; i++) {
            at[i] = times.get(i);
            heights[i] = steps.get(i);
            shapeOf[i] = i;
            first = turns.get(i) != 0 && (first < 0 || at[i] < at[first]) ? i : first;
        }
        boolean high = first < 0 ? actual.highWithoutEdges() : turns.get(first) < 0;
        return new EdgeTrain(window, at, heights, shapeOf, shapes, high ? 0.5 : -0.5);
    }

    /** How many edges were left unfinished by the current and forced at the end of the dead time. */
    int forcedRests() {
        return forcedRests;
    }

    /** The longest transition, s. */
    double slowest() {
        return slowest;
    }
}
