package undermask.pwm;

import undermask.drive.DriveSettings;
import undermask.drive.OperatingPoint;
import undermask.signal.EdgeTrain;

public final class Bridge {
    public static Bridge switching(DriveSettings settings, OperatingPoint point, double linkVoltage) {
        throw new UnsupportedOperationException();
    }

    public AnalysisWindow window() {
        throw new UnsupportedOperationException();
    }

    public double linkVoltage() {
        throw new UnsupportedOperationException();
    }

    /** M, peak of the phase fundamental over half the link voltage, as asked for by the V/f curve. */
    public double modulationIndex() {
        throw new UnsupportedOperationException();
    }

    /** Whether the reference is clipped: M beyond the scheme's linear range. */
    public boolean overmodulated() {
        throw new UnsupportedOperationException();
    }

    /** Voltage of leg 0, 1 or 2 against the link's mid-point. */
    public EdgeTrain leg(int k) {
        throw new UnsupportedOperationException();
    }

    public EdgeTrain commonMode() {
        throw new UnsupportedOperationException();
    }

    /** Leg 0 minus leg 1. */
    public EdgeTrain lineToLine() {
        throw new UnsupportedOperationException();
    }
}
