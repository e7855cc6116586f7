package undermask.report;

import java.util.List;
import undermask.check.Profile;
import undermask.drive.DriveSettings;
import undermask.mask.Judgement;
import undermask.mask.Verdict;
import undermask.unit.Dimension;
import undermask.unit.Figures;
import undermask.unit.Place;

/** A judgement in words, with the row of the profile to begin at. */
public final class Finding {
    private static final double LEAD_RESONANCES_FROM = 2e6;

    private final Outcome outcome;
    private final Judgement judgement;

    public Finding(Outcome outcome, Judgement judgement) {
        this.outcome = outcome;
        this.judgement = judgement;
    }

    /** The lines of the finding, the first one beginning with {@code file:line:column:}. */
    public List<String> lines() {
        return List.of(
                place() + ":",
                "  " + judgement.verdict().words() + ": " + headline(),
                "  " + judgement.detector().words() + " " + level(judgement.levelDbuv()) + " at "
                        + frequency(judgement) + " (" + order(outcome, judgement) + "), limit "
                        + level(judgement.limitDbuv()),
                "  mask " + profile().mask().name() + ", worst at " + outcome.pointOf(judgement),
                "  next: " + next());
    }

    /** The finding as one text. */
    public String text() {
        return String.join("\n", lines());
    }

    private String headline() {
        double margin = judgement.marginDb();
        return judgement.verdict() == Verdict.OVER
                ? Figures.fixed(-margin, 1) + " dB above the limit"
                : Figures.fixed(margin, 1) + " dB under the limit, " + Figures.fixed(judgement.requiredDb(), 1)
                        + " dB required";
    }

    private Place place() {
        return profile()
                .place(
                        judgement.frequencyHz() < LEAD_RESONANCES_FROM
                                ? DriveSettings.CARRIER.quantity()
                                : DriveSettings.SLEW_RISING.quantity());
    }

    private String next() {
        if (profile().installation().filter().isEmpty()) {
            return "fit a mains filter, its case flat on the mounting plate";
        }
        return judgement.frequencyHz() < LEAD_RESONANCES_FROM
                ? "try a lower carrier, a shorter motor lead or a larger choke"
                : "try a lower dv/dt or a shorter earth lead of the mains filter";
    }

    private Profile profile() {
        return outcome.profile();
    }

    static String frequency(Judgement judgement) {
        return Figures.withUnit(judgement.frequencyHz(), Dimension.FREQUENCY, 5);
    }

    static String level(double levelDbuv) {
        return Figures.fixed(levelDbuv, 1) + " dBuV";
    }

    /** The multiple of the carrier nearest to a judgement's frequency: {@code 38 x carrier}. */
    static String order(Outcome outcome, Judgement judgement) {
        return Math.round(judgement.frequencyHz() / outcome.profile().settings().carrierHz()) + " x carrier";
    }
}
