package undermask.pwm;

import java.util.function.DoubleUnaryOperator;

/**
 * When one leg switches within the window, up and down in turn. Instants may lie a little outside the window; they
 * repeat with it.
 */
final class SwitchingInstants {
    /** Pulses and gaps below this part of the window are none. */
    private static final double NOTHING = 1e-15;

    private final double window;
    private final double[] times;
    private final boolean firstIsUp;
    private final boolean highWithoutEdges;

    /**
     * Takes a copy and drops pulses and gaps of no width.
     *
     * @param window length in s
     * @param times an even number of instants in s, up and down in turn
     * @param highWithoutEdges the state of a leg that never switches
     */
    SwitchingInstants(double window, double[] times, boolean firstIsUp, boolean highWithoutEdges) {
        this.window = window;
        boolean[] dropped = vanishing(window, times);
        int kept = 0;
        while (kept < dropped.length && dropped[kept]) {
            kept++;
        }
        this.firstIsUp = firstIsUp == (kept % 2 == 0);
        this.highWithoutEdges = highWithoutEdges;
        double[] rest = new double[times.length];
        int count = 0;
        for (int i = 0; i < times.length; i++) {
            if (!dropped[i]) {
                rest[count++] = times[i];
            }
        }
        this.times = java.util.Arrays.copyOf(rest, count);
    }

    /** Marks neighbours that meet or cross; each pair is one up and one down, so the rest still alternates. */
    private static boolean[] vanishing(double window, double[] times) {
        boolean[] dropped = new boolean[times.length];
        int left = times.length;
        boolean again = true;
        while (again && left > 0) {
            again = false;
            int previous = -1;
            int first = -1;
            for (int i = 0; i < times.length; i++) {
                if (dropped[i]) {
                    continue;
                }
                if (previous >= 0 && times[i] - times[previous] <= NOTHING * window) {
                    dropped[i] = true;
                    dropped[previous] = true;
                    left -= 2;
                    again = true;
                    previous = -1;
                    continue;
                }
                first = first < 0 ? i : first;
                previous = i;
            }
            if (!again && left > 0 && times[first] + window - times[previous] <= NOTHING * window) {
                dropped[first] = true;
                dropped[previous] = true;
                left -= 2;
                again = true;
            }
        }
        return dropped;
    }

    int size() {
        return times.length;
    }

    /** An instant in s. */
    double time(int edge) {
        return times[edge];
    }

    /** Whether the leg goes up at an edge. */
    boolean up(int edge) {
        return firstIsUp == (edge % 2 == 0);
    }

    /** The state of the leg if it never switches. */
    boolean highWithoutEdges() {
        return highWithoutEdges;
    }

    /**
     * The instants with dead time. While current flows out of the leg, the upper switch must turn on to raise it, so
     * up-edges come late and down-edges at once; with current into the leg the reverse. Pulses that the delay swallows
     * vanish.
     *
     * @param deadTime in s
     * @param current sign of the current out of the leg at a time
     */
    SwitchingInstants delayed(double deadTime, DoubleUnaryOperator current) {
        double[] late = times.clone();
        for (int i = 0; i < late.length; i++) {
            if (up(i) == current.applyAsDouble(late[i]) > 0) {
                late[i] += deadTime;
            }
        }
        return new SwitchingInstants(window, late, firstIsUp, highWithoutEdges);
    }
}
