package undermask.pwm;

import java.util.function.DoubleUnaryOperator;
import undermask.drive.CarrierSampling;

/**
 * Reference against triangular carrier. The carrier stands at its positive peak, +1, at the start of each of its
 * periods, falls to −1 at half and rises again; a leg is high while its reference exceeds the carrier, so each carrier
 * period holds one pulse around its middle.
 */
final class CarrierComparison {
    private static final int HALVINGS = 54;

    private final AnalysisWindow window;
    private final CarrierPeriods carrier;
    private final Reference reference;
    private final CarrierSampling sampling;
    private final double outputHz;

    CarrierComparison(AnalysisWindow window, CarrierPeriods carrier, Reference reference, CarrierSampling sampling) {
        this.window = window;
        this.carrier = carrier;
        this.reference = reference;
        this.sampling = sampling;
        this.outputHz = window.fundamentalPeriods() / window.seconds();
    }

    /**
     * The switching instants of a leg over the window, before dead time.
     *
     * @param correction seconds by which each pulse is to be longer, at a time; a leg that rests is left alone
     */
    SwitchingInstants leg(int leg, DoubleUnaryOperator correction) {
        if (reference.sixStep()) {
            return sixStep(leg);
        }
        double[] times = new double[2 * carrier.count()];
        for (int i = 0; i < carrier.count(); i++) {
            double start = carrier.start(i);
            double length = carrier.length(i);
            double duty = 2 * correction.applyAsDouble(start) / length;
            // where in its carrier period a level is met: (1 − u)/4 on the way down, (3 + u)/4 on the way up
            double up = switch (sampling) {
                case NATURAL -> crossing(start, length, duty, leg, 0);
                case ONCE, TWICE -> 0.25 - 0.25 * level(start, duty, leg);
            };
            double down = switch (sampling) {
                case NATURAL -> crossing(start, length, duty, leg, 0.5);
                case ONCE -> 0.75 + 0.25 * level(start, duty, leg);
                case TWICE -> 0.75 + 0.25 * level(start + length / 2, duty, leg);
            };
            times[2 * i] = start + up * length;
            times[2 * i + 1] = start + down * length;
        }
        return new SwitchingInstants(window.seconds(), times, true, level(0, 0, leg) > 0);
    }

    private SwitchingInstants sixStep(int leg) {
        double[] times = new double[2 * window.fundamentalPeriods()];
        for (int i = 0; i < window.fundamentalPeriods(); i++) {
            times[2 * i] = (i + leg / 3.0 - 0.25) / outputHz;
            times[2 * i + 1] = (i + leg / 3.0 + 0.25) / outputHz;
        }
        return new SwitchingInstants(window.seconds(), times, true, true);
    }

    /** The corrected reference at a time in s. */
    private double level(double time, double duty, int leg) {
        double turns = time * outputHz;
        double level = reference.at(2 * Math.PI * (turns - Math.floor(turns)), leg);
        return Math.abs(level) >= 1 ? level : Math.max(-1, Math.min(1, level + duty));
    }

    /**
     * The natural crossing in one half of a carrier period, by halving: at its start the carrier stands on one side of
     * any reference and at its end on the other. Where a steep reference meets it several times, one place is taken, as
     * by a comparator that latches.
     */
    private double crossing(double start, double length, double duty, int leg, double half) {
        double low = half;
        double high = half + 0.5;
        double direction = half == 0 ? 1 : -1;
        for (int step = 0; step < HALVINGS; step++) {
            double middle = (low + high) / 2;
            double carrierLevel = direction * (1 - 4 * (middle - half));
            double above = level(start + middle * length, duty, leg) - carrierLevel;
            if (direction * above >= 0) {
                high = middle;
            } else {
                low = middle;
            }
        }
        return (low + high) / 2;
    }
}
