package undermask.receiver;

import java.util.Arrays;
import undermask.signal.Lines;

/** A stretch of lines that moves upwards with the tuning, so that a long window need not lie in memory. */
final class LineWindow {
    /** Sources read faster in long stretches. */
    private static final int BLOCK = 1 << 15;

    private final Lines lines;
    private final int end;
    private double[] re = new double[0];
    private double[] im = new double[0];
    private double[] blockRe = new double[0];
    private double[] blockIm = new double[0];
    private int first;
    private int count;

    /**
     * Starts at a line.
     *
     * @param first the lowest line that will be asked for; lines below 1 read as 0
     * @param end the highest
     */
    LineWindow(Lines lines, int first, int end) {
        this.lines = lines;
        this.first = first;
        this.end = end;
    }

    /** Loads the lines from one to another, both included; the lower one never falls from call to call. */
    void cover(int from, int to) {
        if (to < first + count) {
            return;
        }
        int dropped = Math.min(from - first, count);
        int kept = count - dropped;
        int block = Math.max(BLOCK, to - from + 1);
        if (re.length < to - from + 1 + block) {
            re = Arrays.copyOf(re, Math.max(re.length, to - from + 1 + block));
            im = Arrays.copyOf(im, re.length);
            blockRe = new double[block];
            blockIm = new double[block];
        }
        System.arraycopy(re, dropped, re, 0, kept);
        System.arraycopy(im, dropped, im, 0, kept);
        first = from;
        count = kept;
        while (first + count <= to) {
            int next = first + count;
            if (next < 1) {
                re[count] = 0;
                im[count] = 0;
                count++;
                continue;
            }
            int length = Math.min(blockRe.length, end - next + 1);
            lines.read(next, length, blockRe, blockIm);
            System.arraycopy(blockRe, 0, re, count, length);
            System.arraycopy(blockIm, 0, im, count, length);
            count += length;
        }
    }

    /** Real parts; line n at n − {@link #first()}. */
    double[] re() {
        return re;
    }

    /** Imaginary parts likewise. */
    double[] im() {
        return im;
    }

    int first() {
        return first;
    }
}
