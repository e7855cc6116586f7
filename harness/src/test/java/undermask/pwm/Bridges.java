package undermask.pwm;

import java.util.OptionalDouble;
import undermask.drive.Carrier;
import undermask.drive.CarrierSampling;
import undermask.drive.DriveSettings;
import undermask.drive.EdgeForm;
import undermask.drive.Edges;
import undermask.drive.Modulation;
import undermask.drive.ModulationPlan;
import undermask.drive.OperatingPoint;
import undermask.drive.Switching;
import undermask.drive.VoltageCurve;
import undermask.signal.EdgeTrain;

/** Bridges for tests: 565 V link, 50 Hz, and what a test wants different. */
final class Bridges {
    static final double LINK = 565;
    static final double OUTPUT = 50;
    /** As steep as the settings allow: 2.8 ns from rail to rail. */
    static final double STEEP = 200e9;

    private Bridges() {}

    static DriveSettings settings(
            double carrierHz, Modulation modulation, CarrierSampling sampling, double deadTime, double index) {
        double lineVoltage = index * LINK / 2 * Math.sqrt(1.5);
        return new DriveSettings(
                Carrier.fixed(carrierHz, sampling),
                ModulationPlan.of(modulation),
                Switching.of(deadTime),
                Edges.of(STEEP, STEEP, EdgeForm.RAMP),
                new VoltageCurve(lineVoltage, OUTPUT, 0),
                OptionalDouble.of(LINK));
    }

    static Bridge without(Modulation modulation, CarrierSampling sampling, double ratio, double index) {
        return switched(settings(ratio * OUTPUT, modulation, sampling, 0, index), new OperatingPoint(OUTPUT, 5, 0.8));
    }

    /** A bridge on a constant link whose load takes sines and slows no edge. */
    static Bridge switched(DriveSettings settings, OperatingPoint point) {
        return Bridge.switching(settings, point, LinkVoltage.constant(LINK), OutputLoad.IDEAL);
    }

    /** Coefficients of all lines from 1 to the highest wanted; their edges taken as ideal: the ramp divided out. */
    static double[][] lines(EdgeTrain train, int highest) {
        double[] re = new double[highest + 1];
        double[] im = new double[highest + 1];
        double[] shiftedRe = new double[highest];
        double[] shiftedIm = new double[highest];
        train.lines().read(1, highest, shiftedRe, shiftedIm);
        for (int n = 1; n <= highest; n++) {
            double x = Math.PI * n / train.period() * LINK / STEEP;
            double ramp = x == 0 ? 1 : Math.sin(x) / x;
            // an edge begins at its instant, so that its middle is half a transition late
            re[n] = (shiftedRe[n - 1] * Math.cos(x) - shiftedIm[n - 1] * Math.sin(x)) / ramp;
            im[n] = (shiftedRe[n - 1] * Math.sin(x) + shiftedIm[n - 1] * Math.cos(x)) / ramp;
        }
        return new double[][] {re, im};
    }

    /** Peak amplitudes of the lines, index 0 unused. */
    static double[] peaks(EdgeTrain train, int highest) {
        double[][] lines = lines(train, highest);
        double[] peaks = new double[highest + 1];
        for (int n = 1; n <= highest; n++) {
            peaks[n] = 2 * Math.hypot(lines[0][n], lines[1][n]);
        }
        return peaks;
    }
}
