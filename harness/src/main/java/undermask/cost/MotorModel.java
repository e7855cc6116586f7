package undermask.cost;

/**
 * A motor as its heat sees it, estimated from rated power and voltage: losses of efficiency class IE3 at four poles and
 * 50 Hz, split as is usual, and the resistances that make them.
 *
 * <p>Sources: IEC 60034-30-1 (nominal efficiencies), trade texts (split of losses), common practice (power factor, bar
 * heights).
 *
 * @param ratedPower shaft power, W
 * @param lineVoltage rated, V
 * @param ratedCurrent rms, A
 * @param statorResistance per phase of the star circuit, ohm
 * @param rotorResistance referred to the stator, ohm
 * @param leakage stator and rotor together, per phase, H
 * @param coreLoss at rated voltage and frequency, W
 * @param mechanicalLoss friction and windage at rated speed, W
 * @param strayLoss at rated current, W
 */
record MotorModel(
        double ratedPower,
        double lineVoltage,
        double ratedCurrent,
        double statorResistance,
        double rotorResistance,
        double leakage,
        double coreLoss,
        double mechanicalLoss,
        double strayLoss) {
    /** kW and nominal efficiency IE3 in percent. */
    private static final double[][] EFFICIENCY = {
        {0.75, 82.5},
        {1.1, 84.1},
        {1.5, 85.3},
        {2.2, 86.7},
        {3, 87.7},
        {4, 88.6},
        {5.5, 89.6},
        {7.5, 90.4},
        {11, 91.4},
        {15, 92.1},
        {18.5, 92.6},
        {22, 93.0},
        {30, 93.6},
        {37, 93.9},
        {45, 94.2},
        {55, 94.6},
        {75, 95.0}
    };
    /** kW and power factor at rated load, common practice. */
    private static final double[][] POWER_FACTOR = {{0.37, 0.72}, {0.75, 0.75}, {4, 0.82}, {15, 0.85}, {75, 0.87}};

    private static final double STATOR_SHARE = 0.33;
    private static final double ROTOR_SHARE = 0.20;
    private static final double CORE_SHARE = 0.20;
    private static final double MECHANICAL_SHARE = 0.10;
    /** Of the stator's current, what reaches the rotor at rated load. */
    private static final double ROTOR_CURRENT = 0.9;

    /** Height of a rotor bar of 4 kW, m; grows with the cube root of power. */
    private static final double BAR_HEIGHT = 18e-3;
    /** Height of a stator wire, round and stranded, taken as a strip, m. */
    private static final double WIRE_HEIGHT = 0.9e-3;
    /** Hot aluminium, S/m. */
    private static final double ALUMINIUM = 25e6;
    /** Hot copper, S/m. */
    private static final double COPPER = 44e6;

    static MotorModel estimated(double ratedPower, double lineVoltage, double leakage) {
        double kilowatts = ratedPower / 1e3;
        double efficiency = between(EFFICIENCY, kilowatts) / 100;
        double current = ratedPower / (Math.sqrt(3) * lineVoltage * efficiency * between(POWER_FACTOR, kilowatts));
        double loss = ratedPower * (1 / efficiency - 1);
        double rotorCurrent = ROTOR_CURRENT * current;
        return new MotorModel(
                ratedPower,
                lineVoltage,
                current,
                STATOR_SHARE * loss / (3 * current * current),
                ROTOR_SHARE * loss / (3 * rotorCurrent * rotorCurrent),
                leakage,
                CORE_SHARE * loss,
                MECHANICAL_SHARE * loss,
                (1 - STATOR_SHARE - ROTOR_SHARE - CORE_SHARE - MECHANICAL_SHARE) * loss);
    }

    /** Straight over the logarithm of power, held beyond the ends. */
    private static double between(double[][] table, double kilowatts) {
        if (kilowatts <= table[0][0]) {
            return table[0][1];
        }
        int upper = 1;
        while (upper < table.length - 1 && table[upper][0] < kilowatts) {
            upper++;
        }
        double place = Math.min(
                1, Math.log(kilowatts / table[upper - 1][0]) / Math.log(table[upper][0] / table[upper - 1][0]));
        return table[upper - 1][1] + place * (table[upper][1] - table[upper - 1][1]);
    }

    /** All losses at rated load on sines, W. */
    double ratedLoss() {
        return 3 * ratedCurrent * ratedCurrent * statorResistance
                + 3 * Math.pow(ROTOR_CURRENT * ratedCurrent, 2) * rotorResistance
                + coreLoss
                + mechanicalLoss
                + strayLoss;
    }

    /** Copper loss on sines at a current, W. */
    double copperLoss(double current) {
        return 3 * current * current * (statorResistance + ROTOR_CURRENT * ROTOR_CURRENT * rotorResistance);
    }

    /** Resistance of stator and rotor in series at a harmonic, ohm. */
    double resistance(double frequency) {
        return statorResistance * DeepBar.resistance(DeepBar.reducedHeight(WIRE_HEIGHT, frequency, COPPER))
                + rotorResistance * DeepBar.resistance(barHeight(frequency));
    }

    /** Leakage inductance at a harmonic, H: a third of it is the rotor's slot leakage, which the crowding lowers. */
    double leakage(double frequency) {
        return leakage * (2.0 / 3 + DeepBar.leakage(barHeight(frequency)) / 3);
    }

    private double barHeight(double frequency) {
        double height = BAR_HEIGHT * Math.cbrt(ratedPower / 4e3);
        return DeepBar.reducedHeight(height, frequency, ALUMINIUM);
    }
}
