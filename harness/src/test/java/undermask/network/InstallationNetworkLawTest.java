package undermask.network;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.SplittableRandom;
import java.util.stream.IntStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import undermask.installation.Installation;
import undermask.signal.Transfer;

class InstallationNetworkLawTest {
    static IntStream seeds() {
        return IntStream.range(0, 24);
    }

    // Source: 0.01 dB is 0.115 %, both in modulus and in the plane
    @ParameterizedTest
    @MethodSource("seeds")
    void tabulatedTransferIsTheDirectSolution(int seed) {
        SplittableRandom random = new SplittableRandom(seed);
        Installation installation = Installations.random(random);
        MainsNetwork mains = MainsNetwork.values()[seed % 3];
        InstallationNetwork network = InstallationNetwork.of(installation, mains);
        Transfer transfer = network.commonModeTransfers().get(0);
        CircuitSolver solver = network.circuit().solver();
        String line = InstallationCircuit.lines(installation).get(0);
        for (int i = 0; i < 300; i++) {
            double frequency = 8e3 * Math.pow(30.05e6 / 8e3, random.nextDouble());
            double[] re = {1};
            double[] im = {0};
            transfer.multiply(frequency, 1, 1, re, im);
            Phasor direct =
                    mains.level(solver.tune(frequency).excite(InstallationCircuit.COMMON_MODE_SOURCE), line, frequency);
            double error = direct.minus(new Phasor(re[0], im[0])).modulus();
            assertThat(error).isLessThan(1.15e-3 * direct.modulus());
        }
    }

    // Source: symmetry; in common mode all mains lines of any installation carry the same
    @ParameterizedTest
    @MethodSource("seeds")
    void linesReadAlike(int seed) {
        SplittableRandom random = new SplittableRandom(100 + seed);
        Installation installation = Installations.random(random);
        Circuit circuit = InstallationCircuit.of(installation, MainsNetwork.CISPR_9_KHZ);
        CircuitSolver solver = circuit.solver().tune(9e3 * Math.pow(30e6 / 9e3, random.nextDouble()));
        solver.excite(InstallationCircuit.COMMON_MODE_SOURCE);
        Phasor first = null;
        for (String line : InstallationCircuit.lines(installation)) {
            Phasor level = solver.voltage(MainsNetwork.terminal(line));
            first = first == null ? level : first;
            assertThat(level.minus(first).modulus()).isLessThan(1e-9 * first.modulus());
        }
    }
}
