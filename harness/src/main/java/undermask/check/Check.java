package undermask.check;

import java.util.ArrayList;
import java.util.List;
import undermask.drive.OperatingPoint;
import undermask.mask.Judgement;
import undermask.mask.Mask;
import undermask.network.InstallationNetwork;
import undermask.pwm.Bridge;
import undermask.receiver.Receiver;
import undermask.receiver.Trace;
import undermask.signal.EdgeTrain;
import undermask.signal.Lines;
import undermask.signal.Transfer;

/** The road from saved settings to a verdict. */
public final class Check {
    private Check() {}

    /**
     * Checks one profile at all its operating points.
     *
     * @throws IllegalArgumentException when the settings contradict each other or the mask limits nothing that its
     *     receiver can read
     */
    public static ProfileResult of(Profile profile) {
        InstallationNetwork network =
                InstallationNetwork.of(profile.installation(), profile.mask().network());
        List<PointResult> points = new ArrayList<>();
        Trace envelope = null;
        for (OperatingPoint point : profile.points()) {
            PointResult result = at(point, profile, network);
            points.add(result);
            envelope = envelope == null ? result.trace() : envelope.envelopeWith(result.trace());
        }
        return new ProfileResult(profile, points, envelope, judge(envelope, profile));
    }

    private static PointResult at(OperatingPoint point, Profile profile, InstallationNetwork network) {
        Bridge bridge = Bridge.switching(profile.settings(), point, profile.link(point), profile.load());
        EdgeTrain edges = bridge.commonMode();
        Lines source = edges.lines();
        Trace worst = null;
        for (Transfer toPort : network.commonModeTransfers()) {
            Lines atPort = source.through(toPort);
            Trace trace = Receiver.of(profile.mask().receiver()).scan(atPort);
            worst = worst == null ? trace : worst.envelopeWith(trace);
        }
        return new PointResult(point, bridge, worst, judge(worst, profile));
    }

    private static List<Judgement> judge(Trace trace, Profile profile) {
        Mask mask = profile.mask();
        double required = profile.policy().requiredMarginDb();
        return mask.detectors().stream()
                .map(detector -> Judgement.worst(trace, mask, detector, required)
                        .orElseThrow(() -> new IllegalArgumentException(
                                "mask " + mask.name() + " limits no frequency that its receiver reads")))
                .toList();
    }
}
