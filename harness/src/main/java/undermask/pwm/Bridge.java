package undermask.pwm;

import java.util.ArrayList;
import java.util.List;
import undermask.drive.DriveSettings;
import undermask.drive.Edges;
import undermask.drive.Modulation;
import undermask.drive.OperatingPoint;
import undermask.drive.Switching;
import undermask.signal.EdgeTrain;
import undermask.signal.Lines;
import undermask.unit.Dimension;
import undermask.unit.Figures;

/**
 * The output of a three-phase bridge over one analysis window. The fundamental of leg k is M·(V_dc/2)·cos(ω1·t − 2πk/3),
 * its current out of the leg lags by the load's angle.
 */
public final class Bridge {
    /** Twice the 160 ms in which quasi-peak detector and meter of band B forget; a spread carrier needs so much. */
    private static final double SPREAD_WINDOW = 0.32;
    /** Points per period of the link ripple between which the link voltage is taken as straight. */
    private static final double RIPPLE_POINTS = 24;

    private static final int LEGS = 3;
    /** Share of the link voltage from which on an edge got across in one go. */
    private static final double WHOLE = 0.8;

    /** Lines beyond so many times the carrier add nothing to a distortion weighted by 1/h. */
    private static final double HARMONICS_OF_CARRIER = 50;

    private final OperatingPoint point;
    private final Modulation scheme;
    private final AnalysisWindow window;
    private final LinkVoltage link;
    private final double index;
    private final boolean overmodulated;
    private final List<EdgeTrain> legs;
    private final EdgeTrain commonMode;
    private final PhaseCurrents currents;
    private final LinkCurrent linkCurrent;
    private final List<String> remarks;

    private Bridge(DriveSettings settings, OperatingPoint point, LinkVoltage stiffLink, OutputLoad load) {
        this.point = point;
        double carrierHz = settings.carrierHz(point);
        var spread = settings.carrier().spread();
        boolean rippling = stiffLink.rippleHz() > 0;
        this.window = AnalysisWindow.of(
                carrierHz,
                point.outputHz(),
                spread.none() ? 0 : SPREAD_WINDOW,
                stiffLink.rippleHz(),
                spread.none() ? 0 : spread.rateHz());
        this.link = rippling ? stiffLink.withRippleAt(window.fitted(stiffLink.rippleHz())) : stiffLink;
        this.scheme = scheme(settings, point);
        this.index = index(settings, point, link.mean());
        Reference reference = Reference.of(scheme, settings.modulation().overmodulation(), index);
        this.overmodulated = reference.clipped();
        CarrierPeriods carrier = CarrierPeriods.of(window, spread);
        CarrierComparison comparison = new CarrierComparison(
                window, carrier, reference, settings.carrier().sampling());
        Switching switching = settings.switching();
        PhaseCurrents sines =
                new PhaseCurrents(point, window.seconds(), List.of(), link.mean(), Double.POSITIVE_INFINITY);
        List<SwitchingInstants> commands = new ArrayList<>();
        int shortened = 0;
        for (int k = 0; k < LEGS; k++) {
            int leg = k;
            SwitchingInstants compared = comparison.leg(
                    leg,
                    time -> switching.compensated() ? Math.copySign(switching.deadTime(), sines.sine(leg, time)) : 0);
            SwitchingInstants command = compared.atLeast(switching.minimumPulse(), switching.shortPulses());
            shortened += compared.shorterThan(switching.minimumPulse());
            commands.add(command);
        }
        this.currents = new PhaseCurrents(point, window.seconds(), commands, link.mean(), load.inductance());
        List<EdgeTrain> units = new ArrayList<>();
        int unfinished = 0;
        int edges = 0;
        for (int k = 0; k < LEGS; k++) {
            SwitchingInstants command = commands.get(k);
            double[] amperes = new double[command.size()];
            for (int i = 0; i < amperes.length; i++) {
                amperes[i] = currents.at(k, command.time(i));
            }
            LegEdges leg = new LegEdges(settings.edges(), switching, link, load.legCapacitance(), window.seconds());
            units.add(leg.of(command, amperes));
            unfinished += leg.forcedRests();
            edges += command.size();
        }
        this.legs = units.stream()
                .map(unit -> rippling
                        ? unit.times(link::at, 1 / (RIPPLE_POINTS * link.rippleHz()))
                        : unit.times(link.mean()))
                .toList();
        this.commonMode = EdgeTrain.sum(legs, 1 / 3.0, 1 / 3.0, 1 / 3.0);
        this.linkCurrent = new LinkCurrent(window, units, currents);
        this.remarks = new Remarks()
                .overmodulation(reference, index, settings.modulation().overmodulation())
                .spread(spread, carrier.count(), window)
                .shortPulses(shortened, switching.shortPulses())
                .unfinishedEdges(unfinished, edges)
                .all();
    }

    /**
     * Switches the bridge.
     *
     * @throws IllegalArgumentException when the settings ask at this point for what no bridge can do
     */
    public static Bridge switching(DriveSettings settings, OperatingPoint point, LinkVoltage link, OutputLoad load) {
        refuseImpossible(settings, point, link);
        return new Bridge(settings, point, link, load);
    }

    /**
     * Refuses what no bridge can do, without the work of switching it.
     *
     * @throws IllegalArgumentException when a carrier that does not keep step is below six times the output frequency,
     *     an edge takes longer than a quarter of a carrier period, or the V/f curve asks for more than six-step can give
     */
    public static void refuseImpossible(DriveSettings settings, OperatingPoint point, LinkVoltage link) {
        double fastest = settings.carrierHz(point) + settings.carrier().spread().deviationHz();
        double slowest = settings.carrierHz(point) - settings.carrier().spread().deviationHz();
        if (!settings.carrier().synchronous()) {
            AnalysisWindow.refuseSlowCarrier(slowest, point.outputHz());
        }
        Edges edges = settings.edges();
        double slew = Math.min(edges.slewRising(), edges.slewFalling());
        if (link.mean() / slew > 0.25 / fastest) {
            throw new IllegalArgumentException("dv/dt of " + Figures.withUnit(slew, Dimension.SLEW, 4)
                    + " takes " + Figures.withUnit(link.mean() / slew, Dimension.TIME, 3)
                    + " from rail to rail, more than a quarter of a carrier period: edges overlap");
        }
        Reference.of(
                scheme(settings, point), settings.modulation().overmodulation(), index(settings, point, link.mean()));
    }

    private static Modulation scheme(DriveSettings settings, OperatingPoint point) {
        return settings.modulation()
                .at(point.outputHz(), settings.voltageCurve().lineVoltage(point.outputHz()));
    }

    private static double index(DriveSettings settings, OperatingPoint point, double linkVoltage) {
        return settings.voltageCurve().lineVoltage(point.outputHz()) * Math.sqrt(2.0 / 3) / (linkVoltage / 2);
    }

    /** The window that everything repeats in. */
    public AnalysisWindow window() {
        return window;
    }

    /** Voltage of the DC link. */
    public LinkVoltage link() {
        return link;
    }

    /** The scheme in use at this point. */
    public Modulation scheme() {
        return scheme;
    }

    /** M, peak of the phase fundamental over half the link voltage, as asked for by the V/f curve. */
    public double modulationIndex() {
        return index;
    }

    /** Whether the reference is clipped: M beyond the scheme's linear range. */
    public boolean overmodulated() {
        return overmodulated;
    }

    /** Voltage of leg 0, 1 or 2 against the link's mid-point, ±V_dc/2. */
    public EdgeTrain leg(int k) {
        return legs.get(k);
    }

    /** Mean of the three legs. */
    public EdgeTrain commonMode() {
        return commonMode;
    }

    /** Leg 0 minus leg 1. */
    public EdgeTrain lineToLine() {
        return EdgeTrain.sum(legs.subList(0, 2), 1, -1);
    }

    /**
     * Weighted total harmonic distortion of the line-to-line voltage: the root of the sum of (V_h/h)² over all lines but
     * the fundamental, over V_1, h the line's frequency over the output's.
     */
    public double weightedDistortion() {
        Lines lines = lineToLine().lines();
        int count = (int) Math.min(Integer.MAX_VALUE / 2, HARMONICS_OF_CARRIER * (double) window.carrierPeriods());
        double[] re = new double[count];
        double[] im = new double[count];
        lines.read(1, count, re, im);
        int fundamental = window.fundamentalPeriods();
        double sum = 0;
        for (int n = 1; n <= count; n++) {
            double order = (double) n / fundamental;
            sum += n == fundamental ? 0 : (re[n - 1] * re[n - 1] + im[n - 1] * im[n - 1]) / (order * order);
        }
        return Math.sqrt(sum) / Math.hypot(re[fundamental - 1], im[fundamental - 1]);
    }

    /** Rms value of the fundamental of the line-to-line voltage, V. */
    public double fundamentalVoltage() {
        double[] re = new double[1];
        double[] im = new double[1];
        lineToLine().lines().read(window.fundamentalPeriods(), 1, re, im);
        return Math.sqrt(2) * Math.hypot(re[0], im[0]);
    }

    /** The shortest transition of an edge of leg 0 that gets across in one go, s; infinite when there is none. */
    public double fastestTransition() {
        EdgeTrain leg = legs.get(0);
        double fastest = Double.POSITIVE_INFINITY;
        for (int e = 0; e < leg.size(); e++) {
            boolean whole = Math.abs(leg.step(e)) > WHOLE * link.mean();
            fastest = whole ? Math.min(fastest, leg.shape(e).transitionTime()) : fastest;
        }
        return fastest;
    }

    /** Current out of leg 0, 1 or 2 at a time in s: the load's sine and the carrier ripple, A. */
    public double current(int k, double time) {
        return currents.at(k, time);
    }

    /** What the bridge takes from the DC link. */
    public LinkCurrent linkCurrent() {
        return linkCurrent;
    }

    /** The point that the bridge works at. */
    public OperatingPoint point() {
        return point;
    }

    /** What a drive engineer should know of this point, in sentences. */
    public List<String> remarks() {
        return remarks;
    }
}
