package undermask.unit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.Locale;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Under a locale with decimal commas and a dotless i. */
class FiguresTest {
    private final Locale before = Locale.getDefault();

    @BeforeEach
    void speakTurkish() {
        Locale.setDefault(new Locale("tr", "TR"));
    }

    @AfterEach
    void speakAsBefore() {
        Locale.setDefault(before);
    }

    @ParameterizedTest
    @CsvSource({
        "4000, FREQUENCY, 4, 4 kHz",
        "150e3, FREQUENCY, 4, 150 kHz",
        "999.97, FREQUENCY, 4, 1 kHz",
        "999.97, FREQUENCY, 5, 999.97 Hz",
        "1e-6, TIME, 3, 1 µs",
        "0, TIME, 3, 0 s",
        "470e-6, CAPACITANCE, 3, 470 µF",
        "-2, LENGTH, 3, -2 m",
        "2.5e9, SLEW, 3, 2.5 kV/us",
        "0.8, NUMBER, 3, 0.8",
        "45.678, DECIBEL, 3, 45.7 dB",
        "66, LEVEL, 3, 66 dBuV",
        "40, TEMPERATURE, 3, 40 degC",
        "600e-12, CAPACITANCE_PER_LENGTH, 3, 600 pF/m",
        "1e-15, CAPACITANCE, 3, 0.001 pF",
        "5e12, FREQUENCY, 3, 5000 GHz"
    })
    void takesAFittingPrefix(double value, Dimension dimension, int digits, String text) {
        assertThat(Figures.withUnit(value, dimension, digits)).isEqualTo(text);
    }

    @ParameterizedTest
    @CsvSource({"0.00125, 3, 0.00125", "4000.4, 3, 4000", "123456, 2, 120000", "0, 3, 0", "1e-9, 1, 0.000000001"})
    void writesSignificantDigitsWithoutExponent(double value, int digits, String text) {
        assertThat(Figures.significant(value, digits)).isEqualTo(text);
    }

    @ParameterizedTest
    @CsvSource({"12.34, 1, 12.3", "-0.04, 1, 0.0", "-0.06, 1, -0.1", "1234567, 2, 1234567.00", "-0.4, 0, 0"})
    void writesFixedDecimalsWithAPoint(double value, int decimals, String text) {
        assertThat(Figures.fixed(value, decimals)).isEqualTo(text);
    }

    @Test
    void aRangeNamesValueAndLimits() {
        Range carrier = new Range("carrier frequency", Dimension.FREQUENCY, 500, 40e3);
        assertThat(carrier.check(40e3)).isEqualTo(40e3);
        assertThatThrownBy(() -> carrier.check(4e6))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("carrier frequency is 4 MHz; allowed: 500 Hz to 40 kHz");
        assertThatThrownBy(() -> carrier.check(Double.NaN)).hasMessageContaining("NaN Hz");
        assertThatThrownBy(() -> new Range("x", Dimension.TIME, 2, 1)).hasMessageContaining("empty");
    }

    @Test
    void aPlaceIsClickable() {
        assertThat(new Place("a.csv", 3, 19)).hasToString("a.csv:3:19");
        assertThat(new Place("a.csv", 3, 0)).hasToString("a.csv:3");
        assertThat(Place.of("a.csv")).hasToString("a.csv").isLessThan(new Place("a.csv", 1, 1));
        assertThat(new Place("a.csv", 10, 1))
                .isGreaterThan(new Place("a.csv", 9, 5))
                .isLessThan(Place.of("b.csv"));
    }
}
