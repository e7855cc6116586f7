package undermask.pwm;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.stream.DoubleStream;
import java.util.stream.Stream;
import org.hipparchus.special.BesselJ;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import undermask.drive.CarrierSampling;
import undermask.drive.Modulation;

/**
 * Sine-triangle against the double Fourier series, summed over all carrier groups and sidebands that fall on a line.
 *
 * <p>Source: Holmes and Lipo, Pulse Width Modulation for Power Converters (2003) ch. 3, from memory.
 */
class ClosedFormCrossTest {
    private static final int HIGHEST = 1000;
    /** Share of the largest line. */
    private static final double CLOSE = 1e-6;

    static Stream<Arguments> cases() {
        return Stream.of(CarrierSampling.values())
                .flatMap(sampling -> DoubleStream.of(0.2, 0.8, 1.0)
                        .boxed()
                        .flatMap(index -> Stream.of(21, 50, 201).map(ratio -> Arguments.of(sampling, index, ratio))));
    }

    @ParameterizedTest(name = "{0}, M = {1}, {2} carrier periods")
    @MethodSource("cases")
    void legLineToLineAndCommonMode(CarrierSampling sampling, double index, int ratio) {
        Bridge bridge = Bridges.without(Modulation.SINE_TRIANGLE, sampling, ratio, index);
        double[][] leg = Bridges.lines(bridge.leg(0), HIGHEST);
        double[][] line = Bridges.lines(bridge.lineToLine(), HIGHEST);
        double[][] common = Bridges.lines(bridge.commonMode(), HIGHEST);
        double[][] expectedLeg = series(sampling, index, ratio, 0);
        double[][] expectedSecond = series(sampling, index, ratio, 1);
        double[][] expectedThird = series(sampling, index, ratio, 2);
        double largest = 0;
        for (int n = 1; n <= HIGHEST; n++) {
            largest = Math.max(largest, Math.hypot(expectedLeg[0][n], expectedLeg[1][n]));
        }
        for (int n = 1; n <= HIGHEST; n++) {
            for (int part = 0; part < 2; part++) {
                double a = expectedLeg[part][n];
                double b = expectedSecond[part][n];
                double c = expectedThird[part][n];
                assertThat(leg[part][n]).as("leg, line %d", n).isCloseTo(a, within(CLOSE * largest));
                assertThat(line[part][n]).as("line to line, line %d", n).isCloseTo(a - b, within(2 * CLOSE * largest));
                assertThat(common[part][n])
                        .as("common mode, line %d", n)
                        .isCloseTo((a + b + c) / 3, within(CLOSE * largest));
            }
        }
    }

    /**
     * Coefficients of a leg. With the carrier +1 at t = 0 and the leg high while its reference exceeds it, the carrier
     * angle of the books, 0 in the middle of the high pulse, is half a turn on.
     */
    private static double[][] series(CarrierSampling sampling, double index, int ratio, int leg) {
        double[] re = new double[HIGHEST + 1];
        double[] im = new double[HIGHEST + 1];
        int groups = HIGHEST / ratio + 8;
        for (int m = 0; m <= groups; m++) {
            for (int n = m == 0 ? 1 : -HIGHEST; n <= HIGHEST; n++) {
                int line = m * ratio + n;
                if (Math.abs(line) > HIGHEST || line == 0) {
                    continue;
                }
                double amplitude = amplitude(sampling, index, ratio, m, n);
                if (amplitude == 0) {
                    continue;
                }
                double angle = m * Math.PI - n * leg * 2 * Math.PI / 3 - n * sampleAge(sampling) * 2 * Math.PI / ratio;
                double sign = line > 0 ? 1 : -1;
                re[Math.abs(line)] += amplitude / 2 * Math.cos(angle);
                im[Math.abs(line)] += sign * amplitude / 2 * Math.sin(angle);
            }
        }
        return new double[][] {re, im};
    }

    /**
     * By how many carrier periods a sample is older than the books' formulas have it: they place it in the middle of
     * the time that it serves, here it is taken at the start.
     */
    private static double sampleAge(CarrierSampling sampling) {
        return switch (sampling) {
            case NATURAL -> 0;
            case ONCE -> 0.5;
            case TWICE -> 0.25;
        };
    }

    private static double amplitude(CarrierSampling sampling, double index, int ratio, int m, int n) {
        double half = Bridges.LINK / 2;
        if (m == 0 && sampling == CarrierSampling.NATURAL) {
            return n == 1 ? half * index : 0;
        }
        double q = sampling == CarrierSampling.NATURAL ? m : m + (double) n / ratio;
        double turn = (sampling == CarrierSampling.ONCE ? q : m) + n;
        if (Math.abs(q) < 1e-12) {
            return 0; // the mean of the leg, no line
        }
        return half * 4 / (Math.PI * q) * bessel(n, q * Math.PI * index / 2) * Math.sin(turn * Math.PI / 2);
    }

    private static double bessel(int order, double x) {
        double even = Math.abs(order) % 2 == 0 ? 1 : -1;
        double sign = (order < 0 ? even : 1) * (x < 0 ? even : 1);
        return Math.abs(order) > Math.abs(x) + 80 ? 0 : sign * BesselJ.value(Math.abs(order), Math.abs(x));
    }
}
