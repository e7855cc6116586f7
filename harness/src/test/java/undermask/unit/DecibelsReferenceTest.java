package undermask.unit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class DecibelsReferenceTest {
    /** Source: definition of dBµV, 20·log10(V / 1 µV); 107 dBµV in 50 ohm are the 0 dBm of every receiver's scale. */
    @ParameterizedTest
    @CsvSource({"1e-6, 0, 1e-9", "1e-3, 60, 1e-9", "1, 120, 1e-9", "0.2236, 106.99, 0.005", "2e-3, 66.02, 0.005"})
    void levelsOfVoltages(double volts, double levelDbuv, double tolerance) {
        assertThat(Decibels.dbuv(volts)).isCloseTo(levelDbuv, within(tolerance));
        assertThat(Decibels.voltsRms(levelDbuv)).isCloseTo(volts, within(volts * 1e-3));
    }

    @Test
    void nothingIsInfinitelyFarDown() {
        assertThat(Decibels.dbuv(0)).isEqualTo(Double.NEGATIVE_INFINITY);
        assertThat(Decibels.toRatio(-20)).isCloseTo(0.1, within(1e-15));
    }
}
