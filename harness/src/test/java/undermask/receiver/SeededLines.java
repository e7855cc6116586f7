package undermask.receiver;

import java.util.SplittableRandom;
import undermask.signal.Lines;

/**
 * Random lines of a given density: amplitudes over 60 dB, any phase.
 *
 * @param seed the same lines for the same seed, however they are read
 * @param share of lines that are not 0
 * @param scale factor on all lines
 */
record SeededLines(double spacing, long seed, double share, double scale) implements Lines {
    @Override
    public void read(int first, int count, double[] re, double[] im) {
        for (int i = 0; i < count; i++) {
            SplittableRandom random = new SplittableRandom(seed + (first + i) * 0x9E3779B97F4A7C15L);
            boolean present = random.nextDouble() < share;
            double amplitude = present ? scale * Math.pow(10, -3 * random.nextDouble()) : 0;
            double phase = 2 * Math.PI * random.nextDouble();
            re[i] = amplitude * Math.cos(phase);
            im[i] = amplitude * Math.sin(phase);
        }
    }
}
