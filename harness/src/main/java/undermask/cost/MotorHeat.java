package undermask.cost;

import java.util.List;
import undermask.installation.Installation;
import undermask.installation.MotorCooling;
import undermask.pwm.Bridge;
import undermask.signal.EdgeTrain;
import undermask.signal.Lines;

/**
 * What a bridge's voltage heats in a motor.
 *
 * @param harmonicCopperLoss in stator and rotor, W
 * @param harmonicCoreLoss W
 * @param loss all losses at the point, W
 * @param ratedLoss all losses at rated load on sines, W
 * @param windingCelsius temperature of the winding
 * @param lifeFactor life against that at the temperature of the insulation class, by the 10 K rule
 */
public record MotorHeat(
        double harmonicCopperLoss,
        double harmonicCoreLoss,
        double loss,
        double ratedLoss,
        double windingCelsius,
        double lifeFactor) {
    private static final double HIGHEST_HZ = 100e3;
    /** Share of the core loss that eddy currents make (common practice). */
    private static final double EDDY_SHARE = 0.4;
    /** Above this the sheets' own eddy currents push the flux out, Hz (0.5 mm sheet, common practice). */
    private static final double SHEET_HZ = 2e3;
    /** Rise at rated load: class F built for the rise of class B (IEC 60034-1 table 8), K. */
    private static final double RATED_RISE = 80;

    /** Class F, °C. */
    public static final double CLASS_CELSIUS = 155;
    /** What a housing gives off without its fan, over what it does at rated speed (common practice). */
    private static final double STANDSTILL_COOLING = 0.3;

    private static final double BASE_HZ = 50;

    /** Works the heat out at a bridge's operating point; a shaft-mounted fan cools with the speed. */
    public static MotorHeat of(Installation installation, Bridge bridge) {
        double lineVoltage =
                installation.supply().phases() == 1 ? installation.supply().voltage() : 400;
        MotorModel motor =
                MotorModel.estimated(installation.motor().ratedPower(), lineVoltage, installation.phaseInductance());
        double[] harmonic = harmonics(motor, bridge);
        double output = bridge.point().outputHz();
        double current =
                bridge.point().loadCurrentRms() / installation.fitting().motors();
        double flux = bridge.fundamentalVoltage() / lineVoltage * BASE_HZ / output;
        boolean forced = installation.motorPlace().cooling() == MotorCooling.FORCED;
        double speed = forced ? 1 : Math.min(1, output / BASE_HZ);
        double loss = motor.copperLoss(current)
                + motor.coreLoss() * flux * flux * Math.pow(output / BASE_HZ, 1.5)
                + motor.mechanicalLoss() * Math.pow(output / BASE_HZ, 2)
                + motor.strayLoss() * Math.pow(current / motor.ratedCurrent(), 2)
                + harmonic[0]
                + harmonic[1];
        double cooling = STANDSTILL_COOLING + (1 - STANDSTILL_COOLING) * Math.pow(speed, 0.8);
        double celsius = installation.motorPlace().ambientCelsius() + RATED_RISE * loss / motor.ratedLoss() / cooling;
        return new MotorHeat(
                harmonic[0],
                harmonic[1],
                loss,
                motor.ratedLoss(),
                celsius,
                Math.pow(2, (CLASS_CELSIUS - celsius) / 10));
    }

    /** Copper and core loss of all lines but the fundamental, up to 100 kHz, W. */
    static double[] harmonics(MotorModel motor, Bridge bridge) {
        EdgeTrain phase = EdgeTrain.sum(List.of(bridge.leg(0), bridge.commonMode()), 1, -1);
        Lines lines = phase.lines();
        int fundamental = bridge.window().fundamentalPeriods();
        int count = (int) (HIGHEST_HZ / lines.spacing());
        double[] re = new double[count];
        double[] im = new double[count];
        lines.read(1, count, re, im);
        double copper = 0;
        double core = 0;
        double first = re[fundamental - 1] * re[fundamental - 1] + im[fundamental - 1] * im[fundamental - 1];
        for (int n = fundamental + 1; n <= count; n++) {
            double frequency = n * lines.spacing();
            double square = 2 * (re[n - 1] * re[n - 1] + im[n - 1] * im[n - 1]);
            double resistance = motor.resistance(frequency);
            double reactance = 2 * Math.PI * frequency * motor.leakage(frequency);
            copper += 3 * square / (resistance * resistance + reactance * reactance) * resistance;
            core += square / (2 * first) / Math.sqrt(1 + frequency / SHEET_HZ);
        }
        return new double[] {copper, EDDY_SHARE * motor.coreLoss() * core};
    }
}
