package undermask.network;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.SplittableRandom;
import java.util.stream.IntStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class CircuitLawTest {
    private static final String GROUND = "ground";
    private static final int NODES = 9;

    static IntStream seeds() {
        return IntStream.range(0, 60);
    }

    private static double logarithmic(SplittableRandom random, double low, double high) {
        return low * Math.pow(high / low, random.nextDouble());
    }

    private static String node(int number) {
        return number == 0 ? GROUND : "n" + number;
    }

    /** Every node hangs on an earlier one by a branch; then further branches, a line and coupled coils anywhere. */
    private static Circuit.Builder anyNetwork(SplittableRandom random) {
        Circuit.Builder circuit = Circuit.around(GROUND);
        for (int i = 1; i < NODES; i++) {
            branch(circuit, random, node(i), node(random.nextInt(i)));
        }
        for (int k = 0; k < 10; k++) {
            int from = 1 + random.nextInt(NODES - 1);
            branch(circuit, random, node(from), node(random.nextInt(from)));
        }
        circuit.line(
                node(1),
                node(2),
                node(3),
                node(4),
                new LossyLine(logarithmic(random, 1, 100), 120e-9, 430e-12, 40e-3, 1e6, 0.02));
        double a = logarithmic(random, 1e-6, 1e-3);
        double b = logarithmic(random, 1e-6, 1e-3);
        double coupled = (random.nextDouble() * 1.98 - 0.99) * Math.sqrt(a * b);
        return circuit.coupledCoils(
                List.of(node(5), node(6)), List.of(node(7), node(8)), new double[][] {{a, coupled}, {coupled, b}});
    }

    private static void branch(Circuit.Builder circuit, SplittableRandom random, String from, String to) {
        switch (random.nextInt(4)) {
            case 0 -> circuit.resistor(from, to, logarithmic(random, 0.1, 1e4));
            case 1 -> circuit.coil(from, to, logarithmic(random, 1e-3, 10), logarithmic(random, 1e-7, 1e-3));
            case 2 ->
                circuit.seriesResonant(
                        from, to, logarithmic(random, 1e-3, 1), 15e-9, 1e-8 * random.nextDouble() + 1e-11);
            default -> circuit.impedance(from, to, f -> new Phasor(Math.sqrt(f) / 100, f / 1e4));
        }
    }

    // Source: reciprocity theorem of networks of R, L, C, M and lines; rounding of a 9-node solve is far below 1e-9
    @ParameterizedTest
    @MethodSource("seeds")
    void reciprocity(int seed) {
        SplittableRandom random = new SplittableRandom(seed);
        Circuit circuit = anyNetwork(random)
                .currentSource("at 2", node(2), GROUND)
                .currentSource("at 7", node(7), node(3))
                .build();
        CircuitSolver solver = circuit.solver().tune(logarithmic(random, 9e3, 30e6));
        solver.excite("at 2");
        Phasor there = solver.voltage(node(7)).minus(solver.voltage(node(3)));
        Phasor back = solver.excite("at 7").voltage(node(2));
        double size = Math.max(
                solver.impedance(node(2), GROUND).modulus(),
                solver.impedance(node(7), node(3)).modulus());
        assertThat(there.minus(back).modulus()).isLessThan(1e-9 * size);
    }

    // Source: a network of passive parts takes power at every pair of nodes
    @ParameterizedTest
    @MethodSource("seeds")
    void passivity(int seed) {
        SplittableRandom random = new SplittableRandom(1000 + seed);
        CircuitSolver solver = anyNetwork(random).build().solver().tune(logarithmic(random, 9e3, 30e6));
        for (int i = 0; i < NODES; i++) {
            for (int j = 0; j < i; j++) {
                Phasor z = solver.impedance(node(i), node(j));
                assertThat(z.re()).isGreaterThan(-1e-9 * z.modulus());
            }
        }
    }

    // Source: Norton's theorem: a voltage behind a resistance acts as a current beside it
    @ParameterizedTest
    @MethodSource("seeds")
    void theveninIsNorton(int seed) {
        double frequency = logarithmic(new SplittableRandom(seed), 9e3, 30e6);
        double resistance = 1 + 20 * seed;
        Phasor byVoltage = anyNetwork(new SplittableRandom(2000 + seed))
                .voltageSource("v", "emf", node(6))
                .resistor("emf", node(2), resistance)
                .build()
                .solver()
                .tune(frequency)
                .excite("v")
                .voltage(node(5));
        Phasor byCurrent = anyNetwork(new SplittableRandom(2000 + seed))
                .currentSource("i", node(2), node(6))
                .resistor(node(2), node(6), resistance)
                .build()
                .solver()
                .tune(frequency)
                .excite("i")
                .voltage(node(5))
                .times(1 / resistance);
        assertThat(byVoltage.minus(byCurrent).modulus()).isLessThan(1e-9 * Math.max(1, byVoltage.modulus()));
    }

    // Source: an open line without losses is a short circuit at (2n + 1)·v/(4l) and open at n·v/(2l)
    @ParameterizedTest
    @ValueSource(ints = {0, 1, 2, 5, 20})
    void openLineResonances(int n) {
        double length = 12;
        LossyLine line = new LossyLine(length, 120e-9, 430e-12, 0, 1e6, 0);
        double velocity = 1 / Math.sqrt(120e-9 * 430e-12);
        double wave = Math.sqrt(120e-9 / 430e-12);
        CircuitSolver solver = Circuit.around(GROUND)
                .line("near", GROUND, "far", GROUND, line)
                .build()
                .solver();
        double quarter = (2 * n + 1) * velocity / (4 * length);
        // between two resonances the reactance runs as −Zc·cot βl: odd about each resonance
        for (double offset : new double[] {1e-3, 0.1, 0.3}) {
            double shift = offset * velocity / (4 * length);
            Phasor below = solver.tune(quarter - shift).impedance("near", GROUND);
            Phasor above = solver.tune(quarter + shift).impedance("near", GROUND);
            double expected = wave * Math.tan(Math.PI / 2 * offset);
            assertThat(below.im()).isCloseTo(-expected, within(1e-7 * wave));
            assertThat(above.im()).isCloseTo(expected, within(1e-7 * wave));
            assertThat(below.re()).isCloseTo(0, within(1e-7 * wave));
        }
    }
}
