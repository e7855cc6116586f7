package undermask.signal;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;

class EdgeTrainLawTest {
    private static final List<EdgeShape> IDEAL = List.of(new IdealEdge());

    private static EdgeTrain pulse(double from, double to, double height) {
        return new EdgeTrain(1e-3, new double[] {from, to}, new double[] {height, -height}, new int[2], IDEAL, 0);
    }

    // Source: Fourier series of a rectangular pulse, |c_n| = (V/(πn))·|sin(πn·width/T)|, standard.
    @Test
    void linesOfAPulse() {
        double[] re = new double[50];
        double[] im = new double[50];
        pulse(0.2e-3, 0.3e-3, 10).lines().read(1, 50, re, im);
        for (int n = 1; n <= 50; n++) {
            assertThat(Math.hypot(re[n - 1], im[n - 1]))
                    .isCloseTo(10 / (Math.PI * n) * Math.abs(Math.sin(0.1 * Math.PI * n)), within(1e-11));
        }
    }

    // Source: shift theorem, c_n·exp(−j2πnτ/T).
    @Test
    void aShiftInTimeTurnsEachLine() {
        double[][] re = new double[2][40];
        double[][] im = new double[2][40];
        pulse(0.2e-3, 0.3e-3, 10).lines().read(1, 40, re[0], im[0]);
        pulse(0.25e-3, 0.35e-3, 10).lines().read(1, 40, re[1], im[1]);
        for (int n = 1; n <= 40; n++) {
            double angle = -2 * Math.PI * n * 0.05;
            double x = re[0][n - 1] * Math.cos(angle) - im[0][n - 1] * Math.sin(angle);
            double y = re[0][n - 1] * Math.sin(angle) + im[0][n - 1] * Math.cos(angle);
            assertThat(re[1][n - 1]).isCloseTo(x, within(1e-11));
            assertThat(im[1][n - 1]).isCloseTo(y, within(1e-11));
        }
    }

    // Source: levels of a sum of straight pieces, worked out by hand.
    @Test
    void aSlowGainTiltsTheLevels() {
        EdgeTrain tilted = pulse(0.2e-3, 0.4e-3, 10).times(time -> 1 + 500 * Math.abs(time - 0.5e-3), 1);
        assertThat(tilted.step(0)).isCloseTo(11.5, within(1e-12));
        assertThat(tilted.step(1)).isCloseTo(-10.5, within(1e-12));
        assertThat(tilted.slope(0)).isCloseTo(-5000, within(1e-8));
        assertThat(tilted.mean()).isCloseTo(11 * 0.2, within(1e-12));
        EdgeTrain difference = EdgeTrain.sum(List.of(tilted, tilted.times(0.5)), 1, -2);
        assertThat(difference.rms()).isCloseTo(0, within(1e-9));
    }

    @Test
    void shapedLevelsMeetTheStepsFarFromEdges() {
        EdgeTrain train = new EdgeTrain(
                1e-3,
                new double[] {0.1e-3, 0.6e-3},
                new double[] {20, -20},
                new int[2],
                List.of(new RampEdge(10e-6)),
                -5);
        ShapedLevel level = new ShapedLevel(train);
        assertThat(level.at(0.05e-3)).isCloseTo(-5, within(1e-12));
        assertThat(level.at(0.1e-3)).isCloseTo(5, within(1e-9));
        assertThat(level.at(0.1025e-3)).isCloseTo(10, within(1e-9));
        assertThat(level.at(1.3e-3)).isCloseTo(15, within(1e-12));
        assertThat(level.at(-0.1e-3)).isCloseTo(-5, within(1e-12));
    }

    @Test
    void linesOfASumAreTheSumOfLines() {
        EdgeTrain a = pulse(0.1e-3, 0.4e-3, 3);
        EdgeTrain b = pulse(0.25e-3, 0.9e-3, 5);
        EdgeTrain sum = EdgeTrain.sum(List.of(a, b), 2, -1);
        double[][] re = new double[3][64];
        double[][] im = new double[3][64];
        a.lines().read(1, 64, re[0], im[0]);
        b.lines().read(1, 64, re[1], im[1]);
        sum.lines().read(1, 64, re[2], im[2]);
        for (int i = 0; i < 64; i++) {
            assertThat(re[2][i]).isCloseTo(2 * re[0][i] - re[1][i], within(1e-11));
            assertThat(im[2][i]).isCloseTo(2 * im[0][i] - im[1][i], within(1e-11));
        }
    }

    // Source: Parseval; the rest of a pulse's series beyond line N is below 2·(V/π)²/N.
    @Test
    void powerOfTheLinesIsThePowerOfThePulse() {
        int count = 200_000;
        double[] re = new double[count];
        double[] im = new double[count];
        pulse(0.2e-3, 0.45e-3, 10).lines().read(1, count, re, im);
        double sum = Math.pow(10 * 0.25, 2);
        for (int i = 0; i < count; i++) {
            sum += 2 * (re[i] * re[i] + im[i] * im[i]);
        }
        assertThat(sum).isCloseTo(25, within(2 * Math.pow(10 / Math.PI, 2) / count));
    }

    @Test
    void refusesEdgesThatDoNotCloseOrLieOutside() {
        assertThatThrownBy(() -> new EdgeTrain(1, new double[] {0.5}, new double[] {1}, new int[1], IDEAL, 0))
                .hasMessageContaining("leave a rest");
        assertThatThrownBy(() -> new EdgeTrain(1, new double[] {0.5, 1}, new double[] {1, -1}, new int[2], IDEAL, 0))
                .hasMessageContaining("outside its window");
        assertThatThrownBy(() -> EdgeTrain.sum(
                        List.of(
                                pulse(0, 1e-4, 1),
                                new EdgeTrain(2, new double[0], new double[0], new int[0], IDEAL, 0)),
                        1,
                        1))
                .hasMessageContaining("different windows");
        assertThatThrownBy(() -> pulse(0, 1e-4, 1).lines().read(0, 1, new double[1], new double[1]))
                .hasMessageContaining("not above zero");
    }
}
