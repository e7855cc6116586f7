package undermask.pwm;

import java.util.List;
import java.util.stream.IntStream;
import undermask.drive.DriveSettings;
import undermask.drive.EdgeForm;
import undermask.drive.OperatingPoint;
import undermask.signal.EdgeShape;
import undermask.signal.EdgeTrain;
import undermask.signal.ExponentialEdge;
import undermask.signal.RaisedCosineEdge;
import undermask.signal.RampEdge;

/**
 * The output of a three-phase bridge over one analysis window. The fundamental of leg k is M·(V_dc/2)·cos(ω1·t − 2πk/3),
 * its current out of the leg lags by the load's angle. At no load the sign of the current still follows that lag: it is
 * the magnetizing current.
 */
public final class Bridge {
    private final AnalysisWindow window;
    private final double linkVoltage;
    private final Reference reference;
    private final List<EdgeTrain> legs;
    private final EdgeTrain commonMode;

    private Bridge(AnalysisWindow window, double linkVoltage, Reference reference, List<EdgeTrain> legs) {
        this.window = window;
        this.linkVoltage = linkVoltage;
        this.reference = reference;
        this.legs = legs;
        this.commonMode = EdgeTrain.sum(legs, 1 / 3.0, 1 / 3.0, 1 / 3.0);
    }

    /**
     * Switches the bridge.
     *
     * @param linkVoltage mean voltage of the DC link in V
     * @throws IllegalArgumentException when the carrier is below six times the output frequency, or the V/f curve asks
     *     for more than six-step can give
     */
    public static Bridge switching(DriveSettings settings, OperatingPoint point, double linkVoltage) {
        AnalysisWindow window = AnalysisWindow.of(settings.carrierHz(), point.outputHz());
        Reference reference = reference(settings, point, linkVoltage);
        CarrierComparison comparison = new CarrierComparison(window, reference, settings.sampling());
        EdgeShape rising = shape(settings.edgeForm(), linkVoltage / settings.slewRising());
        EdgeShape falling = shape(settings.edgeForm(), linkVoltage / settings.slewFalling());
        List<EdgeTrain> legs = IntStream.range(0, 3)
                .mapToObj(leg -> comparison
                        .leg(leg)
                        .delayed(
                                settings.deadTime(),
                                time -> Math.cos(
                                        2 * Math.PI * point.outputHz() * time - leg * 2 * Math.PI / 3 - point.lag())))
                .map(instants -> edges(instants, window.seconds(), linkVoltage, rising, falling))
                .toList();
        return new Bridge(window, linkVoltage, reference, legs);
    }

    /**
     * Refuses what no bridge can do, without the work of switching it.
     *
     * @throws IllegalArgumentException as {@link #switching} would
     */
    public static void refuseImpossible(DriveSettings settings, OperatingPoint point, double linkVoltage) {
        AnalysisWindow.of(settings.carrierHz(), point.outputHz());
        reference(settings, point, linkVoltage);
    }

    private static Reference reference(DriveSettings settings, OperatingPoint point, double linkVoltage) {
        double phasePeak = settings.voltageCurve().lineVoltage(point.outputHz()) * Math.sqrt(2.0 / 3);
        return new Reference(settings.modulation(), phasePeak / (linkVoltage / 2));
    }

    private static EdgeShape shape(EdgeForm form, double transitionTime) {
        return switch (form) {
            case EXPONENTIAL -> new ExponentialEdge(transitionTime);
            case RAMP -> new RampEdge(transitionTime);
            case RAISED_COSINE -> new RaisedCosineEdge(transitionTime);
        };
    }

    private static EdgeTrain edges(
            SwitchingInstants instants, double window, double linkVoltage, EdgeShape rising, EdgeShape falling) {
        List<EdgeShape> shapes = rising.equals(falling) ? List.of(rising) : List.of(rising, falling);
        double[] times = new double[instants.size()];
        double[] steps = new double[instants.size()];
        int[] shapeOf = new int[instants.size()];
        int first = 0;
        for (int i = 0; i < times.length; i++) {
            double turns = instants.time(i) / window;
            times[i] = Math.min(turns - Math.floor(turns), Math.nextDown(1.0)) * window;
            steps[i] = instants.up(i) ? linkVoltage : -linkVoltage;
            shapeOf[i] = shapes.indexOf(instants.up(i) ? rising : falling);
            first = times[i] < times[first] ? i : first;
        }
        boolean high = times.length == 0 ? instants.highWithoutEdges() : !instants.up(first);
        return new EdgeTrain(window, times, steps, shapeOf, shapes, high ? linkVoltage / 2 : -linkVoltage / 2);
    }

    /** The window that everything repeats in. */
    public AnalysisWindow window() {
        return window;
    }

    /** Mean voltage of the DC link, V. */
    public double linkVoltage() {
        return linkVoltage;
    }

    /** M, peak of the phase fundamental over half the link voltage, as asked for by the V/f curve. */
    public double modulationIndex() {
        return reference.index();
    }

    /** Whether the reference is clipped: M beyond the scheme's linear range. */
    public boolean overmodulated() {
        return reference.clipped();
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
}
