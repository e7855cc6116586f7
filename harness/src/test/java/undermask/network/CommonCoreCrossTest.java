package undermask.network;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import undermask.installation.Material;

class CommonCoreCrossTest {
    private static final Material CONSTANT =
            new Material("constant", List.of(1e6), List.of(1000.0), List.of(0.0), 0.4, "test");

    // Source: the other way inverts the inductance matrix by its Cholesky factor; a material of hardly any loss is a
    // constant inductance.
    @ParameterizedTest
    @ValueSource(doubles = {1e4, 1e5, 1e6, 1e7})
    void aConstantMaterialIsAnInductanceMatrix(double frequency) {
        double shared = 2e-3;
        double leakage = 20e-6;
        double[][] matrix = new double[3][3];
        for (int i = 0; i < 3; i++) {
            for (int j = 0; j < 3; j++) {
                matrix[i][j] = shared + (i == j ? leakage : 0);
            }
        }
        List<String> starts = List.of("a", "b", "c");
        List<String> ends = List.of("d", "e", "f");
        Circuit.Builder coils = Circuit.around("ground").coupledCoils(starts, ends, matrix);
        Circuit.Builder core = Circuit.around("ground").commonCore(starts, ends, leakage, shared, CONSTANT);
        for (Circuit.Builder circuit : List.of(coils, core)) {
            circuit.resistor("a", "ground", 50)
                    .resistor("b", "ground", 70)
                    .resistor("c", "ground", 90)
                    .resistor("d", "ground", 10)
                    .resistor("e", "ground", 20)
                    .resistor("f", "ground", 30)
                    .currentSource("source", "a", "ground");
        }
        CircuitSolver one = coils.build().solver().tune(frequency).excite("source");
        CircuitSolver other = core.build().solver().tune(frequency).excite("source");
        for (String node : List.of("a", "b", "c", "d", "e", "f")) {
            Phasor expected = one.voltage(node);
            // the loss that a material must have is a millionth of its permeability
            assertThat(other.voltage(node).minus(expected).modulus())
                    .isLessThan(2e-5 * one.voltage("a").modulus());
        }
    }
}
