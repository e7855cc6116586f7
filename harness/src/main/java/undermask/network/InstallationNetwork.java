package undermask.network;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import undermask.installation.CablePart;
import undermask.installation.Installation;
import undermask.signal.TabulatedTransfer;
import undermask.signal.Transfer;

/** The way from the bridge of a drive to the receiver at the mains terminals. */
public final class InstallationNetwork {
    /**
     * Below and above these the transfer stays at its end value. Lines that a receiver tuned to 9 kHz or 30 MHz still
     * sees lie inside.
     */
    private static final double LOWEST_HZ = 7e3;

    private static final double HIGHEST_HZ = 30.1e6;
    /** 0.1 %, 0.009 dB. */
    private static final double RELATIVE_ERROR = 1e-3;

    private final Installation installation;
    private final MainsNetwork mains;
    private final double peakCurrent;
    private final List<Port> ports;

    /**
     * A mains line that the receiver is connected to.
     *
     * @param commonMode level per volt of the bridge's common mode, output against link mid-point
     * @param linkCurrent level in V per ampere that the bridge takes from the link
     */
    public record Port(String line, Transfer commonMode, Transfer linkCurrent) {}

    private InstallationNetwork(Installation installation, MainsNetwork mains, double peakCurrent) {
        this.installation = installation;
        this.mains = mains;
        this.peakCurrent = peakCurrent;
        PortResponse response = response(Variation.NONE);
        this.ports = new ArrayList<>();
        Map<Double, double[]> solved = new HashMap<>();
        for (int i = 0; i < response.lines().size(); i++) {
            ports.add(new Port(
                    response.lines().get(i), tabulate(response, solved, 4 * i), tabulate(response, solved, 4 * i + 2)));
        }
    }

    /** Wires an installation to mains networks, one per mains conductor, and solves it; its motor takes no current. */
    public static InstallationNetwork of(Installation installation, MainsNetwork mains) {
        return of(installation, mains, 0);
    }

    /**
     * The same with a current that may saturate ring cores.
     *
     * @param peakCurrent of a motor conductor, A
     */
    public static InstallationNetwork of(Installation installation, MainsNetwork mains, double peakCurrent) {
        return new InstallationNetwork(installation, mains, peakCurrent);
    }

    /** The mains lines whose readings can differ: both of a single-phase supply, two of three. */
    public List<Port> ports() {
        return ports;
    }

    /** The same way frequency by frequency, with values that differ from what is written. */
    public PortResponse response(Variation variation) {
        return new PortResponse(installation, mains, peakCurrent, variation);
    }

    /** The circuit with its nodes and sources by name, for a look at any other voltage or impedance in it. */
    public Circuit circuit() {
        return InstallationCircuit.of(installation, mains, Variation.NONE, peakCurrent);
    }

    /** Distance of the motor lead's resonances: half a wave more along its length each. */
    private double leadRipple() {
        CablePart lead = installation.motorLead();
        return 1 / (2 * installation.motorLeadLength() * Math.sqrt(lead.inductance() * lead.capacitance()));
    }

    /** One of the transfers; what is solved for one serves the others. */
    private Transfer tabulate(PortResponse response, Map<Double, double[]> solved, int place) {
        return TabulatedTransfer.of(
                (frequency, out) -> {
                    double[] all = solved.computeIfAbsent(frequency, at -> allAt(response, at));
                    out[0] = all[place];
                    out[1] = all[place + 1];
                },
                LOWEST_HZ,
                HIGHEST_HZ,
                leadRipple(),
                RELATIVE_ERROR);
    }

    private static double[] allAt(PortResponse response, double frequency) {
        double[] all = new double[4 * response.lines().size()];
        for (int i = 0; i < response.lines().size(); i++) {
            System.arraycopy(response.commonMode(i, frequency), 0, all, 4 * i, 2);
            System.arraycopy(response.linkCurrent(i, frequency), 0, all, 4 * i + 2, 2);
        }
        return all;
    }
}
