package undermask.network;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.assertThatIllegalStateException;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;

class CircuitTest {
    private static final String GROUND = "ground";

    private static Circuit.Builder divider() {
        return Circuit.around(GROUND)
                .voltageSource("v", "in", GROUND)
                .resistor("in", "out", 10)
                .resistor("out", GROUND, 10);
    }

    @Test
    void namesNodesAndSourcesInTheirOrder() {
        Circuit circuit = divider().build();
        assertThat(circuit.reference()).isEqualTo(GROUND);
        assertThat(circuit.nodes()).containsExactly("in", "out");
        assertThat(circuit.sources()).containsExactly("v");
    }

    @Test
    void staysAsItWasBuilt() {
        Circuit.Builder builder = divider();
        Circuit circuit = builder.build();
        builder.resistor("out", GROUND, 1e-3).resistor("out", "more", 1);
        assertThat(circuit.nodes()).containsExactly("in", "out");
        assertThat(circuit.solver().tune(1e3).excite("v").voltage("out").re()).isEqualTo(0.5);
    }

    @Test
    void referenceIsZero() {
        assertThat(divider().build().solver().tune(1e3).excite("v").voltage(GROUND))
                .isEqualTo(new Phasor(0, 0));
    }

    @Test
    void floatingPartIsNamed() {
        Circuit circuit = divider().resistor("island", "shore", 5).build();
        assertThatIllegalStateException()
                .isThrownBy(() -> circuit.solver().tune(1e6))
                .withMessageMatching("the circuit is singular at 1000000\\.0 Hz: node (island|shore) is undetermined");
    }

    @Test
    void floatingPartOfWidelyDifferentPartsIsNamed() {
        Circuit circuit = divider()
                .resistor("island", "shore", 1e-3)
                .capacitor("shore", "reef", 1e-12)
                .inductor("reef", "island", 1e-6)
                .build();
        assertThatIllegalStateException()
                .isThrownBy(() -> circuit.solver().tune(9e3))
                .withMessageContaining("is undetermined");
    }

    @Test
    void looselyTiedPartIsSolved() {
        Phasor z = divider()
                .capacitor("out", "island", 1e-12)
                .resistor("island", "shore", 1e-3)
                .build()
                .solver()
                .tune(9e3)
                .impedance("shore", "out");
        assertThat(z.im()).isCloseTo(-1 / (2 * Math.PI * 9e3 * 1e-12), within(1.0));
    }

    @Test
    void contradictingSourcesAreNamed() {
        Circuit circuit = divider().voltageSource("w", "in", GROUND).build();
        assertThatIllegalStateException()
                .isThrownBy(() -> circuit.solver().tune(1e3))
                .withMessageContaining("the current of voltage source w is undetermined");
    }

    @Test
    void unknownNamesAreRefused() {
        CircuitSolver solver = divider().build().solver().tune(1e3);
        assertThatIllegalArgumentException()
                .isThrownBy(() -> solver.voltage("nowhere"))
                .withMessage("the circuit has no node nowhere");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> solver.excite("nothing"))
                .withMessage("the circuit has no source nothing");
    }

    @Test
    void sourceOfTheSameNameIsRefused() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> divider().currentSource("v", "out", GROUND))
                .withMessage("the circuit has two sources named v");
    }

    @Test
    void valuesOutOfRangeAreRefused() {
        Circuit.Builder circuit = divider();
        assertThatIllegalArgumentException()
                .isThrownBy(() -> circuit.resistor("in", "out", 0))
                .withMessageContaining("resistance");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> circuit.capacitor("in", "out", Double.NaN))
                .withMessageContaining("capacitance");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> circuit.seriesResonant("in", "out", -1, 0, 1e-6))
                .withMessageContaining("resistance");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> circuit.build().solver().tune(0))
                .withMessageContaining("frequency");
    }

    @Test
    void unsolvedCircuitIsNotRead() {
        assertThatIllegalStateException()
                .isThrownBy(() -> divider().build().solver().excite("v"))
                .withMessageContaining("not tuned");
    }

    @Test
    void windingsWithoutLeakageAreRefused() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> divider().coupledCoils(List.of("in", "out"), List.of(GROUND, GROUND), new double[][] {
                    {1e-3, 2e-3}, {2e-3, 4e-3}
                }))
                .withMessageContaining("winding 2 has no inductance of its own");
    }

    @Test
    void lopsidedInductanceIsRefused() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> divider().coupledCoils(List.of("in", "out"), List.of(GROUND, GROUND), new double[][] {
                    {1e-3, 2e-4}, {1e-4, 4e-3}
                }))
                .withMessageContaining("one way");
    }
}
