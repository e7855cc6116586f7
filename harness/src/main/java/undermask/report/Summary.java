package undermask.report;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import undermask.mask.Judgement;
import undermask.mask.Verdict;
import undermask.unit.Figures;

/** All profiles of a run in short: as CSV, for a merge request and for the console. */
public final class Summary {
    private static final int NAME_WIDTH = 22;
    private static final String RESET = "\u001b[0m";

    private final List<Outcome> outcomes;

    /**
     * Sums up a run.
     *
     * @param outcomes in the order of the CSV
     */
    public Summary(List<Outcome> outcomes) {
        this.outcomes = List.copyOf(outcomes);
    }

    /** A row for each profile, operating point and detector; point {@code all} is the envelope over the points. */
    String csv() {
        Csv csv = new Csv(List.of(
                "profile",
                "point",
                "mask",
                "detector",
                "frequency_hz",
                "level_dbuv",
                "limit_dbuv",
                "margin_db",
                "required_db",
                "verdict"));
        for (Outcome outcome : outcomes) {
            for (Outcome.Point point : outcome.points()) {
                point.judgements().forEach(judgement -> row(csv, outcome, point.label(), judgement));
            }
            outcome.judgements().forEach(judgement -> row(csv, outcome, "all", judgement));
        }
        return csv.toString();
    }

    private static void row(Csv csv, Outcome outcome, String point, Judgement judgement) {
        csv.row(
                Csv.text(outcome.profile().name()),
                point,
                Csv.text(outcome.profile().mask().name()),
                judgement.detector().words(),
                Csv.frequency(judgement.frequencyHz()),
                Csv.level(judgement.levelDbuv()),
                Csv.level(judgement.limitDbuv()),
                Csv.level(judgement.marginDb()),
                Csv.level(judgement.requiredDb()),
                judgement.verdict().words());
    }

    /** A table to paste into a merge request, worst first. */
    String markdown() {
        StringBuilder text = new StringBuilder();
        text.append("| profile | verdict | margin | detector | frequency | point | mask |\n");
        text.append("| --- | --- | ---: | --- | ---: | --- | --- |\n");
        for (Outcome outcome : worstFirst()) {
            Judgement worst = outcome.worst();
            text.append("| ")
                    .append(String.join(
                            " | ",
                            escaped(outcome.profile().name()),
                            outcome.verdict().words(),
                            Figures.fixed(worst.marginDb(), 1) + " dB",
                            worst.detector().words(),
                            Finding.frequency(worst),
                            outcome.pointOf(worst).label(),
                            escaped(outcome.profile().mask().name())))
                    .append(" |\n");
        }
        notes().forEach(note -> text.append("\n- ").append(escaped(note)));
        return text.append(notes().isEmpty() ? "\n" : "\n\n")
                .append(counts())
                .append('\n')
                .toString();
    }

    private static String escaped(String text) {
        return text.replace("&", "&amp;")
                .replace("<", "&lt;")
                .replaceAll("([\\\\`*_\\[\\]|])", "\\\\$1")
                .replaceAll("\\s+", " ");
    }

    /**
     * The table for a console of 80 columns, worst first, and the findings that do not pass.
     *
     * @param colour whether verdicts are coloured
     */
    public String console(boolean colour) {
        StringBuilder text = new StringBuilder();
        text.append(line("profile", "verdict", "margin", "detector", "frequency", "point"))
                .append('\n');
        for (Outcome outcome : worstFirst()) {
            Judgement worst = outcome.worst();
            String plain = line(
                    outcome.profile().name(),
                    outcome.verdict().words(),
                    Figures.fixed(worst.marginDb(), 1) + " dB",
                    worst.detector().words(),
                    Finding.frequency(worst),
                    outcome.pointOf(worst).label());
            text.append(colour ? coloured(plain, outcome.verdict()) : plain).append('\n');
        }
        for (Outcome outcome : worstFirst()) {
            outcome.judgements().stream()
                    .filter(judgement -> !outcome.passes(judgement))
                    .map(judgement -> new Finding(outcome, judgement).text())
                    .forEach(finding -> text.append('\n').append(finding).append('\n'));
            if (!outcome.advice().isEmpty()) {
                text.append('\n').append(String.join("\n", outcome.advice())).append('\n');
            }
            outcome.furtherLimits().stream()
                    .filter(limit -> !limit.kept())
                    .forEach(limit -> text.append('\n')
                            .append(limit.place())
                            .append(": ")
                            .append(outcome.profile().name())
                            .append(": ")
                            .append(limit.text())
                            .append('\n'));
        }
        notes().forEach(note -> Paragraph.append(text.append('\n'), note, "note: ", "  "));
        sureness().forEach(said -> Paragraph.append(text.append('\n'), said, "", ""));
        return text.append('\n').append(counts()).append('\n').toString();
    }

    /** What is remarkable about operating points; points of one profile with the same remark share it. */
    private List<String> notes() {
        List<String> notes = new ArrayList<>();
        for (Outcome outcome : outcomes) {
            outcome.profile()
                    .remarks()
                    .forEach(remark -> notes.add(outcome.profile().name() + ": " + remark));
            Map<String, List<String>> points = new LinkedHashMap<>();
            for (Outcome.Point point : outcome.points()) {
                point.remarks()
                        .forEach(remark -> points.computeIfAbsent(remark, key -> new ArrayList<>())
                                .add(point.label()));
            }
            points.forEach(
                    (remark, at) -> notes.add(outcome.profile().name() + ", " + String.join(", ", at) + ": " + remark));
        }
        return notes;
    }

    private static String line(
            String name, String verdict, String margin, String detector, String frequency, String point) {
        String shown = name.length() <= NAME_WIDTH ? name : name.substring(0, NAME_WIDTH - 1) + "…";
        String row = String.format(
                java.util.Locale.ROOT,
                "%-" + NAME_WIDTH + "s %-7s %8s  %-10s %10s  %s",
                shown,
                verdict,
                margin,
                detector,
                frequency,
                point);
        return row.length() <= 80 ? row : row.substring(0, 79) + "…";
    }

    private static String coloured(String row, Verdict verdict) {
        String code = switch (verdict) {
            case CLEAR -> "\u001b[32m";
            case TIGHT -> "\u001b[33m";
            case OVER -> "\u001b[31m";
        };
        String word = verdict.words();
        int at = row.indexOf(word, NAME_WIDTH);
        return row.substring(0, at) + code + word + RESET + row.substring(at + word.length());
    }

    /** What is judged when values are drawn anew, and how sure a laboratory is. */
    private List<String> sureness() {
        List<String> said = new ArrayList<>();
        outcomes.stream()
                .map(outcome -> outcome.profile().policy())
                .filter(policy -> policy.toleranceRuns() > 0)
                .findFirst()
                .ifPresent(policy -> said.add("judged is percentile "
                        + Figures.significant(100 * policy.percentile(), 3) + " of " + policy.toleranceRuns()
                        + " runs with values drawn anew; a laboratory's own uncertainty is up to 3.4 dB from"
                        + " 150 kHz on, 3.8 dB below (CISPR 16-4-2)"));
        return said;
    }

    private String counts() {
        StringBuilder text = new StringBuilder();
        text.append(outcomes.size()).append(outcomes.size() == 1 ? " profile: " : " profiles: ");
        for (Verdict verdict : Verdict.values()) {
            text.append(verdict.ordinal() == 0 ? "" : ", ")
                    .append(outcomes.stream()
                            .filter(outcome -> outcome.verdict() == verdict)
                            .count())
                    .append(' ')
                    .append(verdict.words());
        }
        return text.toString();
    }

    private List<Outcome> worstFirst() {
        return outcomes.stream()
                .sorted(Comparator.comparing(Outcome::verdict)
                        .reversed()
                        .thenComparingDouble(outcome -> outcome.worst().marginDb())
                        .thenComparing(outcome -> outcome.profile().name()))
                .toList();
    }
}
