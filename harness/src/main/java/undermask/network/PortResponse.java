package undermask.network;

import java.util.List;
import undermask.installation.Installation;

/**
 * The way from the two sources of a drive, common mode and link current, to each port that a receiver can be connected
 * to, frequency by frequency. Used by one thread at a time.
 */
public final class PortResponse {
    private final MainsNetwork mains;
    private final List<String> lines;
    private final CircuitSolver solver;
    private final double[][] commonMode;
    private final double[][] linkCurrent;
    private double tuned = Double.NaN;

    /**
     * Wires an installation whose values differ by some factors.
     *
     * @param peakCurrent of a motor conductor, A
     */
    public PortResponse(Installation installation, MainsNetwork mains, double peakCurrent, Variation variation) {
        this.mains = mains;
        // of three lines one is alone on its rail, the other two are alike
        this.lines = InstallationCircuit.lines(installation).subList(0, 2);
        this.solver = InstallationCircuit.of(installation, mains, variation, peakCurrent)
                .solver();
        this.commonMode = new double[lines.size()][2];
        this.linkCurrent = new double[lines.size()][2];
    }

    /** The lines whose readings can differ. */
    public List<String> lines() {
        return lines;
    }

    /** Level at a line per volt of common mode at a frequency: real and imaginary part, to be read before the next call. */
    public double[] commonMode(int line, double frequency) {
        tune(frequency);
        return commonMode[line];
    }

    /** Level at a line in V per ampere that the bridge takes from the link, likewise. */
    public double[] linkCurrent(int line, double frequency) {
        tune(frequency);
        return linkCurrent[line];
    }

    private void tune(double frequency) {
        if (frequency == tuned) {
            return;
        }
        solver.tune(frequency).excite(InstallationCircuit.COMMON_MODE_SOURCE);
        read(commonMode, frequency);
        solver.excite(InstallationCircuit.LINK_CURRENT_SOURCE);
        read(linkCurrent, frequency);
        tuned = frequency;
    }

    private void read(double[][] into, double frequency) {
        for (int i = 0; i < into.length; i++) {
            Phasor level = mains.level(solver, lines.get(i), frequency);
            into[i][0] = level.re();
            into[i][1] = level.im();
        }
    }
}
