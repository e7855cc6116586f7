package undermask.receiver;

import undermask.signal.Lines;

/**
 * Pulses of no width: a flat spectrum, c = area · rate on every multiple of the rate.
 *
 * @param area of one pulse in Vs
 * @param rate pulses per second
 * @param pulses how many fall into one window
 */
record PulseTrain(double area, double rate, int pulses) implements Lines {
    @Override
    public double spacing() {
        return rate / pulses;
    }

    @Override
    public void read(int first, int count, double[] re, double[] im) {
        for (int i = 0; i < count; i++) {
            re[i] = (first + i) % pulses == 0 ? area * rate : 0;
            im[i] = 0;
        }
    }
}
