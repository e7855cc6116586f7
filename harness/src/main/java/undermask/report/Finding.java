package undermask.report;

import java.util.List;
import java.util.stream.Collectors;
import undermask.check.Leverage;
import undermask.check.Profile;
import undermask.drive.Carrier;
import undermask.drive.Edges;
import undermask.mask.Judgement;
import undermask.unit.Dimension;
import undermask.unit.Figures;
import undermask.unit.Place;

/** A judgement in words, with the row of the profile to begin at. */
public final class Finding {
    private static final double LEAD_RESONANCES_FROM = 2e6;

    private final Outcome outcome;
    private final Judgement judgement;

    /** A judgement of an outcome, put in words. */
    public Finding(Outcome outcome, Judgement judgement) {
        this.outcome = outcome;
        this.judgement = judgement;
    }

    /** What was judged and how far it is from its limit: {@code average over by 3.1 dB}. */
    public String headline() {
        return judgement.detector().words() + " "
                + switch (judgement.verdict()) {
                    case CLEAR -> "clear by " + Figures.fixed(judgement.marginDb(), 1) + " dB";
                    case TIGHT -> "tight, " + Figures.fixed(judgement.marginDb(), 1) + " dB left";
                    case OVER -> "over by " + Figures.fixed(-judgement.marginDb(), 1) + " dB";
                };
    }

    /** A finding in a line: {@code brine-pump: average clear by 6.5 dB at 9.681 MHz (iec61800-3-c2)}. */
    public String title() {
        return profile().name() + ": " + headline() + " at " + frequency(judgement) + " ("
                + profile().mask().name() + ")";
    }

    /** The lines of the finding, the first one beginning with {@code file:line:column:}. */
    public List<String> lines() {
        return List.of(
                place() + ": " + headline(),
                "  reads " + level(judgement.levelDbuv()) + " at " + frequency(judgement) + " ("
                        + order(outcome, judgement) + "), limit " + level(judgement.limitDbuv()),
                "  mask " + profile().mask().name() + ", " + Figures.fixed(judgement.requiredDb(), 1)
                        + " dB margin required",
                "  worst at " + outcome.pointOf(judgement).label(),
                "  " + rules(),
                "  dB per +20 %: " + leverage(),
                "  next: " + next());
    }

    /** The finding as one text. */
    public String text() {
        return String.join("\n", lines());
    }

    private String rules() {
        Leverage leverage = outcome.leverage(judgement);
        double lead = leverage.commonModeLeadDb();
        return (leverage.commonModeRules()
                        ? "common mode rules, differential mode "
                        : "differential mode rules, common mode ")
                + Figures.fixed(Math.abs(lead), 1) + " dB below";
    }

    /** The strongest values with what a fifth more of each does. */
    private String leverage() {
        return outcome.leverage(judgement).elements().stream()
                .limit(2)
                .map(element -> element.parasitic().words()
                        + (element.decibels() >= 0 ? " +" : " ")
                        + Figures.fixed(element.decibels(), 1))
                .collect(Collectors.joining(", "));
    }

    private Place place() {
        return profile()
                .place(judgement.frequencyHz() < LEAD_RESONANCES_FROM ? carrierRow() : Edges.SLEW_RISING.quantity());
    }

    private String carrierRow() {
        return profile().settings().carrier().synchronous()
                ? Carrier.MULTIPLE.quantity()
                : Carrier.FREQUENCY.quantity();
    }

    private String next() {
        if (profile().installation().filter().isEmpty()) {
            return "fit a mains filter, its case flat on the mounting plate";
        }
        if (!outcome.leverage(judgement).commonModeRules()) {
            return "try a lower carrier, a larger X capacitor or a line reactor";
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
        return Math.round(judgement.frequencyHz() / outcome.pointOf(judgement).carrierHz()) + " x carrier";
    }
}
