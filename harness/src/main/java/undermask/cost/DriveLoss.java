package undermask.cost;

import undermask.pwm.Bridge;
import undermask.signal.EdgeTrain;

/**
 * Losses of a drive's switches and diodes by the actual edges and currents: a leg that rests does not switch.
 *
 * <p>Energies and voltage drops are those of 1200 V modules by their rated current (generic, from memory of data sheets).
 *
 * @param conduction W
 * @param switching W
 */
public record DriveLoss(double conduction, double switching) {
    private static final double SWITCH_DROP = 0.9;
    private static final double DIODE_DROP = 0.9;
    /** Further drop at rated current, V. */
    private static final double SWITCH_SLOPE = 0.95;

    private static final double DIODE_SLOPE = 0.8;
    /** Turn-on with the diode's recovery, J per A at the reference voltage. */
    private static final double TURN_ON = 0.15e-3;

    private static final double TURN_OFF = 0.07e-3;
    private static final double REFERENCE_VOLTAGE = 600;
    /** Energies grow a little faster than the link voltage. */
    private static final double VOLTAGE_EXPONENT = 1.3;

    private static final int LEGS = 3;
    private static final int POINTS = 4000;

    /** All losses, W. */
    public double total() {
        return conduction + switching;
    }

    /**
     * Works the losses out.
     *
     * @param ratedCurrent of the switches, peak A
     */
    public static DriveLoss of(Bridge bridge, double ratedCurrent) {
        double period = bridge.window().seconds();
        double scale = Math.pow(bridge.link().mean() / REFERENCE_VOLTAGE, VOLTAGE_EXPONENT);
        double energy = 0;
        double conduction = 0;
        for (int k = 0; k < LEGS; k++) {
            EdgeTrain leg = bridge.leg(k);
            double level = leg.initialLevel();
            int next = 0;
            for (int e = 0; e < leg.size(); e++) {
                // a part of an edge that was begun and forced later counts once, by its share
                double share = Math.abs(leg.step(e)) / bridge.link().mean();
                double current = bridge.current(k, leg.time(e));
                boolean forced = leg.step(e) > 0 == current > 0;
                energy += share * Math.abs(current) * (forced ? TURN_ON : TURN_OFF) * scale;
            }
            for (int i = 0; i < POINTS; i++) {
                double time = (i + 0.5) * period / POINTS;
                while (next < leg.size() && leg.time(next) <= time) {
                    level += leg.step(next) + leg.slope(next) * leg.lengthAfter(next);
                    next++;
                }
                double current = bridge.current(k, time);
                boolean bySwitch = level > 0 == current > 0;
                double drop = bySwitch
                        ? SWITCH_DROP + SWITCH_SLOPE * Math.abs(current) / ratedCurrent
                        : DIODE_DROP + DIODE_SLOPE * Math.abs(current) / ratedCurrent;
                conduction += drop * Math.abs(current) / POINTS;
            }
        }
        return new DriveLoss(conduction, energy / period);
    }
}
