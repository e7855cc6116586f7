package undermask.receiver;

import java.util.Arrays;
import java.util.stream.IntStream;

/**
 * The capacitors of the quasi-peak detectors of a batch, on their way to the periodic state.
 *
 * <p>The voltage over one period is a smooth function of the voltage before it, and running the period yields the slope
 * of that function as well. Newton's method on the fixed point therefore needs few runs, and the last run is corrected
 * to first order instead of repeated. The start comes from a few samples under the assumption that v hardly moves, which
 * is right for a short period and only a start for a long one.
 *
 * <p>Rows are worked on in short loops over plain arrays, which the compiler turns into vector instructions;
 * (y + |y|)/2 for max(y, 0) is part of that.
 */
final class CapacitorRun {
    /**
     * arccos(1 − y) = √y·Σ p_i·y^i on 0 ≤ y ≤ 1 to 7·10⁻⁶, from interpolation at Chebyshev nodes. A library arccos would
     * cost ten times as much, for every sample of every envelope.
     */
    private static final double P0 = 1.41421995;

    private static final double P1 = 0.117534567;
    private static final double P2 = 0.0289413309;
    private static final double P3 = 0.00172506631;
    private static final double P4 = 0.00836454947;

    /** sin θ − θ·cos θ is the integral of θ over cos θ, hence y·√y·Σ q_i·y^i with q_i = p_i/(i + 3/2). */
    private static final double Q0 = P0 / 1.5;

    private static final double Q1 = P1 / 2.5;
    private static final double Q2 = P2 / 3.5;
    private static final double Q3 = P3 / 4.5;
    private static final double Q4 = P4 / 5.5;

    /** Square of the relative correction of the last run, weighed by how long it lasts: 0.007 dB. */
    private static final double SETTLED = 2.5e-4;

    private static final int FEWEST_LANES = 16;
    private static final int MOST_PERIODS = 60;
    private static final int COARSE_SAMPLES = 32;
    private static final int COARSE_PASSES = 4;
    private static final int SKETCH_SAMPLES = 256;

    private final EnvelopeBatch batch;
    private final double conduction;
    private final double dischargeTime;
    private final int width;
    private final double charge;
    private final double discharge;
    private final double[] v;
    private final double[] slope;
    private final double[] blockV;
    private final double[] blockSlope;
    private final double[] amplitude;
    private final double[] over;
    private final double[] share;
    private final double[] angle;

    /**
     * Makes room.
     *
     * @param conduction π·S·C in s
     * @param dischargeTime in s
     */
    CapacitorRun(EnvelopeBatch batch, double conduction, double dischargeTime) {
        this.batch = batch;
        this.conduction = conduction;
        this.dischargeTime = dischargeTime;
        this.width = batch.width();
        this.charge = batch.sampleInterval() / conduction;
        this.discharge = batch.sampleInterval() / dischargeTime;
        this.v = new double[width];
        this.slope = new double[width];
        this.blockV = new double[batch.blocks() * width];
        this.blockSlope = new double[batch.blocks() * width];
        this.amplitude = new double[width];
        this.over = new double[width];
        this.share = new double[width];
        this.angle = new double[width];
    }

    /**
     * Brings all lanes to their periodic state and returns the voltages as means over the batch's blocks.
     *
     * @param sineGain voltage that a steady sine of envelope 1 leaves
     */
    double[] settle(double sineGain) {
        double[] start = coarse(sineGain);
        sketch(start);
        return settle(start, MOST_PERIODS);
    }

    /** Runs all lanes, and those that are not settled again by themselves. */
    private double[] settle(double[] start, int periods) {
        period(start);
        double[] correction = improve(start);
        double[] blocks = corrected(correction);
        int[] unsettled = IntStream.range(0, width)
                .filter(lane -> !settled(lane, correction[lane]))
                .toArray();
        if (unsettled.length == 0 || periods == 1) {
            return blocks;
        }
        int[] lanes = padded(unsettled, width);
        double[] better = Arrays.stream(lanes).mapToDouble(lane -> start[lane]).toArray();
        double[] again = new CapacitorRun(batch.lanes(lanes), conduction, dischargeTime).settle(better, periods - 1);
        for (int i = 0; i < again.length; i++) {
            blocks[i / lanes.length * width + lanes[i % lanes.length]] = again[i];
        }
        return blocks;
    }

    /** Lanes with the last one repeated: vector instructions take some lanes at the price of one. */
    private static int[] padded(int[] lanes, int most) {
        int width = Math.min(most, (lanes.length + FEWEST_LANES - 1) / FEWEST_LANES * FEWEST_LANES);
        int[] padded = Arrays.copyOf(lanes, width);
        Arrays.fill(padded, lanes.length, width, lanes[lanes.length - 1]);
        return padded;
    }

    /** Runs one period from the given voltages and sums v and its slope over each block. */
    private void period(double[] start) {
        double[] sumV = new double[width];
        double[] sumSlope = new double[width];
        System.arraycopy(start, 0, v, 0, width);
        Arrays.fill(slope, 1);
        int sample = 0;
        for (int block = 0; block < batch.blocks(); block++) {
            Arrays.fill(sumV, 0);
            Arrays.fill(sumSlope, 0);
            for (int i = 0; i < batch.samplesPerBlock(); i++, sample++) {
                conduct(sample);
                advance(over, angle, v, slope, charge, discharge);
                add(v, sumV);
                add(slope, sumSlope);
            }
            System.arraycopy(sumV, 0, blockV, block * width, width);
            System.arraycopy(sumSlope, 0, blockSlope, block * width, width);
        }
    }

    /** Improves the start by one period in long steps. */
    private void sketch(double[] start) {
        int stride = batch.samples() / SKETCH_SAMPLES;
        if (stride < 2) {
            return;
        }
        System.arraycopy(start, 0, v, 0, width);
        Arrays.fill(slope, 1);
        for (int sample = 0; sample < batch.samples(); sample += stride) {
            conduct(sample);
            advance(over, angle, v, slope, charge * stride, discharge * stride);
        }
        improve(start);
    }

    /** A step of Newton's method towards the voltage that returns after a period; returns the correction. */
    private double[] improve(double[] start) {
        double[] correction = new double[width];
        for (int lane = 0; lane < width; lane++) {
            correction[lane] = (v[lane] - start[lane]) / (1 - slope[lane]);
            start[lane] = Math.max(0, start[lane] + correction[lane]);
        }
        return correction;
    }

    /** Charging current into {@link #over} and the angle of conduction into {@link #angle}. */
    private void conduct(int sample) {
        System.arraycopy(batch.amplitudes(), sample * width, amplitude, 0, width);
        compare(amplitude, v, over, share);
        conduction(share, over, angle);
    }

    /** Whether what the first-order correction leaves out is too small to matter. */
    private boolean settled(int lane, double correction) {
        double relative = correction * batch.samples() / sum(blockV, lane);
        return relative * relative * sum(blockSlope, lane) / batch.samples() <= SETTLED;
    }

    private double sum(double[] blocks, int lane) {
        double sum = 0;
        for (int at = lane; at < blocks.length; at += width) {
            sum += blocks[at];
        }
        return sum;
    }

    private double[] corrected(double[] correction) {
        double scale = 1.0 / batch.samplesPerBlock();
        double[] blocks = new double[blockV.length];
        for (int i = 0; i < blocks.length; i++) {
            blocks[i] = scale * (blockV[i] + correction[i % width] * blockSlope[i]);
        }
        return blocks;
    }

    /** Solves mean charge = mean discharge over some of the samples, from below by Newton's method. */
    private double[] coarse(double sineGain) {
        int stride = Math.max(1, batch.samples() / COARSE_SAMPLES);
        int used = (batch.samples() + stride - 1) / stride;
        double[] charged = new double[width];
        double[] angles = new double[width];
        Arrays.fill(v, 0);
        for (int sample = 0; sample < batch.samples(); sample += stride) {
            System.arraycopy(batch.amplitudes(), sample * width, amplitude, 0, width);
            add(amplitude, v);
        }
        for (int lane = 0; lane < width; lane++) {
            v[lane] *= sineGain / used;
        }
        double loss = used * conduction / dischargeTime;
        for (int pass = 0; pass < COARSE_PASSES; pass++) {
            Arrays.fill(charged, 0);
            Arrays.fill(angles, 0);
            for (int sample = 0; sample < batch.samples(); sample += stride) {
                conduct(sample);
                add(over, charged);
                add(angle, angles);
            }
            for (int lane = 0; lane < width; lane++) {
                v[lane] += (charged[lane] - loss * v[lane]) / (angles[lane] + loss);
            }
        }
        return v.clone();
    }

    /** Charge that flows per cycle, sin θ − θ·cos θ, at cos θ = v/A; 0 where v exceeds A. */
    static double conducted(double ratio) {
        double y = Math.max(0, 1 - ratio);
        return y * Math.sqrt(y) * (Q0 + y * (Q1 + y * (Q2 + y * (Q3 + y * Q4))));
    }

    /** By how much amplitudes exceed v, else 0, and that as a share of the amplitude. */
    private static void compare(double[] amplitude, double[] v, double[] over, double[] share) {
        for (int lane = 0; lane < v.length; lane++) {
            double difference = amplitude[lane] - v[lane];
            difference = 0.5 * (difference + Math.abs(difference));
            over[lane] = difference;
            share[lane] = difference / amplitude[lane];
        }
    }

    /** θ into {@code angle}; A·(sin θ − θ·cos θ) into {@code over}, which holds A − v before. */
    private static void conduction(double[] share, double[] over, double[] angle) {
        for (int lane = 0; lane < share.length; lane++) {
            double y = share[lane];
            double root = Math.sqrt(y);
            angle[lane] = root * (P0 + y * (P1 + y * (P2 + y * (P3 + y * P4))));
            over[lane] = over[lane] * root * (Q0 + y * (Q1 + y * (Q2 + y * (Q3 + y * Q4))));
        }
    }

    /**
     * One sample: a linearly implicit step (Rosenbrock, second order), which keeps its accuracy where a pulse lifts the
     * capacitor within two or three samples.
     */
    private static void advance(
            double[] current, double[] angle, double[] v, double[] slope, double charge, double discharge) {
        for (int lane = 0; lane < v.length; lane++) {
            double half = 0.5 * (charge * angle[lane] + discharge);
            double inverse = 1 / (1 + half);
            v[lane] += (charge * current[lane] - discharge * v[lane]) * inverse;
            slope[lane] *= (1 - half) * inverse;
        }
    }

    private static void add(double[] row, double[] sum) {
        for (int lane = 0; lane < sum.length; lane++) {
            sum[lane] += row[lane];
        }
    }
}
