package undermask.check;

import undermask.network.InstallationNetwork;
import undermask.pwm.Bridge;
import undermask.signal.Lines;

/** The lines of a bridge's two modes at each port. */
final class PortLines {
    private final Lines[] commonMode;
    private final Lines[] linkCurrent;

    private PortLines(Lines common, Lines link, InstallationNetwork network) {
        int ports = network.ports().size();
        commonMode = new Lines[ports];
        linkCurrent = new Lines[ports];
        for (int port = 0; port < ports; port++) {
            commonMode[port] = common.through(network.ports().get(port).commonMode());
            linkCurrent[port] = link.through(network.ports().get(port).linkCurrent());
        }
    }

    /** Lines to be read as a whole, several times. */
    static PortLines stored(Bridge bridge, InstallationNetwork network) {
        return new PortLines(
                bridge.commonMode().lines().stored(),
                bridge.linkCurrent().lines().stored(),
                network);
    }

    /** Lines of which a few are read. */
    static PortLines few(Bridge bridge, InstallationNetwork network) {
        return new PortLines(bridge.commonMode().lines(), bridge.linkCurrent().lines(), network);
    }

    int ports() {
        return commonMode.length;
    }

    /** Both modes together at a port. */
    Lines both(int port) {
        return commonMode[port].plus(linkCurrent[port]);
    }

    Lines commonMode(int port) {
        return commonMode[port];
    }

    Lines linkCurrent(int port) {
        return linkCurrent[port];
    }

    /** What a receiver gets of both modes at a port and a frequency. */
    PortMix mix(int port, double frequency, double bandwidth) {
        return PortMix.of(commonMode[port], linkCurrent[port], frequency, bandwidth);
    }

    /** The same, port by port. */
    PortMix[] mixes(double frequency, double bandwidth) {
        PortMix[] mixes = new PortMix[ports()];
        for (int port = 0; port < mixes.length; port++) {
            mixes[port] = mix(port, frequency, bandwidth);
        }
        return mixes;
    }
}
