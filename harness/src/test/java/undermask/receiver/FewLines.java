package undermask.receiver;

import java.util.Map;
import undermask.signal.Lines;

/** Some sines: peak amplitudes in V by the number of the line, all in phase at the start of the window. */
record FewLines(double spacing, Map<Integer, Double> amplitudes) implements Lines {
    FewLines {
        amplitudes = Map.copyOf(amplitudes);
    }

    @Override
    public void read(int first, int count, double[] re, double[] im) {
        for (int i = 0; i < count; i++) {
            re[i] = amplitudes.getOrDefault(first + i, 0.0) / 2;
            im[i] = 0;
        }
    }
}
