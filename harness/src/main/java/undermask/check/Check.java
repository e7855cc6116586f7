package undermask.check;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import undermask.drive.OperatingPoint;
import undermask.mask.Judgement;
import undermask.mask.Mask;
import undermask.network.InstallationNetwork;
import undermask.pwm.Bridge;
import undermask.receiver.Detector;
import undermask.receiver.Receiver;
import undermask.receiver.Trace;

/** The road from saved settings to a verdict. */
public final class Check {
    private static final double LOW = 0.05;
    private static final double MIDDLE = 0.5;
    private static final double HIGH = 0.95;

    private final Profile profile;
    private final Receiver receiver;
    private final InstallationNetwork network;
    private final Optional<ToleranceRuns> tolerances;

    private Check(Profile profile) {
        this.profile = profile;
        this.receiver = Receiver.of(profile.mask().receiver());
        this.network =
                InstallationNetwork.of(profile.installation(), profile.mask().network(), profile.peakCurrent());
        this.tolerances = profile.policy().toleranceRuns() > 0
                ? Optional.of(new ToleranceRuns(profile.installation(), network, receiver, profile.policy()))
                : Optional.empty();
    }

    /**
     * Checks one profile at all its operating points.
     *
     * @throws IllegalArgumentException when the settings contradict each other or the mask limits nothing that its
     *     receiver can read
     */
    public static ProfileResult of(Profile profile) {
        return new Check(profile).all();
    }

    private ProfileResult all() {
        List<PointResult> points = new ArrayList<>();
        Trace envelope = null;
        Optional<TraceBand> band = Optional.empty();
        for (OperatingPoint point : profile.points()) {
            PointResult result = at(point);
            points.add(result);
            envelope = envelope == null ? result.trace() : envelope.envelopeWith(result.trace());
            band = band.isEmpty()
                    ? result.band()
                    : Optional.of(band.get().envelopeWith(result.band().orElseThrow()));
        }
        List<Judgement> judgements = judge(band.map(TraceBand::judged).orElse(envelope));
        return new ProfileResult(
                profile,
                points,
                envelope,
                band,
                judgements,
                leverages(points, judgements),
                FurtherLimit.of(profile, points));
    }

    private PointResult at(OperatingPoint point) {
        Bridge bridge = Bridge.switching(profile.settings(), point, profile.link(point), profile.load());
        PortLines lines = PortLines.stored(bridge, network);
        Trace worst = null;
        for (int port = 0; port < lines.ports(); port++) {
            Trace trace = receiver.scan(lines.both(port));
            worst = worst == null ? trace : worst.envelopeWith(trace);
        }
        Trace nominal = worst;
        Optional<TraceBand> band = tolerances.map(runs -> band(runs, lines, nominal));
        return new PointResult(
                point, bridge, nominal, band, judge(band.map(TraceBand::judged).orElse(nominal)));
    }

    private TraceBand band(ToleranceRuns runs, PortLines lines, Trace nominal) {
        PortReadings[] readings = new PortReadings[lines.ports()];
        for (int port = 0; port < readings.length; port++) {
            readings[port] = PortReadings.of(lines, port, receiver, runs.frequencies());
        }
        Map<Detector, double[][]> shifts = new EnumMap<>(Detector.class);
        for (Detector detector : Detector.values()) {
            if (!Double.isNaN(nominal.levelDbuv(detector, 0))) {
                shifts.put(
                        detector,
                        runs.shifts(
                                readings,
                                detector,
                                LOW,
                                MIDDLE,
                                HIGH,
                                profile.policy().percentile()));
            }
        }
        List<Trace> percentiles = IntStream.range(0, 4)
                .mapToObj(p -> nominal.shifted((detector, frequency) ->
                        shifts.containsKey(detector) ? runs.at(shifts.get(detector)[p], frequency) : 0))
                .toList();
        return new TraceBand(
                percentiles.get(0), percentiles.get(1), percentiles.get(2), judged(nominal, percentiles.get(3)));
    }

    /**
     * From the middle upwards never less than the reading with all values as written: a percentile, taken frequency by
     * frequency, smears resonances that the plant as written does have.
     */
    private Trace judged(Trace nominal, Trace percentile) {
        return profile.policy().percentile() < MIDDLE ? percentile : percentile.envelopeWith(nominal);
    }

    private List<Judgement> judge(Trace trace) {
        Mask mask = profile.mask();
        double required = profile.policy().requiredMarginDb();
        return mask.detectors().stream()
                .map(detector -> Judgement.worst(trace, mask, detector, required)
                        .orElseThrow(() -> new IllegalArgumentException(
                                "mask " + mask.name() + " limits no frequency that its receiver reads")))
                .toList();
    }

    /** What rules at the worst frequency of each detector, at the point where that is. */
    private List<Leverage> leverages(List<PointResult> points, List<Judgement> judgements) {
        return judgements.stream()
                .map(judgement -> {
                    Bridge bridge = worst(points, judgement.detector()).bridge();
                    double frequency = judgement.frequencyHz();
                    return Leverage.of(
                            network,
                            PortLines.few(bridge, network).mixes(frequency, receiver.bandwidth(frequency)),
                            frequency);
                })
                .toList();
    }

    private static PointResult worst(List<PointResult> points, Detector detector) {
        PointResult worst = points.get(0);
        for (PointResult point : points) {
            worst = point.of(detector).marginDb() < worst.of(detector).marginDb() ? point : worst;
        }
        return worst;
    }
}
