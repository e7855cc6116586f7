package undermask.unit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

class DimensionTest {
    /** Source: SI brochure, prefixes pico to giga. */
    @ParameterizedTest
    @CsvSource({
        "Hz, FREQUENCY, 1",
        "kHz, FREQUENCY, 1e3",
        "MHz, FREQUENCY, 1e6",
        "GHz, FREQUENCY, 1e9",
        "mHz, FREQUENCY, 1e-3",
        "ps, TIME, 1e-12",
        "ns, TIME, 1e-9",
        "us, TIME, 1e-6",
        "µs, TIME, 1e-6",
        "\u03bcs, TIME, 1e-6",
        "min, TIME, 60",
        "h, TIME, 3600",
        "cm, LENGTH, 0.01",
        "mm, LENGTH, 1e-3",
        "km, LENGTH, 1e3",
        "m, LENGTH, 1",
        "kohm, RESISTANCE, 1e3",
        "mohm, RESISTANCE, 1e-3",
        "m\u03a9, RESISTANCE, 1e-3",
        "k\u2126, RESISTANCE, 1e3",
        "kV/us, SLEW, 1e9",
        "kV/µs, SLEW, 1e9",
        "V/ns, SLEW, 1e9",
        "V/s, SLEW, 1",
        "pF/m, CAPACITANCE_PER_LENGTH, 1e-12",
        "uH/m, INDUCTANCE_PER_LENGTH, 1e-6",
        "m\u03a9/m, RESISTANCE_PER_LENGTH, 1e-3",
        "nF, CAPACITANCE, 1e-9",
        "mH, INDUCTANCE, 1e-3",
        "kW, POWER, 1e3",
        "mA, CURRENT, 1e-3",
        "%, NUMBER, 0.01",
        "dB, DECIBEL, 1",
        "dBµV, LEVEL, 1",
        "dB\u03bcV, LEVEL, 1",
        "degC, TEMPERATURE, 1",
        "°C, TEMPERATURE, 1"
    })
    void knowsPrefixesAndBothWaysToWriteMicroAndOhm(String symbol, Dimension dimension, double factor) {
        assertThat(dimension.factor(symbol).orElseThrow()).isCloseTo(factor, within(factor * 1e-15));
        assertThat(Dimension.of(symbol)).hasValue(dimension);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "khz", "HZ", "hz", "KHz", "Kohm", "kOhm", "uuH", "k", "u", "1", "kmin", "mcm", "kV/", "/us", "V/m",
                "k%", "mdB"
            })
    void knowsNothingElse(String symbol) {
        assertThat(Dimension.of(symbol)).isEmpty();
    }

    @ParameterizedTest
    @EnumSource(Dimension.class)
    void takesItsOwnUnitsAndThoseThatItNamesButNoOthers(Dimension dimension) {
        assertThat(dimension.factor(dimension.siSymbol())).hasValue(1.0);
        for (String example : dimension.examples().replace("none or ", "").split(", | or ")) {
            assertThat(Dimension.of(example)).as(example).hasValue(dimension);
        }
        for (Dimension other : Dimension.values()) {
            if (other != dimension) {
                assertThat(other.factor(dimension.siSymbol())).as(other.words()).isEmpty();
            }
        }
    }

    @Test
    void onlyAPureNumberGoesWithoutUnit() {
        assertThat(Dimension.of("")).hasValue(Dimension.NUMBER);
        assertThat(Dimension.LENGTH.factor("")).isEmpty();
    }

    @Test
    void wordsKeepTheirDotsInEveryLocale() {
        assertThat(Dimension.INDUCTANCE_PER_LENGTH.words()).isEqualTo("inductance per length");
    }
}
