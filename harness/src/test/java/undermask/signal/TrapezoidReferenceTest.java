package undermask.signal;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class TrapezoidReferenceTest {
    // Source: corner frequencies of 1 µs, 200 ns and 50 ns edges as printed by Mirafzal et al., IEEE Trans. Ind. Appl.
    // 43 (2007): 318 kHz, 1.6 MHz, 6.3 MHz.
    @ParameterizedTest
    @CsvSource({"1e-6, 318e3, 1e3", "200e-9, 1.6e6, 0.05e6", "50e-9, 6.3e6, 0.1e6"})
    void cornersAreThePublishedOnes(double transition, double corner, double digits) {
        TrapezoidEnvelope envelope = new TrapezoidEnvelope(1, 1e4, 50e-6, transition);
        assertThat(envelope.edgeCorner()).isCloseTo(corner, within(digits));
        assertThat(envelope.pulseCorner()).isCloseTo(1 / (Math.PI * 50e-6), within(1e-9));
    }

    // Source: the envelope, e.g. Paul, Introduction to Electromagnetic Compatibility, from memory.
    @Test
    void exponentialEdgesTouchTheEnvelopeAndHardlyExceedIt() {
        double width = 13.7e-6;
        double rate = 1e4;
        double transition = 100e-9;
        TrapezoidEnvelope envelope = new TrapezoidEnvelope(300, rate, width, transition);
        EdgeTrain train = new EdgeTrain(
                1 / rate,
                new double[] {10e-6, 10e-6 + width},
                new double[] {300, -300},
                new int[2],
                List.of(new ExponentialEdge(transition)),
                0);
        int count = 3000;
        double[] re = new double[count];
        double[] im = new double[count];
        train.lines().read(1, count, re, im);
        double[] nearest = {-99, -99, -99, -99};
        for (int n = 1; n <= count; n++) {
            double frequency = n * rate;
            double over = 20 * Math.log10(2 * Math.hypot(re[n - 1], im[n - 1]) / envelope.peak(frequency));
            assertThat(over).as("line %d", n).isLessThan(3);
            int decade = (int) Math.log10(n);
            nearest[decade] = Math.max(nearest[decade], over);
        }
        for (double over : nearest) {
            assertThat(over).isGreaterThan(-1);
        }
    }
}
