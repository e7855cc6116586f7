package undermask.pwm;

import java.util.Arrays;
import java.util.function.IntToDoubleFunction;
import undermask.drive.ShortPulses;

/**
 * When one leg switches within the window, up and down in turn. Instants may lie a little outside the window; they
 * repeat with it.
 */
final class SwitchingInstants {
    /** Pulses and gaps below this part of the window are none. */
    private static final double NOTHING = 1e-15;

    private final double window;
    private final double[] times;
    private final int[] origins;
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
        this(window, times, firstIsUp, highWithoutEdges, vanishing(window, times));
    }

    private SwitchingInstants(
            double window, double[] times, boolean firstIsUp, boolean highWithoutEdges, boolean[] dropped) {
        this.window = window;
        int kept = 0;
        while (kept < dropped.length && dropped[kept]) {
            kept++;
        }
        this.firstIsUp = firstIsUp == (kept % 2 == 0);
        this.highWithoutEdges = highWithoutEdges;
        double[] rest = new double[times.length];
        int[] from = new int[times.length];
        int count = 0;
        for (int i = 0; i < times.length; i++) {
            if (!dropped[i]) {
                from[count] = i;
                rest[count++] = times[i];
            }
        }
        this.times = Arrays.copyOf(rest, count);
        this.origins = Arrays.copyOf(from, count);
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

    /** The place of an edge among the instants that these were made from, before pulses were dropped. */
    int origin(int edge) {
        return origins[edge];
    }

    /**
     * The instants with each edge as late as told. Pulses that the delays swallow vanish.
     *
     * @param delay of the edge of a number in s
     */
    SwitchingInstants delayed(IntToDoubleFunction delay) {
        double[] late = times.clone();
        for (int i = 0; i < late.length; i++) {
            late[i] += delay.applyAsDouble(i);
        }
        return new SwitchingInstants(window, late, firstIsUp, highWithoutEdges);
    }

    /**
     * The instants without pulses and gaps shorter than a minimum.
     *
     * @param shortest in s
     */
    SwitchingInstants atLeast(double shortest, ShortPulses shortPulses) {
        if (shortest <= 0 || times.length == 0) {
            return this;
        }
        return shortPulses == ShortPulses.DROP ? withoutShort(shortest) : held(shortest);
    }

    /** How many pulses and gaps are shorter than a width in s. */
    int shorterThan(double width) {
        int count = 0;
        for (int i = 0; i < times.length; i++) {
            int next = (i + 1) % times.length;
            count += times[next] - times[i] + (next == 0 ? window : 0) < width ? 1 : 0;
        }
        return count;
    }

    private SwitchingInstants withoutShort(double shortest) {
        boolean[] dropped = new boolean[times.length];
        for (int i = 0; i + 1 < times.length; i++) {
            if (!dropped[i] && times[i + 1] - times[i] < shortest) {
                dropped[i] = true;
                dropped[i + 1] = true;
            }
        }
        int last = times.length - 1;
        if (!dropped[0] && !dropped[last] && times[0] + window - times[last] < shortest) {
            dropped[0] = true;
            dropped[last] = true;
        }
        return new SwitchingInstants(window, times, firstIsUp, highWithoutEdges, dropped);
    }

    /** Widens each short pulse or gap about its middle. */
    private SwitchingInstants held(double shortest) {
        double[] moved = times.clone();
        for (int i = 0; i < moved.length; i++) {
            int next = (i + 1) % moved.length;
            double width = times[next] - times[i] + (next == 0 ? window : 0);
            if (width < shortest) {
                moved[i] -= (shortest - width) / 2;
                moved[next] += (shortest - width) / 2;
            }
        }
        return new SwitchingInstants(window, moved, firstIsUp, highWithoutEdges);
    }
}
