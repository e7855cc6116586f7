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
        Transfer transfer = network.ports().get(0).commonMode();
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

    // Source: symmetry; in common mode the lines that share a rail carry the same, and so do both of a single-phase
    // supply
    @ParameterizedTest
    @MethodSource("seeds")
    void linesOfARailReadAlike(int seed) {
        SplittableRandom random = new SplittableRandom(100 + seed);
        Installation installation = Installations.random(random);
        Circuit circuit =
                InstallationNetwork.of(installation, MainsNetwork.CISPR_9_KHZ).circuit();
        CircuitSolver solver = circuit.solver().tune(9e3 * Math.pow(30e6 / 9e3, random.nextDouble()));
        solver.excite(InstallationCircuit.COMMON_MODE_SOURCE);
        java.util.List<String> lines = InstallationCircuit.lines(installation);
        Phasor first = solver.voltage(MainsNetwork.terminal(lines.get(0)));
        Phasor last = solver.voltage(MainsNetwork.terminal(lines.get(lines.size() - 1)));
        assertThat(last.minus(first).modulus()).isLessThan(1e-9 * first.modulus());
    }

    // Source: Kirchhoff; what the link takes comes in on one line and leaves on the other
    @ParameterizedTest
    @MethodSource("seeds")
    void linkCurrentReadsOppositeOnBothLinesOfASinglePhaseSupply(int seed) {
        double frequency = 9e3 * Math.pow(30e6 / 9e3, new SplittableRandom(seed).nextDouble());
        PortResponse response =
                new PortResponse(Installations.singlePhase(5), MainsNetwork.CISPR_9_KHZ, 0, Variation.NONE);
        double[] line = response.linkCurrent(0, frequency).clone();
        double[] neutral = response.linkCurrent(1, frequency);
        double modulus = Math.hypot(line[0], line[1]);
        assertThat(Math.hypot(line[0] + neutral[0], line[1] + neutral[1])).isLessThan(1e-6 * modulus);
    }
}
