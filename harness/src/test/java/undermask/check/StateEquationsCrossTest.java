package undermask.check;

import static org.assertj.core.api.Assertions.assertThat;

import org.hipparchus.linear.Array2DRowRealMatrix;
import org.hipparchus.linear.ArrayRealVector;
import org.hipparchus.linear.LUDecomposition;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import undermask.installation.CablePart;
import undermask.installation.Installation;
import undermask.network.InstallationNetwork;
import undermask.network.MainsNetwork;
import undermask.signal.Transfer;

/**
 * The transfer by state equations, (jω − A)⁻¹·b, against the solved circuit, far closer than an integration in time can
 * hold it. A and b are what the equations make of each state and of the source by themselves.
 */
class StateEquationsCrossTest {
    private static final int SECTIONS = 80;

    /** Next to no loss in the lead, whose course over frequency the state equations cannot follow. */
    private static final Installation INSTALLATION = WholeWayCrossTest.installation(
            new CablePart("lead of no loss", 380e-12, 135e-9, 1e-5, 1e6, 1e-7, true, "generic"));

    // Source: none needed, the two ways share no code; 0.01 dB of interpolation and the lead's losses, see the whole
    // way
    @ParameterizedTest
    @ValueSource(doubles = {9e3, 20e3, 70e3, 150e3, 320e3, 700e3, 1.3e6, 2.1e6, 3.15e6, 4.4e6, 5e6, 7e6, 10e6})
    void transferOfTheStateEquations(double frequency) {
        Transfer transfer = InstallationNetwork.of(INSTALLATION, MainsNetwork.CISPR_9_KHZ)
                .ports()
                .get(0)
                .commonMode();
        double[] re = {1};
        double[] im = {0};
        transfer.multiply(frequency, 1, 1, re, im);
        double[] byStates = byStates(2 * Math.PI * frequency);
        double error = Math.hypot(re[0] - byStates[0], im[0] - byStates[1]) / Math.hypot(re[0], im[0]);
        assertThat(error).isLessThan(1e-3);
    }

    private static double[] byStates(double omega) {
        CommonModeInTime atRest = new CommonModeInTime(INSTALLATION, SECTIONS, time -> 0);
        CommonModeInTime fed = new CommonModeInTime(INSTALLATION, SECTIONS, time -> 1);
        int size = atRest.getDimension();
        Array2DRowRealMatrix equations = new Array2DRowRealMatrix(2 * size, 2 * size);
        for (int j = 0; j < size; j++) {
            double[] unit = new double[size];
            unit[j] = 1;
            double[] column = atRest.computeDerivatives(0, unit);
            for (int i = 0; i < size; i++) {
                equations.setEntry(i, j, -column[i]);
                equations.setEntry(size + i, size + j, -column[i]);
            }
            equations.setEntry(j, size + j, -omega);
            equations.setEntry(size + j, j, omega);
        }
        ArrayRealVector source = new ArrayRealVector(2 * size);
        source.setSubVector(0, new ArrayRealVector(fed.computeDerivatives(0, new double[size])));
        double[] solution =
                new LUDecomposition(equations).getSolver().solve(source).toArray();
        double[] stateRe = new double[size];
        double[] stateIm = new double[size];
        System.arraycopy(solution, 0, stateRe, 0, size);
        System.arraycopy(solution, size, stateIm, 0, size);
        return new double[] {atRest.terminal(stateRe), atRest.terminal(stateIm)};
    }
}
