package undermask.receiver;

/**
 * The quasi-peak detector of CISPR 16-1-1: a capacitor charged through a diode and discharged through a resistor.
 *
 * <p>The diode conducts only while the carrier exceeds the capacitor's voltage v. With an envelope A and cos θ = v/A the
 * law of charge is dv/dt = A·(sin θ − θ·cos θ)/(π·S·C) − v/τ_d (CISPR 16-1-1, annex on the response to repeated pulses).
 * S·C is not published; it follows from the charge time constant, which is the time that a suddenly applied sine needs
 * to bring v to 1 − 1/e of its final value.
 */
public final class QuasiPeakDetector {
    private final double dischargeTime;
    private final double conduction;
    private final double sineGain;

    /**
     * Finds S·C.
     *
     * @param chargeTime electrical charge time constant in s
     * @param dischargeTime electrical discharge time constant in s, longer than the other
     */
    QuasiPeakDetector(double chargeTime, double dischargeTime) {
        if (!(chargeTime > 0 && dischargeTime > chargeTime)) {
            throw new IllegalArgumentException("a quasi-peak detector discharges more slowly than it charges");
        }
        this.dischargeTime = dischargeTime;
        double low = chargeTime / 10;
        double high = chargeTime * 10;
        for (int i = 0; i < 60; i++) {
            double middle = (low + high) / 2;
            if (riseTime(middle, dischargeTime) < chargeTime) {
                low = middle;
            } else {
                high = middle;
            }
        }
        this.conduction = (low + high) / 2;
        this.sineGain = finalValue(conduction / dischargeTime);
    }

    /** S·C in s. */
    public double chargingConstant() {
        return conduction / Math.PI;
    }

    /** Discharge time constant in s. */
    public double dischargeTime() {
        return dischargeTime;
    }

    /** Voltage on the capacitor for a steady sine of envelope 1; readings are divided by it. */
    public double sineGain() {
        return sineGain;
    }

    /** The ratio v/A at which charge and discharge of a steady sine balance. */
    private static double finalValue(double loss) {
        double low = 0;
        double high = 1;
        for (int i = 0; i < 60; i++) {
            double middle = (low + high) / 2;
            if (CapacitorRun.conducted(middle) > loss * middle) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return (low + high) / 2;
    }

    /** Time from 0 to 1 − 1/e of the final value for a suddenly applied sine, by Simpson's rule over v. */
    private static double riseTime(double conduction, double dischargeTime) {
        double loss = conduction / dischargeTime;
        double target = finalValue(loss) * (1 - Math.exp(-1));
        int intervals = 200;
        double sum = 0;
        for (int i = 0; i <= intervals; i++) {
            double v = target * i / intervals;
            int weight = i == 0 || i == intervals ? 1 : i % 2 == 0 ? 2 : 4;
            sum += weight / (CapacitorRun.conducted(v) - loss * v);
        }
        return conduction * sum * target / intervals / 3;
    }

    /**
     * The capacitor's voltage in its periodic state, divided by the gain for a sine: means over the batch's blocks, block
     * b of a lane at b·width + lane.
     */
    double[] settle(EnvelopeBatch batch) {
        double[] blocks = new CapacitorRun(batch, conduction, dischargeTime).settle(sineGain);
        for (int i = 0; i < blocks.length; i++) {
            blocks[i] /= sineGain;
        }
        return blocks;
    }
}
