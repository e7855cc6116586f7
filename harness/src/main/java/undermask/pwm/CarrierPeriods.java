package undermask.pwm;

import java.util.Arrays;
import java.util.SplittableRandom;
import java.util.function.DoubleUnaryOperator;
import undermask.drive.Spread;

/** Where each carrier period of a window begins: evenly, or with the carrier spread. */
final class CarrierPeriods {
    private final double[] starts;

    private CarrierPeriods(double[] starts) {
        this.starts = starts;
    }

    /**
     * Lays out the carrier periods. A spread carrier takes a new frequency at the start of each of its periods; the
     * whole is then stretched, by less than half a period, to fill the window.
     */
    static CarrierPeriods of(AnalysisWindow window, Spread spread) {
        double centre = window.carrierHz();
        double deviation = spread.deviationHz();
        return switch (spread.form()) {
            case NONE -> even(window);
            case RANDOM -> {
                SplittableRandom random = new SplittableRandom(spread.seed());
                yield filling(window, start -> centre + deviation * (2 * random.nextDouble() - 1));
            }
            case TRIANGLE -> {
                double rate = window.fitted(spread.rateHz());
                yield filling(window, start -> centre + deviation * (1 - 4 * Math.abs(turn(rate * start) - 0.5)));
            }
            case SINE -> {
                double rate = window.fitted(spread.rateHz());
                yield filling(window, start -> centre + deviation * Math.sin(2 * Math.PI * turn(rate * start)));
            }
        };
    }

    private static double turn(double turns) {
        return turns - Math.floor(turns);
    }

    private static CarrierPeriods even(AnalysisWindow window) {
        double[] starts = new double[window.carrierPeriods() + 1];
        double length = window.seconds() / window.carrierPeriods();
        for (int i = 0; i < starts.length; i++) {
            starts[i] = i * length;
        }
        return new CarrierPeriods(starts);
    }

    private static CarrierPeriods filling(AnalysisWindow window, DoubleUnaryOperator frequency) {
        double[] starts = new double[2 * window.carrierPeriods() + 2];
        int count = 0;
        while (starts[count] < window.seconds()) {
            if (count + 2 > starts.length) {
                starts = Arrays.copyOf(starts, 2 * starts.length);
            }
            starts[count + 1] = starts[count] + 1 / frequency.applyAsDouble(starts[count]);
            count++;
        }
        // the end that lies nearer to the window's
        if (count > 1 && window.seconds() - starts[count - 1] < starts[count] - window.seconds()) {
            count--;
        }
        double stretch = window.seconds() / starts[count];
        double[] fitted = new double[count + 1];
        for (int i = 0; i <= count; i++) {
            fitted[i] = starts[i] * stretch;
        }
        fitted[count] = window.seconds();
        return new CarrierPeriods(fitted);
    }

    int count() {
        return starts.length - 1;
    }

    /** Start of a period in s. */
    double start(int period) {
        return starts[period];
    }

    /** Length of a period in s. */
    double length(int period) {
        return starts[period + 1] - starts[period];
    }
}
