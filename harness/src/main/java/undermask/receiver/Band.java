package undermask.receiver;

import java.util.Optional;

/** A frequency band of a measuring receiver, with the bandwidth and the detectors that it is read with. */
public enum Band {
    /** CISPR 16-1-1 band A, 200 Hz; charge 45 ms, discharge 500 ms. */
    CISPR_A(9e3, 150e3, 200, new QuasiPeakDetector(45e-3, 500e-3)),
    /** CISPR 16-1-1 band B, 9 kHz; charge 1 ms, discharge 160 ms. */
    CISPR_B(150e3, 30e6, 9e3, new QuasiPeakDetector(1e-3, 160e-3)),
    /** MIL-STD-461G Table II, 1 kHz below 150 kHz. */
    MIL_LOW(10e3, 150e3, 1e3, null),
    /** MIL-STD-461G Table II, 10 kHz from 150 kHz. */
    MIL_HIGH(150e3, 30e6, 10e3, null);

    private static final double TOP = 30e6;

    private final double from;
    private final double to;
    private final GaussianResponse response;
    private final QuasiPeakDetector quasiPeak;

    Band(double from, double to, double bandwidth, QuasiPeakDetector quasiPeak) {
        this.from = from;
        this.to = to;
        this.response = new GaussianResponse(bandwidth);
        this.quasiPeak = quasiPeak;
    }

    /** Lower end in Hz, part of the band. */
    public double from() {
        return from;
    }

    /** Upper end in Hz; it belongs to the next band where there is one. */
    public double to() {
        return to;
    }

    /** The selectivity of the receiver in this band. */
    public GaussianResponse response() {
        return response;
    }

    /** The quasi-peak detector, empty where the standard knows none. */
    public Optional<QuasiPeakDetector> quasiPeak() {
        return Optional.ofNullable(quasiPeak);
    }

    /**
     * The tuning steps in Hz: from the lower end in steps of half the bandwidth (CISPR 16-2-1), the upper end included
     * only where it falls on a step and no other band begins there. Band B of CISPR 16 therefore ends at 29.9985 MHz,
     * whose bandwidth takes in 30 MHz.
     */
    public double[] tuningSteps() {
        double step = response.bandwidth() / 2;
        int last = (int) Math.floor((to - from) / step);
        boolean nextBandBeginsThere = to < TOP && from + last * step == to;
        double[] steps = new double[nextBandBeginsThere ? last : last + 1];
        for (int i = 0; i < steps.length; i++) {
            steps[i] = from + i * step;
        }
        return steps;
    }
}
