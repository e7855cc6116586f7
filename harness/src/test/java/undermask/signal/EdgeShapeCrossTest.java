package undermask.signal;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class EdgeShapeCrossTest {
    private static final double TAU = 100e-9;

    static Stream<EdgeShape> shapes() {
        return Stream.of(new ExponentialEdge(TAU), new RampEdge(TAU), new RaisedCosineEdge(TAU));
    }

    static Stream<EdgeShape> ringing() {
        return shapes().map(shape -> new RingingEdge(shape, 6e6, 0.15, 0.3));
    }

    // Source: the factor is the Fourier transform of the edge's derivative; here summed step by step in time.
    @ParameterizedTest
    @MethodSource({"shapes", "ringing"})
    void factorIsTheTransformOfTheEdgeInTime(EdgeShape shape) {
        double[] factor = new double[2];
        for (double frequency : new double[] {1e3, 1e6, 3.18e6, 5e6, 10e6, 17e6, 30e6}) {
            double re = 0;
            double im = 0;
            int slices = shape instanceof RingingEdge ? 8_000 : 400_000;
            double from = -20 * TAU;
            double slice = 40 * TAU / slices;
            for (int i = 0; i < slices; i++) {
                double at = from + i * slice;
                double rise = shape.response(at + slice) - shape.response(at);
                double angle = -2 * Math.PI * frequency * (at + slice / 2 + shape.lead());
                re += rise * Math.cos(angle);
                im += rise * Math.sin(angle);
            }
            shape.factor(frequency, factor);
            assertThat(factor[0]).as("%s at %s Hz", shape, frequency).isCloseTo(re, within(tolerance(shape)));
            assertThat(factor[1]).as("%s at %s Hz", shape, frequency).isCloseTo(im, within(tolerance(shape)));
        }
    }

    /** The time response of ringing is itself a sum over slices. */
    private static double tolerance(EdgeShape shape) {
        return shape instanceof RingingEdge ? 2e-3 : 1e-6;
    }

    @ParameterizedTest
    @MethodSource("shapes")
    void changesNoVoltSeconds(EdgeShape shape) {
        double sum = 0;
        int slices = 400_000;
        double slice = 40 * TAU / slices;
        for (int i = 0; i < slices; i++) {
            double at = -20 * TAU + (i + 0.5) * slice;
            sum += (shape.response(at) - (at > 0 ? 1 : 0)) * slice;
        }
        assertThat(sum).isCloseTo(0, within(1e-5 * TAU));
    }

    // Source: corner of the trapezoid envelope at 1/(πτ), from there 20 dB per decade; standard, e.g. Paul,
    // Introduction to Electromagnetic Compatibility, from memory. On the corner one pole stands 3 dB below.
    @Test
    void exponentialEdgeTouchesTheTrapezoidEnvelopeAndHasNoNull() {
        double[] factor = new double[2];
        for (double frequency = 1e4; frequency < 1e9; frequency *= 1.05) {
            new ExponentialEdge(TAU).factor(frequency, factor);
            double envelope = Math.min(1, 1 / (Math.PI * frequency * TAU));
            double below = 20 * Math.log10(envelope / Math.hypot(factor[0], factor[1]));
            assertThat(below).isBetween(0.0, 3.02);
        }
    }

    // Source: sin(πfτ)/(πfτ) and cos(πfτ)/(1 − (2fτ)²) vanish at n/τ and at 1.5/τ, 2.5/τ.
    @Test
    void rampAndRaisedCosineHaveTheirNulls() {
        double[] factor = new double[2];
        new RampEdge(TAU).factor(2 / TAU, factor);
        assertThat(Math.abs(factor[0])).isLessThan(1e-12);
        new RaisedCosineEdge(TAU).factor(1.5 / TAU, factor);
        assertThat(Math.abs(factor[0])).isLessThan(1e-12);
        new RaisedCosineEdge(TAU).factor(0.5 / TAU, factor);
        assertThat(factor[0]).isCloseTo(Math.PI / 4, within(1e-12));
    }

    @Test
    void refusesATransitionOfNoLength() {
        assertThatThrownBy(() -> new RampEdge(0)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new ExponentialEdge(Double.NaN)).isInstanceOf(IllegalArgumentException.class);
    }
}
