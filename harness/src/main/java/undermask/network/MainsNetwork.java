package undermask.network;

import undermask.installation.Capacitor;
import undermask.unit.Worded;

/**
 * The artificial mains networks that limits are written for, one network per mains conductor.
 *
 * <p>From the terminal of the equipment inwards: a coil of 50 µH whose far end is held by a shunt capacitor; for 9 kHz a
 * second coil and a second shunt towards the mains; beside the terminal the coupling capacitor to the receiver with its
 * discharge resistor. The mains terminal is left open, as MIL-STD-461G has it and because the shunts are there to make
 * the impedance independent of the mains.
 *
 * <p>The level that a mask limits is the voltage at the equipment's terminal: a laboratory adds the network's calibrated
 * voltage division factor to the receiver's reading.
 *
 * <p>Sources: CISPR 16-1-2 clause 4 and annex A (from memory), MIL-STD-461G figure 6 and A.5.5. The published CISPR
 * example components meet the published impedance only within the standard's 20 % and 11.5°; where they differ from
 * {@code 50 Ω ∥ (50 µH + 5 Ω)} and {@code 50 Ω ∥ 50 µH} by more than 2 % and 2°, the component is chosen to hold that:
 *
 * <ul>
 *   <li>9 kHz: coupling 2.2 µF for 0.25 µF; second shunt 4 µF with 5 Ω for 2…4 µF with 10 Ω, so that the two shunts and
 *       the 250 µH between them together look like the 5 Ω that is asked for.
 *   <li>150 kHz: coupling 1 µF for 0.1 µF; 0.1 Ω for the losses of the shunt and the coil.
 *   <li>both: the receiver's 50 Ω beside the discharge resistor is brought back to 50 Ω by a series resistor.
 * </ul>
 */
public enum MainsNetwork implements Worded {
    /** CISPR 16-1-2, 50 Ω ∥ (50 µH + 5 Ω), 9 kHz to 30 MHz. */
    CISPR_9_KHZ(
            "cispr-50uh-5ohm",
            new Capacitor(8e-6, 5, 0),
            new SecondStage(250e-6, new Capacitor(4e-6, 5, 0)),
            new Capacitor(2.2e-6, MainsNetwork.MISSING_TO_50_OHM, 0)),
    /** CISPR 16-1-2, 50 Ω ∥ 50 µH, 150 kHz to 30 MHz. */
    CISPR_150_KHZ(
            "cispr-50uh", new Capacitor(1e-6, 0.1, 0), null, new Capacitor(1e-6, MainsNetwork.MISSING_TO_50_OHM, 0)),
    /** MIL-STD-461G figure 6, 50 µH, 10 kHz to 10 MHz. */
    MIL_STD_461("mil-std-461", new Capacitor(8e-6, 5, 0), null, new Capacitor(0.25e-6, 0, 0)) {
        /** The receiver's reading and the standard's correction for the coupling capacitor, MIL-STD-461G A.5.5. */
        @Override
        Phasor level(CircuitSolver solved, String line, double frequency) {
            double correction = Math.sqrt(1 + 5.60e-9 * frequency * frequency) / (7.48e-5 * frequency);
            return solved.voltage(receiver(line)).times(correction);
        }
    };

    private static final double COIL = 50e-6;
    private static final double RECEIVER = 50;
    private static final double DISCHARGE = 1000;
    /** 50 Ω less 50 Ω beside 1 kΩ. */
    private static final double MISSING_TO_50_OHM = 50 - 1 / (1 / 50.0 + 1 / 1000.0);

    private final String words;
    private final Capacitor shunt;
    private final SecondStage secondStage;
    private final Capacitor coupling;

    /** Coil and shunt on the mains side of the first shunt. */
    private record SecondStage(double coil, Capacitor shunt) {}

    MainsNetwork(String words, Capacitor shunt, SecondStage secondStage, Capacitor coupling) {
        this.words = words;
        this.shunt = shunt;
        this.secondStage = secondStage;
        this.coupling = coupling;
    }

    @Override
    public String words() {
        return words;
    }

    /** The node of a line where the equipment is connected: {@code L1 mains terminal}. */
    public static String terminal(String line) {
        return line + " mains terminal";
    }

    /** The node of a line where the receiver is connected: {@code L1 receiver}. */
    public static String receiver(String line) {
        return line + " receiver";
    }

    /**
     * Adds the network of one mains conductor, the receiver's 50 Ω included, between {@link #terminal} and a circuit's
     * reference.
     *
     * @param line name of the conductor
     * @param ground the reference ground plane
     */
    public void addTo(Circuit.Builder circuit, String line, String ground) {
        String behindCoil = line + " behind 50 uH";
        if (secondStage != null) {
            String mains = line + " mains";
            addCapacitor(circuit, mains, ground, secondStage.shunt());
            circuit.inductor(mains, behindCoil, secondStage.coil());
        }
        addCapacitor(circuit, behindCoil, ground, shunt);
        circuit.inductor(behindCoil, terminal(line), COIL);
        circuit.resistor(receiver(line), ground, RECEIVER);
        circuit.resistor(receiver(line), ground, DISCHARGE);
        addCapacitor(circuit, receiver(line), terminal(line), coupling);
    }

    /**
     * What a laboratory reports for a line: the voltage at the equipment's terminal, which is the receiver's reading and
     * the network's voltage division factor.
     *
     * @param solved a circuit that holds this network, solved at {@code frequency}
     */
    Phasor level(CircuitSolver solved, String line, double frequency) {
        return solved.voltage(terminal(line));
    }

    private static void addCapacitor(Circuit.Builder circuit, String from, String to, Capacitor part) {
        circuit.seriesResonant(from, to, part.esr(), part.esl(), part.capacitance());
    }
}
