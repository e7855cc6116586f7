package undermask.network;

import undermask.installation.MotorPart;
import undermask.installation.Parasitic;

/**
 * A motor as common mode sees it: the small capacitance at its terminals in series with the frame's resistance, and
 * beside it the residual capacitance at the star point behind the winding.
 *
 * <p>Source: Mirafzal, Skibinski, Tallam, Schlegel and Lukaszewski, Universal induction motor model, IEEE Trans. Ind.
 * Appl. 43(5) 2007, with the three phases in parallel.
 */
public final class CommonModeMotor {
    private static final String TERMINALS = "motor terminals";
    private static final String FRAME = "motor frame";

    private CommonModeMotor() {}

    /**
     * The impedance of the three terminals together to the frame.
     *
     * @param frequency in Hz, above 0
     */
    public static Phasor impedance(MotorPart motor, double frequency) {
        Circuit.Builder circuit = Circuit.around(FRAME);
        addTo(circuit, motor, TERMINALS, FRAME);
        return circuit.build().solver().tune(frequency).impedance(TERMINALS, FRAME);
    }

    static void addTo(Circuit.Builder circuit, MotorPart motor, String terminals, String frame) {
        addTo(circuit, motor, terminals, frame, "motor star point", Variation.NONE);
    }

    static void addTo(
            Circuit.Builder circuit,
            MotorPart motor,
            String terminals,
            String frame,
            String star,
            Variation variation) {
        double loss = variation.factor(Parasitic.MOTOR_LOSS);
        circuit.seriesResonant(
                terminals,
                frame,
                loss * motor.frameResistance(),
                0,
                3 * variation.factor(Parasitic.MOTOR_TERMINALS) * motor.terminalCapacitance());
        circuit.inductor(terminals, star, variation.factor(Parasitic.MOTOR_WINDING) * motor.windingInductance());
        circuit.resistor(terminals, star, loss * motor.windingResistance());
        circuit.capacitor(star, frame, variation.factor(Parasitic.MOTOR_STAR) * motor.starCapacitance());
    }
}
