package undermask.network;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.hipparchus.complex.Complex;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The solver against closed forms worked out by hand. */
class CircuitCrossTest {
    private static final String GROUND = "ground";

    private static Complex s(double frequency) {
        return new Complex(0, 2 * Math.PI * frequency);
    }

    private static Complex parallel(Complex a, Complex b) {
        return a.multiply(b).divide(a.add(b));
    }

    private static void agrees(Phasor solved, Complex byHand) {
        assertThat(new Complex(solved.re(), solved.im()).subtract(byHand).norm())
                .isLessThan(1e-9 * byHand.norm());
    }

    // Source: continued fraction of the ladder
    @ParameterizedTest
    @ValueSource(doubles = {1e3, 9e3, 150e3, 2e6, 30e6})
    void ladder(double f) {
        CircuitSolver solver = Circuit.around(GROUND)
                .voltageSource("v", "in", GROUND)
                .coil("in", "a", 3, 10e-6)
                .seriesResonant("a", GROUND, 0.1, 20e-9, 100e-9)
                .inductor("a", "b", 47e-6)
                .capacitor("b", GROUND, 2.2e-9)
                .resistor("b", GROUND, 50)
                .build()
                .solver()
                .tune(f);
        Complex s = s(f);
        Complex load = parallel(new Complex(50), s.multiply(2.2e-9).reciprocal());
        Complex behind = s.multiply(47e-6).add(load);
        Complex shunt = s.multiply(20e-9).add(0.1).add(s.multiply(100e-9).reciprocal());
        Complex atA = parallel(shunt, behind);
        Complex first = s.multiply(10e-6).add(3);
        Complex voltageA = atA.divide(atA.add(first));
        agrees(solver.excite("v").voltage("a"), voltageA);
        agrees(solver.voltage("b"), voltageA.multiply(load.divide(behind)));
        agrees(solver.impedance("a", GROUND), parallel(atA, first));
    }

    // Source: transformer equations; primary V1 = sL1·I1 + sM·I2, secondary closed by R
    @ParameterizedTest
    @ValueSource(doubles = {1e3, 50e3, 1e6, 30e6})
    void loadedTransformer(double f) {
        double l1 = 1e-3;
        double l2 = 4e-3;
        double m = 0.95 * Math.sqrt(l1 * l2);
        CircuitSolver solver = Circuit.around(GROUND)
                .currentSource("i", "primary", GROUND)
                .coupledCoils(
                        List.of("primary", "secondary"), List.of(GROUND, "away"), new double[][] {{l1, m}, {m, l2}})
                .resistor("secondary", "away", 330)
                .resistor("away", GROUND, 7)
                .build()
                .solver()
                .tune(f);
        Complex s = s(f);
        Complex reflected =
                s.multiply(m).multiply(s.multiply(m)).divide(s.multiply(l2).add(330));
        agrees(solver.excite("i").voltage("primary"), s.multiply(l1).subtract(reflected));
        Complex secondary = s.multiply(m).multiply(330).divide(s.multiply(l2).add(330));
        agrees(solver.voltage("secondary").minus(solver.voltage("away")), secondary);
        assertThat(solver.voltage("away").modulus()).isLessThan(1e-9 * secondary.norm());
    }

    // Source: telegraph equations, Zin = Zc·(Zl + Zc·tanh γl)/(Zc + Zl·tanh γl)
    @ParameterizedTest
    @ValueSource(doubles = {9e3, 150e3, 1.7e6, 12e6, 30e6})
    void terminatedLine(double f) {
        LossyLine line = new LossyLine(37, 120e-9, 430e-12, 40e-3, 1e6, 0.02);
        CircuitSolver solver = Circuit.around(GROUND)
                .voltageSource("v", "near", GROUND)
                .line("near", GROUND, "far", GROUND, line)
                .coil("far", GROUND, 12, 2e-6)
                .resistor("near", GROUND, 1e6)
                .build()
                .solver()
                .tune(f);
        Complex s = s(f);
        Complex series = s.multiply(120e-9).add(40e-3 * Math.sqrt(f / 1e6));
        Complex shunt = s.multiply(430e-12).add(2 * Math.PI * f * 430e-12 * 0.02);
        Complex angle = series.multiply(shunt).sqrt().multiply(37);
        Complex wave = series.divide(shunt).sqrt();
        Complex load = s.multiply(2e-6).add(12);
        Complex far = load.divide(load.multiply(angle.cosh()).add(wave.multiply(angle.sinh())));
        agrees(solver.excite("v").voltage("far"), far);
    }

    // Source: the same; with both conductors lifted, the far voltage rides on that of the return conductor
    @ParameterizedTest
    @ValueSource(doubles = {150e3, 5e6, 30e6})
    void lineRidesOnItsReturnConductor(double f) {
        LossyLine line = new LossyLine(5, 120e-9, 430e-12, 40e-3, 1e6, 0.02);
        Circuit.Builder lifted = Circuit.around(GROUND)
                .voltageSource("v", "core", "shield")
                .line("core", "shield", "far core", "far shield", line)
                .resistor("far core", "far shield", 20)
                .coil("shield", "far shield", 0.05, 4.5e-6)
                .resistor("far shield", GROUND, 3);
        Circuit.Builder earthed = Circuit.around(GROUND)
                .voltageSource("v", "core", GROUND)
                .line("core", GROUND, "far core", GROUND, line)
                .resistor("far core", GROUND, 20);
        CircuitSolver solver = lifted.build().solver().tune(f).excite("v");
        Phasor plain = earthed.build().solver().tune(f).excite("v").voltage("far core");
        agrees(solver.voltage("far core").minus(solver.voltage("far shield")), new Complex(plain.re(), plain.im()));
        // nothing drives current through shield and earth
        assertThat(solver.voltage("far shield").modulus()).isLessThan(1e-9);
        assertThat(solver.voltage("shield").modulus()).isLessThan(1e-9);
    }

    // Source: definition; an impedance of its own law beside the same made of parts
    @ParameterizedTest
    @ValueSource(doubles = {9e3, 1e6, 30e6})
    void impedanceOfItsOwnLaw(double f) {
        Phasor z = Circuit.around(GROUND)
                .impedance("a", GROUND, frequency -> new Phasor(4 * Math.sqrt(frequency / 1e6), frequency * 1e-5))
                .resistor("a", GROUND, 100)
                .build()
                .solver()
                .tune(f)
                .impedance("a", GROUND);
        agrees(z, parallel(new Complex(4 * Math.sqrt(f / 1e6), f * 1e-5), new Complex(100)));
    }

    // Source: superposition; a voltage source at rest is a short circuit, a current source is open
    @ParameterizedTest
    @ValueSource(doubles = {9e3, 1e6})
    void sourcesAtRest(double f) {
        CircuitSolver solver = Circuit.around(GROUND)
                .voltageSource("v", "a", GROUND)
                .resistor("a", "b", 30)
                .resistor("b", GROUND, 60)
                .currentSource("i", "b", GROUND)
                .build()
                .solver()
                .tune(f);
        agrees(solver.excite("v").voltage("b"), new Complex(2.0 / 3));
        agrees(solver.excite("i").voltage("b"), new Complex(20));
        assertThat(solver.voltage("a").modulus()).isLessThan(1e-12);
    }
}
