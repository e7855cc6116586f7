package undermask.input;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class NearestNameTest {
    private static final List<String> KNOWN = List.of("dead time", "boost", "load current", "link voltage", "MOTOR I");

    @ParameterizedTest
    @CsvSource({
        "dead tiem, dead time", // swapped
        "dedtime, dead time", // left out
        "booost, boost", // added
        "lood current, load current", // replaced
        "current, load current", // a part of it
        "Link Voltage, link voltage",
        "motor i, MOTOR I" // also where the locale has a dotless i
    })
    void findsWhatWasMeant(String written, String meant) {
        assertThat(NearestName.of(written, KNOWN)).hasValue(meant);
    }

    @Test
    void ofEqualsTheOneThatBeginsAlike() {
        assertThat(NearestName.of("filter-3ph-30a", List.of("filter-1ph-10a", "filter-3ph-42a")))
                .hasValue("filter-3ph-42a");
    }

    @Test
    void guessesNothingFarOff() {
        assertThat(NearestName.of("acceleration", KNOWN)).isEmpty();
        assertThat(NearestName.of("", KNOWN)).isEmpty();
        assertThat(NearestName.of("boost", List.of())).isEmpty();
    }
}
