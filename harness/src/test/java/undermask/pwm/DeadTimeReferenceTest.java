package undermask.pwm;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.withinPercentage;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import undermask.drive.CarrierSampling;
import undermask.drive.Modulation;
import undermask.drive.OperatingPoint;

class DeadTimeReferenceTest {
    private static final double CARRIER = 8000;
    private static final double DEAD_TIME = 2e-6;

    // Source: a square wave of height t_d·f_c·V_dc against the current, (4/(nπ))·t_d·f_c·V_dc peak on line n; the
    // worked example 565 V, 2 µs, 8 kHz: 9.04 V, on lines 1, 5 and 7: 11.5, 2.30 and 1.64 V peak. Standard, from
    // memory.
    @ParameterizedTest(name = "line {0} at power factor {2}")
    @CsvSource({"1, 11.5, 1", "5, 2.30, 1", "7, 1.64, 1", "1, 11.5, 0.6", "5, 2.30, 0.6", "7, 1.64, 0.6"})
    void takesASquareWaveFromTheLeg(int line, double peak, double powerFactor) {
        double[] lost = lost(CarrierSampling.NATURAL, line, powerFactor);
        assertThat(2 * Math.hypot(lost[0], lost[1])).isCloseTo(peak, withinPercentage(2));
    }

    // Source: the same square wave, which stands against the current: on line n it lags by n times the load's angle.
    @ParameterizedTest(name = "power factor {0}")
    @CsvSource({"1", "0.8", "0.5", "0.1"})
    void lostFundamentalIsInPhaseWithTheCurrent(double powerFactor) {
        double[] lost = lost(CarrierSampling.TWICE, 1, powerFactor);
        double lag = -Math.atan2(lost[1], lost[0]);
        // a sampled reference itself lags by half a sample, which the difference of the two does not see
        assertThat(Math.toDegrees(lag))
                .isCloseTo(Math.toDegrees(Math.acos(powerFactor)), org.assertj.core.api.Assertions.within(2.0));
    }

    private static double[] lost(CarrierSampling sampling, int line, double powerFactor) {
        OperatingPoint point = new OperatingPoint(Bridges.OUTPUT, 8, powerFactor);
        double[][] with = Bridges.lines(
                Bridges.switched(Bridges.settings(CARRIER, Modulation.SINE_TRIANGLE, sampling, DEAD_TIME, 0.8), point)
                        .leg(0),
                line);
        double[][] without = Bridges.lines(
                Bridges.switched(Bridges.settings(CARRIER, Modulation.SINE_TRIANGLE, sampling, 0, 0.8), point)
                        .leg(0),
                line);
        return new double[] {without[0][line] - with[0][line], without[1][line] - with[1][line]};
    }
}
