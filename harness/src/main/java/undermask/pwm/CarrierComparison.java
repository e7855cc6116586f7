package undermask.pwm;

import undermask.drive.CarrierSampling;

/**
 * Reference against triangular carrier. The carrier stands at its positive peak, +1, at t = 0, falls to −1 at half its
 * period and rises again; a leg is high while its reference exceeds the carrier, so each carrier period holds one pulse
 * around its middle.
 */
final class CarrierComparison {
    private static final int MOST_STEPS = 200;
    private static final double SETTLED = 2e-16;

    private final AnalysisWindow window;
    private final Reference reference;
    private final CarrierSampling sampling;

    CarrierComparison(AnalysisWindow window, Reference reference, CarrierSampling sampling) {
        this.window = window;
        this.reference = reference;
        this.sampling = sampling;
    }

    /** The switching instants of a leg over the window, before dead time. */
    SwitchingInstants leg(int leg) {
        int carriers = window.carrierPeriods();
        double[] times = new double[2 * carriers];
        double period = window.seconds() / carriers;
        for (int i = 0; i < carriers; i++) {
            // where in its carrier period a level is met: (1 − u)/4 on the way down, (3 + u)/4 on the way up
            double up = switch (sampling) {
                case NATURAL -> crossing(i, 0.25, -0.25, leg);
                case ONCE, TWICE -> 0.25 - 0.25 * level(i, leg);
            };
            double down = switch (sampling) {
                case NATURAL -> crossing(i, 0.75, 0.25, leg);
                case ONCE -> 0.75 + 0.25 * level(i, leg);
                case TWICE -> 0.75 + 0.25 * level(i + 0.5, leg);
            };
            times[2 * i] = (i + up) * period;
            times[2 * i + 1] = (i + down) * period;
        }
        return new SwitchingInstants(window.seconds(), times, true, level(0, leg) > 0);
    }

    /** The reference at a time counted in carrier periods. */
    private double level(double carriers, int leg) {
        double turns = carriers * window.fundamentalPeriods() / window.carrierPeriods();
        return reference.at(2 * Math.PI * (turns - Math.floor(turns)), leg);
    }

    /**
     * The natural crossing. The reference moves less than half as fast as the carrier (the carrier is at least six
     * times as fast), so repeated substitution contracts.
     */
    private double crossing(int carrier, double middle, double slope, int leg) {
        double place = middle;
        for (int step = 0; step < MOST_STEPS; step++) {
            double next = middle + slope * level(carrier + place, leg);
            if (Math.abs(next - place) < SETTLED) {
                return next;
            }
            place = next;
        }
        return place;
    }
}
