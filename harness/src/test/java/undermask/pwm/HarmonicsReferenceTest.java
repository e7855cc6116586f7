package undermask.pwm;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.HashMap;
import java.util.Map;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import undermask.drive.CarrierSampling;
import undermask.drive.Modulation;
import undermask.signal.EdgeTrain;

class HarmonicsReferenceTest {
    /** Odd, a multiple of three, and large: as the tables are made for. */
    private static final int RATIO = 201;

    private static final Map<Double, Bridge> BRIDGES = new HashMap<>();

    // Source: header of the data file. A unit of the last digit of the book, half of one of the recomputed column.
    @ParameterizedTest(name = "{0}: carrier group {1}, sideband {2}, M = {3}")
    @CsvFileSource(resources = "/undermask/pwm/harmonics.csv", numLinesToSkip = 4)
    void naturallySampledSineTriangleFollowsTheTextbook(
            String waveform, int group, int sideband, double index, double value, double recomputed) {
        Bridge bridge = BRIDGES.computeIfAbsent(
                index, m -> Bridges.without(Modulation.SINE_TRIANGLE, CarrierSampling.NATURAL, RATIO, m));
        EdgeTrain train = switch (waveform) {
            case "leg" -> bridge.leg(0);
            case "ll" -> bridge.lineToLine();
            case "cm" -> bridge.commonMode();
            default -> throw new IllegalArgumentException(waveform);
        };
        double unit = waveform.equals("ll") ? Bridges.LINK * Math.sqrt(2) : Bridges.LINK / 2;
        double[] peaks = Bridges.peaks(train, 5 * RATIO + 20);
        for (int sign : new int[] {-1, 1}) {
            int line = group * RATIO + (group == 0 ? Math.abs(sideband) : sign * sideband);
            assertThat(peaks[line] / unit).isCloseTo(value, within(1e-3));
            assertThat(peaks[line] / unit).isCloseTo(recomputed, within(0.6e-4));
        }
    }
}
