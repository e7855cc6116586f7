package undermask.cost;

import java.util.List;
import undermask.pwm.Bridge;
import undermask.signal.EdgeTrain;
import undermask.signal.Lines;

/**
 * What the ear gets of a motor's harmonic flux: V_h/(2πf_h) of each audible line, weighted by curve A. Absolute levels need
 * the motor's mechanics; differences between settings do not.
 *
 * <p>Source: IEC 61672-1, curve A by its poles.
 *
 * @param level 20·log10 of the weighted flux in Vs, dB(A) but for a constant of the motor
 * @param toneHz frequency of the strongest line
 */
public record Sound(double level, double toneHz) {
    private static final double LOWEST_HZ = 100;
    private static final double HIGHEST_HZ = 20e3;
    private static final double GAIN_AT_1_KHZ = response(1000);

    /** Adds the lines of a bridge's phase voltage from 100 Hz to 20 kHz. */
    public static Sound of(Bridge bridge) {
        EdgeTrain phase = EdgeTrain.sum(List.of(bridge.leg(0), bridge.commonMode()), 1, -1);
        Lines lines = phase.lines();
        int count = (int) (HIGHEST_HZ / lines.spacing());
        double[] re = new double[count];
        double[] im = new double[count];
        lines.read(1, count, re, im);
        double sum = 0;
        double strongest = 0;
        double tone = 0;
        for (int n = 1; n <= count; n++) {
            double frequency = n * lines.spacing();
            if (frequency < LOWEST_HZ || n == bridge.window().fundamentalPeriods()) {
                continue;
            }
            double flux = Math.sqrt(2) * Math.hypot(re[n - 1], im[n - 1]) / (2 * Math.PI * frequency);
            double heard = flux * Math.pow(10, weightDb(frequency) / 20);
            sum += heard * heard;
            if (heard > strongest) {
                strongest = heard;
                tone = frequency;
            }
        }
        return new Sound(10 * Math.log10(sum), tone);
    }

    /** Curve A at a frequency, dB. */
    static double weightDb(double frequency) {
        return 20 * Math.log10(response(frequency) / GAIN_AT_1_KHZ);
    }

    private static double response(double frequency) {
        double f2 = frequency * frequency;
        double a = 20.598997 * 20.598997;
        double b = 107.65265 * 107.65265;
        double c = 737.86223 * 737.86223;
        double d = 12194.217 * 12194.217;
        return d * f2 * f2 / ((f2 + a) * Math.sqrt((f2 + b) * (f2 + c)) * (f2 + d));
    }
}
