package undermask.pwm;

import java.util.ArrayList;
import java.util.List;
import undermask.drive.Overmodulation;
import undermask.drive.ShortPulses;
import undermask.drive.Spread;
import undermask.unit.Dimension;
import undermask.unit.Figures;

/** What a drive engineer should know of a bridge at a point, in sentences. */
final class Remarks {
    /** Share of unfinished edges from which on they are worth a word. */
    private static final double WORTH_A_WORD = 0.1;

    private final List<String> remarks = new ArrayList<>();

    Remarks overmodulation(Reference reference, double index, Overmodulation overmodulation) {
        if (reference.sixStep()) {
            remarks.add("six-step: the legs switch once per half-wave");
        } else if (reference.clipped()) {
            remarks.add("modulation index " + Figures.fixed(index, 3) + " is beyond the linear range of "
                    + reference.modulation().words() + ", "
                    + Figures.fixed(Reference.linearLimit(reference.modulation()), 3)
                    + ": the reference is clipped"
                    + switch (overmodulation) {
                        case COMPENSATED -> " and raised to give the voltage asked for";
                        case CLIPPED -> ", the output voltage falls short";
                    });
        }
        return this;
    }

    Remarks spread(Spread spread, int carrierPeriods, AnalysisWindow window) {
        if (!spread.none()) {
            remarks.add("the carrier is spread over " + carrierPeriods + " periods in a window of "
                    + Figures.withUnit(window.seconds(), Dimension.TIME, 3)
                    + ": twice the 160 ms in which the quasi-peak detector forgets");
        }
        return this;
    }

    Remarks shortPulses(int count, ShortPulses handling) {
        if (count > 0) {
            remarks.add(count + " pulses and gaps of a window are shorter than the minimum pulse width and "
                    + switch (handling) {
                        case DROP -> "dropped";
                        case HOLD -> "held";
                    });
        }
        return this;
    }

    Remarks unfinishedEdges(int unfinished, int edges) {
        if (unfinished > WORTH_A_WORD * edges) {
            remarks.add(Figures.fixed(100.0 * unfinished / edges, 0)
                    + " % of the edges are not finished by the current and forced when the dead time ends");
        }
        return this;
    }

    List<String> all() {
        return List.copyOf(remarks);
    }
}
