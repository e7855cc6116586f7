package undermask.signal;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;

class TabulatedTransferTest {
    private static final double ALONE = Double.POSITIVE_INFINITY;

    /** A damped series resonance seen across its resistor, Q = 40 at 1 MHz. */
    private static void resonance(double frequency, double[] out) {
        double x = 40 * (frequency / 1e6 - 1e6 / frequency);
        out[0] = 1 / (1 + x * x);
        out[1] = -x / (1 + x * x);
    }

    private static double[] at(Transfer transfer, double frequency) {
        double[] re = {1};
        double[] im = {0};
        transfer.multiply(frequency, 1, 1, re, im);
        return new double[] {re[0], im[0]};
    }

    private static double relativeError(Transfer transfer, TabulatedTransfer.Response response, double frequency) {
        double[] exact = new double[2];
        response.at(frequency, exact);
        double[] read = at(transfer, frequency);
        return Math.hypot(read[0] - exact[0], read[1] - exact[1]) / Math.hypot(exact[0], exact[1]);
    }

    @Test
    void holdsAResonance() {
        TabulatedTransfer transfer = TabulatedTransfer.of(TabulatedTransferTest::resonance, 9e3, 30e6, ALONE, 1e-3);
        SplittableRandom random = new SplittableRandom(5);
        for (int i = 0; i < 2000; i++) {
            double frequency = 9e3 * Math.pow(30e6 / 9e3, random.nextDouble());
            assertThat(relativeError(transfer, TabulatedTransferTest::resonance, frequency))
                    .isLessThan(1e-3);
        }
    }

    @Test
    void isExactForAPolynomialOfTheFourthDegree() {
        TabulatedTransfer.Response quartic = (f, out) -> {
            double x = f / 1e6;
            out[0] = 3 + x * (1 + x * (0.5 + x * (0.1 + x * 0.02)));
            out[1] = -2 + x * (0.7 - x * (0.2 - x * (0.03 + x * 0.004)));
        };
        TabulatedTransfer transfer = TabulatedTransfer.of(quartic, 1e5, 3e6, ALONE, 1e-3);
        for (double f = 1e5; f < 3e6; f += 12345) {
            assertThat(relativeError(transfer, quartic, f)).isLessThan(1e-12);
        }
    }

    // a comb of 1 MHz looks constant where samples keep step with it
    @Test
    void seesEvenRipple() {
        TabulatedTransfer.Response comb = (f, out) -> {
            out[0] = 1 + 0.5 * Math.cos(2 * Math.PI * f / 1e6);
            out[1] = 0.5 * Math.sin(2 * Math.PI * f / 1e6);
        };
        TabulatedTransfer transfer = TabulatedTransfer.of(comb, 1e6, 32e6, 1e6, 1e-3);
        for (double f = 1e6; f < 32e6; f += 7919) {
            assertThat(relativeError(transfer, comb, f)).isLessThan(1e-3);
        }
    }

    @Test
    void staysAtItsEndsBeyondThem() {
        TabulatedTransfer transfer = TabulatedTransfer.of(
                (f, out) -> {
                    out[0] = f;
                    out[1] = -2 * f;
                },
                100,
                1000,
                ALONE,
                1e-6);
        double[] re = new double[2000];
        double[] im = new double[2000];
        Arrays.fill(re, 1);
        transfer.multiply(1, 1, 2000, re, im);
        for (int i = 0; i < 2000; i++) {
            double expected = Math.min(1000, Math.max(100, i + 1));
            assertThat(re[i]).isCloseTo(expected, within(1e-9 * expected));
            assertThat(im[i]).isCloseTo(-2 * expected, within(2e-9 * expected));
        }
    }

    @Test
    void blocksMakeNoDifference() {
        TabulatedTransfer transfer = TabulatedTransfer.of(TabulatedTransferTest::resonance, 9e3, 30e6, ALONE, 1e-3);
        int count = 20_000;
        double[] re = new double[count];
        double[] im = new double[count];
        SplittableRandom random = new SplittableRandom(9);
        Arrays.setAll(re, i -> random.nextDouble() - 0.5);
        Arrays.setAll(im, i -> random.nextDouble() - 0.5);
        double[] wholeRe = re.clone();
        double[] wholeIm = im.clone();
        transfer.multiply(133.7, 1, count, wholeRe, wholeIm);
        int done = 0;
        while (done < count) {
            int length = Math.min(count - done, 1 + random.nextInt(900));
            double[] partRe = Arrays.copyOfRange(re, done, done + length);
            double[] partIm = Arrays.copyOfRange(im, done, done + length);
            transfer.multiply(133.7, 1 + done, length, partRe, partIm);
            for (int i = 0; i < length; i++) {
                assertThat(partRe[i]).isCloseTo(wholeRe[done + i], within(1e-12));
                assertThat(partIm[i]).isCloseTo(wholeIm[done + i], within(1e-12));
            }
            done += length;
        }
    }

    @Test
    void noResponseAtAllIsHeld() {
        TabulatedTransfer transfer = TabulatedTransfer.of((f, out) -> Arrays.fill(out, 0), 9e3, 30e6, ALONE, 1e-3);
        assertThat(at(transfer, 1e6)).containsExactly(0, 0);
    }

    @Test
    void emptyRangesAreRefused() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> TabulatedTransfer.of(TabulatedTransferTest::resonance, 1e6, 1e6, ALONE, 1e-3));
        assertThatIllegalArgumentException()
                .isThrownBy(() -> TabulatedTransfer.of(TabulatedTransferTest::resonance, 0, 1e6, ALONE, 1e-3));
    }
}
