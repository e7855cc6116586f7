package undermask.receiver;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.SplittableRandom;
import org.jtransforms.fft.DoubleFFT_1D;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import pl.edu.icm.jlargearrays.ConcurrencyUtils;

class LaneTransformCrossTest {
    @BeforeAll
    static void oneThread() {
        ConcurrencyUtils.setNumberOfThreads(1);
    }

    @ParameterizedTest
    @ValueSource(ints = {1, 2, 3, 6, 8, 12, 64, 768, 1024})
    void agreesWithTheLibraryInEveryLane(int samples) {
        int lanes = 5;
        SplittableRandom random = new SplittableRandom(samples);
        LaneTransform transform = new LaneTransform(samples, lanes);
        double[][] library = new double[lanes][2 * samples];
        for (int lane = 0; lane < lanes; lane++) {
            for (int index = 0; index < samples; index++) {
                library[lane][2 * index] = random.nextDouble() - 0.5;
                library[lane][2 * index + 1] = random.nextDouble() - 0.5;
                transform.inputRe(index)[lane] = library[lane][2 * index];
                transform.inputIm(index)[lane] = library[lane][2 * index + 1];
            }
            new DoubleFFT_1D(samples).complexInverse(library[lane], false);
        }
        transform.run();
        for (int lane = 0; lane < lanes; lane++) {
            for (int n = 0; n < samples; n++) {
                assertThat(transform.re(n)[lane]).isCloseTo(library[lane][2 * n], within(1e-12 * samples));
                assertThat(transform.im(n)[lane]).isCloseTo(library[lane][2 * n + 1], within(1e-12 * samples));
            }
        }
    }

    @Test
    void refusesOtherLengths() {
        assertThatThrownBy(() -> new LaneTransform(10, 1)).isInstanceOf(IllegalArgumentException.class);
    }
}
