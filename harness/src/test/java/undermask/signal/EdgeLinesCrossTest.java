package undermask.signal;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class EdgeLinesCrossTest {
    private static final double HIGHEST_HZ = 30e6;

    // Source: direct summation of c_n = (1/T)·Σ ΔV·E(f_n)·exp(−j2πf_n·t)/(j2πf_n), term by term.
    @ParameterizedTest(name = "{1} edges in {0} s")
    @CsvSource({"0.001, 2", "0.02, 480", "0.02, 4800", "0.1, 3000"})
    void transformAgreesWithDirectSummation(double period, int edges) {
        EdgeTrain train = seeded(period, edges);
        int count = (int) (HIGHEST_HZ * period);
        double[] re = new double[count];
        double[] im = new double[count];
        train.lines().read(1, count, re, im);
        double largest = 0;
        for (int i = 0; i < count; i++) {
            largest = Math.max(largest, Math.hypot(re[i], im[i]));
        }
        SplittableRandom random = new SplittableRandom(7);
        for (int probe = 0; probe < 400; probe++) {
            int n = probe < 50 ? probe + 1 : probe < 100 ? count - (probe - 50) : 1 + random.nextInt(count);
            double[] direct = direct(train, n);
            assertThat(re[n - 1]).as("line %d", n).isCloseTo(direct[0], within(1e-8 * largest));
            assertThat(im[n - 1]).as("line %d", n).isCloseTo(direct[1], within(1e-8 * largest));
        }
    }

    // Source: direct summation. A thousand shapes, those of charged edges up to 2 µs long and forced ones that ring.
    @ParameterizedTest(name = "in {0} s")
    @CsvSource({"0.004", "0.02", "0.16"})
    void aThousandShapesAreInterpolatedToAFractionOfADecibel(double period) {
        SplittableRandom random = new SplittableRandom(11);
        int edges = 1200;
        List<EdgeShape> shapes = new ArrayList<>();
        double[] times = new double[edges];
        double[] steps = new double[edges];
        int[] shapeOf = new int[edges];
        for (int e = 0; e < edges; e++) {
            double transition = 30e-9 * Math.pow(70, random.nextDouble());
            EdgeShape plain = e % 4 == 0 ? new RampEdge(transition) : new ExponentialEdge(transition);
            shapes.add(e % 3 == 0 ? new RingingEdge(plain, 9e6, 0.05, 0.3) : plain);
            times[e] = (e + random.nextDouble()) / edges * period;
            steps[e] = e % 2 == 0 ? 565 : -565;
            shapeOf[e] = e;
        }
        EdgeTrain train = new EdgeTrain(period, times, steps, shapeOf, shapes, -282.5);
        int count = (int) (HIGHEST_HZ * period);
        double[] re = new double[count];
        double[] im = new double[count];
        train.lines().read(1, count, re, im);
        double squareOfError = 0;
        double square = 0;
        for (int probe = 0; probe < 500; probe++) {
            int n = count - random.nextInt(count / 10);
            double[] direct = direct(train, n);
            squareOfError += Math.pow(Math.hypot(re[n - 1] - direct[0], im[n - 1] - direct[1]), 2);
            square += direct[0] * direct[0] + direct[1] * direct[1];
        }
        assertThat(Math.sqrt(squareOfError / square)).isLessThan(2e-4);
        for (int probe = 0; probe < 200; probe++) {
            int n = 1 + random.nextInt(count);
            double[] direct = direct(train, n);
            assertThat(Math.hypot(re[n - 1] - direct[0], im[n - 1] - direct[1]))
                    .as("line %d", n)
                    .isLessThan(1e-6);
        }
    }

    @ParameterizedTest
    @CsvSource({"1", "16384", "16385", "20000"})
    void aBlockReadAnywhereGivesTheSameLines(int first) {
        EdgeTrain train = seeded(0.02, 300);
        double[] re = new double[60000];
        double[] im = new double[60000];
        train.lines().read(1, re.length, re, im);
        double[] blockRe = new double[100];
        double[] blockIm = new double[100];
        train.lines().read(first, 100, blockRe, blockIm);
        for (int i = 0; i < 100; i++) {
            assertThat(blockRe[i]).isCloseTo(re[first - 1 + i], within(1e-10));
            assertThat(blockIm[i]).isCloseTo(im[first - 1 + i], within(1e-10));
        }
    }

    private static EdgeTrain seeded(double period, int edges) {
        SplittableRandom random = new SplittableRandom(edges);
        List<EdgeShape> shapes =
                List.of(new ExponentialEdge(120e-9), new RampEdge(80e-9), new RaisedCosineEdge(200e-9));
        double[] times = new double[edges];
        double[] steps = new double[edges];
        int[] shapeOf = new int[edges];
        double rest = 0;
        for (int e = 0; e < edges; e++) {
            times[e] = random.nextDouble() * period;
            steps[e] = e == edges - 1 ? -rest : random.nextDouble(-565, 565);
            rest += steps[e];
            shapeOf[e] = random.nextInt(shapes.size());
        }
        return new EdgeTrain(period, times, steps, shapeOf, shapes, 0);
    }

    private static double[] direct(EdgeTrain train, int n) {
        double[] factor = new double[2];
        double re = 0;
        double im = 0;
        double frequency = n / train.period();
        for (int e = 0; e < train.size(); e++) {
            train.shape(e).factor(frequency, factor);
            double turns = n * ((train.time(e) - train.shape(e).lead()) / train.period());
            double angle = -2 * Math.PI * (turns - Math.rint(turns));
            double cos = Math.cos(angle);
            double sin = Math.sin(angle);
            re += train.step(e) * (factor[0] * cos - factor[1] * sin);
            im += train.step(e) * (factor[0] * sin + factor[1] * cos);
        }
        return new double[] {im / (2 * Math.PI * n), -re / (2 * Math.PI * n)};
    }
}
