package undermask.mask;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import undermask.network.MainsNetwork;
import undermask.receiver.Detector;
import undermask.receiver.ReceiverStandard;

class MaskTest {
    private static Mask mask(LimitSegment... segments) {
        return new Mask("own", "own", "own", ReceiverStandard.CISPR_16, MainsNetwork.CISPR_150_KHZ, List.of(segments));
    }

    /** Source: 47 CFR 15.107(a), decreases with the logarithm of frequency: 19.125 dB per decade from 66 to 56 dBuV. */
    @Test
    void fallsByTheDecade() {
        Mask fcc = mask(new LimitSegment(Detector.QUASI_PEAK, 150e3, 500e3, 66, 56));
        double at150 = fcc.limitDbuv(Detector.QUASI_PEAK, 150e3).orElseThrow();
        double at300 = fcc.limitDbuv(Detector.QUASI_PEAK, 300e3).orElseThrow();
        assertThat(at150 - at300).isCloseTo(19.125 * Math.log10(2), within(0.0005 * Math.log10(2)));
    }

    @Test
    void limitsOnlyItsDetectorsInTheirRange() {
        Mask mask = mask(
                new LimitSegment(Detector.AVERAGE, 1e6, 2e6, 50, 50),
                new LimitSegment(Detector.PEAK, 1e6, 2e6, 60, 60));
        assertThat(mask.detectors()).containsExactly(Detector.PEAK, Detector.AVERAGE);
        assertThat(mask.limitDbuv(Detector.QUASI_PEAK, 1.5e6)).isEmpty();
        assertThat(mask.limitDbuv(Detector.PEAK, 2e6)).hasValue(60);
        assertThat(mask.limitDbuv(Detector.PEAK, 2e6 + 1)).isEmpty();
    }

    @Test
    void refusesWhatIsNoLimit() {
        assertThatThrownBy(() -> mask()).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new LimitSegment(Detector.PEAK, 2e6, 1e6, 60, 60))
                .hasMessageContaining("must end above");
        assertThatThrownBy(() -> new LimitSegment(Detector.PEAK, 1e6, 1e6, 60, 60))
                .hasMessageContaining("must end above");
        assertThatThrownBy(() -> new LimitSegment(Detector.PEAK, 1e3, 1e6, 60, 60))
                .hasMessageContaining("1 kHz");
        assertThatThrownBy(() -> new LimitSegment(Detector.PEAK, 1e5, 1e6, 60, Double.NaN))
                .hasMessageContaining("NaN dBuV");
    }
}
