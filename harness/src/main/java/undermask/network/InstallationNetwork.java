package undermask.network;

import java.util.List;
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
    private final Circuit circuit;
    private final Transfer commonMode;

    private InstallationNetwork(Installation installation, MainsNetwork mains) {
        this.installation = installation;
        this.mains = mains;
        circuit = InstallationCircuit.of(installation, mains);
        commonMode = tabulate(InstallationCircuit.COMMON_MODE_SOURCE);
    }

    /** Wires an installation to mains networks, one per mains conductor, and solves it. */
    public static InstallationNetwork of(Installation installation, MainsNetwork mains) {
        return new InstallationNetwork(installation, mains);
    }

    /**
     * Common mode of the bridge, output against link mid-point, to the level that a laboratory reports at the mains
     * terminals; one per mains line whose reading can differ. In common mode all lines are alike, so there is one.
     */
    public List<Transfer> commonModeTransfers() {
        return List.of(commonMode);
    }

    /** The circuit with its nodes and sources by name, for a look at any other voltage or impedance in it. */
    public Circuit circuit() {
        return circuit;
    }

    /** Distance of the motor lead's resonances: half a wave more along its length each. */
    private double leadRipple() {
        CablePart lead = installation.motorLead();
        return 1 / (2 * installation.motorLeadLength() * Math.sqrt(lead.inductance() * lead.capacitance()));
    }

    private Transfer tabulate(String source) {
        String line = InstallationCircuit.lines(installation).get(0);
        CircuitSolver solver = circuit.solver();
        return TabulatedTransfer.of(
                (frequency, out) -> {
                    Phasor level = mains.level(solver.tune(frequency).excite(source), line, frequency);
                    out[0] = level.re();
                    out[1] = level.im();
                },
                LOWEST_HZ,
                HIGHEST_HZ,
                leadRipple(),
                RELATIVE_ERROR);
    }
}
