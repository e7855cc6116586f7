package undermask.mask;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import undermask.network.MainsNetwork;
import undermask.receiver.Detector;
import undermask.receiver.ReceiverStandard;
import undermask.receiver.Trace;

class JudgementTest {
    private static final Mask MASK = new Mask(
            "steps",
            "a test",
            "a test",
            ReceiverStandard.CISPR_16,
            MainsNetwork.CISPR_150_KHZ,
            List.of(
                    new LimitSegment(Detector.QUASI_PEAK, 150e3, 500e3, 66, 56),
                    new LimitSegment(Detector.QUASI_PEAK, 500e3, 5e6, 56, 56),
                    new LimitSegment(Detector.QUASI_PEAK, 5e6, 30e6, 60, 60),
                    new LimitSegment(Detector.AVERAGE, 150e3, 30e6, 50, 50)));

    private static Trace quasiPeak(double[] frequencies, double... levelsDbuv) {
        double[] none = new double[frequencies.length];
        Arrays.fill(none, Double.NaN);
        return new Trace(frequencies, new double[][] {none, levelsDbuv, none});
    }

    @Test
    void findsTheSmallestMarginNotTheHighestLevel() {
        Trace trace = quasiPeak(new double[] {100e3, 150e3, 600e3, 6e6}, 90, 60, 55, 58);
        Judgement worst = Judgement.worst(trace, MASK, Detector.QUASI_PEAK, 6).orElseThrow();
        assertThat(worst).isEqualTo(new Judgement(Detector.QUASI_PEAK, 600e3, 55, 56, 6));
        assertThat(worst.marginDb()).isEqualTo(1);
        assertThat(worst.verdict()).isEqualTo(Verdict.TIGHT);
    }

    @Test
    void theLowerLimitHoldsAtAStep() {
        Trace trace = quasiPeak(new double[] {5e6, 5e6 + 1}, 57, 57);
        Judgement worst = Judgement.worst(trace, MASK, Detector.QUASI_PEAK, 0).orElseThrow();
        assertThat(worst.frequencyHz()).isEqualTo(5e6);
        assertThat(worst.limitDbuv()).isEqualTo(56);
        assertThat(worst.verdict()).isEqualTo(Verdict.OVER);
    }

    @Test
    void theLowestFrequencyOfEqualsIsNamed() {
        Trace trace = quasiPeak(new double[] {1e6, 2e6}, 50, 50);
        assertThat(Judgement.worst(trace, MASK, Detector.QUASI_PEAK, 0)
                        .orElseThrow()
                        .frequencyHz())
                .isEqualTo(1e6);
    }

    @Test
    void nothingUnderTheMaskIsNoJudgement() {
        assertThat(Judgement.worst(quasiPeak(new double[] {1e3}, 50), MASK, Detector.QUASI_PEAK, 0))
                .isEmpty();
        assertThat(Judgement.worst(quasiPeak(new double[] {1e6}, 50), MASK, Detector.PEAK, 0))
                .isEmpty();
    }

    @Test
    void aLimitWithoutReadingIsAFault() {
        assertThatThrownBy(() -> Judgement.worst(quasiPeak(new double[] {1e6}, 50), MASK, Detector.AVERAGE, 0))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("no average reading");
    }

    @ParameterizedTest
    @CsvSource({"6, 6, CLEAR", "5.999, 6, TIGHT", "0, 6, TIGHT", "0, 0, CLEAR", "-1e-9, 0, OVER", "NaN, 0, OVER"})
    void verdictsUseTheUnroundedMargin(double marginDb, double requiredDb, Verdict verdict) {
        assertThat(Verdict.of(marginDb, requiredDb)).isEqualTo(verdict);
    }

    @Test
    void theWorseVerdictWins() {
        assertThat(Verdict.CLEAR.worse(Verdict.TIGHT)).isEqualTo(Verdict.TIGHT);
        assertThat(Verdict.OVER.worse(Verdict.TIGHT)).isEqualTo(Verdict.OVER);
    }
}
