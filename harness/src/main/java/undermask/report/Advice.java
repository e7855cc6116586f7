package undermask.report;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import undermask.check.Check;
import undermask.check.Profile;
import undermask.check.ProfileResult;
import undermask.drive.Modulation;
import undermask.drive.OperatingPoint;
import undermask.input.ProfileFolder;
import undermask.input.Refused;
import undermask.input.SetRow;
import undermask.input.VariedProfile;
import undermask.installation.FilterPart;
import undermask.installation.ShieldTermination;
import undermask.mask.Judgement;
import undermask.unit.Dimension;
import undermask.unit.Figures;

/**
 * Single changes that bring a profile nearer to passing, each checked like a profile of its own: what it gains and what
 * it costs.
 */
final class Advice {
    private static final double HALF = 0.5;
    /** Changes below this are not worth a line, dB. */
    private static final double LEAST_GAIN = 0.5;
    /** So many changes are tried together with the best one. */
    private static final int PAIRED = 3;

    private final VariedProfile varied;
    private final Profile profile;
    private final Map<String, SetRow> worstPoint;
    private final Tradeoff saved;

    /**
     * A change and what comes of it.
     *
     * @param words what to do
     * @param gainDb by how much the smallest margin grows
     */
    private record Change(String words, Map<String, SetRow> rows, double gainDb, Tradeoff after) {
        /** Whether two changes set different rows. */
        boolean goesWith(Change other) {
            return rows.keySet().stream().noneMatch(other.rows.keySet()::contains);
        }
    }

    private Advice(VariedProfile varied, ProfileResult now) throws Refused {
        this.varied = varied;
        this.profile = now.profile();
        this.worstPoint = worstPoint(now);
        this.saved = checked(Map.of());
    }

    /** Rows that leave the operating point with the least margin alone: changes are weighed there. */
    private static Map<String, SetRow> worstPoint(ProfileResult now) {
        OperatingPoint point = now.points().stream()
                .min(Comparator.comparingDouble(result -> result.judgements().stream()
                        .mapToDouble(Judgement::marginDb)
                        .min()
                        .orElseThrow()))
                .orElseThrow()
                .point();
        return Map.of(
                OperatingPoint.OUTPUT.quantity(), new SetRow(Figures.significant(point.outputHz(), 9), "Hz"),
                OperatingPoint.CURRENT.quantity(), new SetRow(Figures.significant(point.loadCurrentRms(), 9), "A"),
                OperatingPoint.POWER_FACTOR.quantity(),
                        new SetRow(Figures.significant(point.displacementPowerFactor(), 9), ""));
    }

    /** A change checked at the worst point, and where it passes there, at all points. */
    private Tradeoff checked(Map<String, SetRow> rows) throws Refused {
        Map<String, SetRow> there = new LinkedHashMap<>(worstPoint);
        there.putAll(rows);
        Tradeoff at = Tradeoff.of(List.of(), Check.of(varied.with(there)));
        return at.passes() && profile.points().size() > 1
                ? at.passing(Tradeoff.of(List.of(), Check.of(varied.with(rows))).passes())
                : at;
    }

    /**
     * The changes that gain something, the largest gain first, a line each for a console of 80 columns.
     *
     * @param folder where the profile and its parts are read from
     */
    static List<String> of(ProfileFolder folder, ProfileResult now) {
        try {
            String file = now.profile().place(Profile.FILE).file();
            return new Advice(folder.varied(file), now).lines(folder);
        } catch (Refused changedMeanwhile) {
            return List.of();
        }
    }

    private List<String> lines(ProfileFolder folder) throws Refused {
        List<Change> helping = candidates(folder).entrySet().parallelStream()
                .map(candidate -> changed(candidate.getKey(), candidate.getValue()))
                .flatMap(Optional::stream)
                .filter(change -> change.gainDb() > LEAST_GAIN)
                .sorted(Comparator.comparingDouble((Change change) -> -change.gainDb()))
                .toList();
        List<String> lines = new ArrayList<>();
        lines.add("what single changes would do at the worst point, each checked:");
        helping.forEach(change -> lines.add(line(change)));
        if (helping.stream().noneMatch(change -> change.after().passes())) {
            Optional<Change> pair = bestPair(helping);
            pair.ifPresent(change -> lines.add(line(change)));
            if (pair.filter(change -> change.after().passes()).isEmpty()) {
                double margin = pair.or(() -> helping.stream().findFirst())
                        .map(change -> change.after().marginDb())
                        .orElse(saved.marginDb());
                lines.add(
                        missing(margin) > 0
                                ? "  none is enough: " + Figures.fixed(missing(margin), 1)
                                        + " dB are missing to the required margin"
                                : "  enough at this point; another limit or operating point then rules");
            }
        }
        return lines;
    }

    private Optional<Change> changed(String words, Map<String, SetRow> rows) {
        try {
            Tradeoff after = checked(rows);
            return Optional.of(new Change(words, rows, after.marginDb() - saved.marginDb(), after));
        } catch (Refused notForThisProfile) {
            // a change that its own rules refuse, such as a carrier below six times the output, is none
            return Optional.empty();
        }
    }

    /** The best change together with each of the next ones that set other rows. */
    private Optional<Change> bestPair(List<Change> helping) {
        if (helping.isEmpty()) {
            return Optional.empty();
        }
        Change first = helping.get(0);
        return helping.stream()
                .filter(first::goesWith)
                .limit(PAIRED)
                .map(second -> {
                    Map<String, SetRow> rows = new LinkedHashMap<>(first.rows());
                    rows.putAll(second.rows());
                    return changed("both: first and " + second.words(), rows);
                })
                .flatMap(Optional::stream)
                .max(Comparator.comparingDouble(Change::gainDb));
    }

    private String line(Change change) {
        String words = change.words().length() > 32 ? change.words().substring(0, 31) + "…" : change.words();
        return String.format(
                java.util.Locale.ROOT,
                "  %-32s %+6.1f dB %+5.1f K %+6.1f W %+5.1f dB(A)%s",
                words,
                change.gainDb(),
                change.after().windingCelsius() - saved.windingCelsius(),
                change.after().driveLoss() - saved.driveLoss(),
                change.after().sound() - saved.sound(),
                change.after().passes() ? " passes" : "");
    }

    private double missing(double marginDb) {
        return Math.max(0, profile.policy().requiredMarginDb() - marginDb);
    }

    /** What can be changed, in words and rows. */
    private Map<String, Map<String, SetRow>> candidates(ProfileFolder folder) throws Refused {
        Map<String, Map<String, SetRow>> candidates = new LinkedHashMap<>();
        if (!profile.settings().carrier().synchronous()) {
            double carrier = profile.settings().carrier().frequency().orElseThrow();
            put(
                    candidates,
                    "carrier " + Figures.withUnit(HALF * carrier, Dimension.FREQUENCY, 3),
                    "carrier frequency",
                    Figures.significant(HALF * carrier, 9),
                    "Hz");
        }
        if (profile.settings().modulation().scheme() != Modulation.CLAMP_60) {
            put(candidates, "modulation clamp-60", "modulation", Modulation.CLAMP_60.words(), "");
        }
        double slew = HALF * profile.settings().edges().slewRising();
        SetRow slower = new SetRow(Figures.significant(slew / 1e9, 6), "kV/us");
        candidates.put(
                "dv/dt " + Figures.withUnit(slew, Dimension.SLEW, 3),
                Map.of("dv/dt rising", slower, "dv/dt falling", slower));
        filters(folder).forEach(name -> put(candidates, name, "mains filter", name, ""));
        if (profile.installation().fitting().cores().isEmpty()) {
            candidates.put(
                    "4 cores ring-63-tape, 2 turns",
                    Map.of(
                            "ring core", new SetRow("ring-63-tape", ""),
                            "ring core count", new SetRow("4", ""),
                            "ring core turns", new SetRow("2", "")));
        }
        if (profile.installation().motorLead().shielded()
                && profile.installation().fitting().shield() != ShieldTermination.ALL_ROUND) {
            put(candidates, "shield all-round", "shield termination", "all-round", "");
        }
        if (profile.installation().filter().isPresent()
                && profile.installation().filterEarthLead() > 0.02) {
            put(candidates, "filter flat on the plate", "filter earth lead length", "0.02", "m");
        }
        double length = HALF * profile.installation().motorLeadLength();
        put(
                candidates,
                "motor lead " + Figures.withUnit(length, Dimension.LENGTH, 3),
                "motor lead length",
                Figures.significant(length, 9),
                "m");
        return candidates;
    }

    /** The smallest filters of the catalogue that carry the current, one per number of stages beyond what is fitted. */
    private List<String> filters(ProfileFolder folder) throws Refused {
        int fitted = profile.installation()
                .filter()
                .map(part -> part.stages().size())
                .orElse(0);
        double current = profile.installation()
                .filter()
                .map(FilterPart::ratedCurrent)
                .orElse(profile.peakCurrent() / Math.sqrt(2));
        Map<Integer, FilterPart> smallest = new LinkedHashMap<>();
        folder.parts().filters().values().stream()
                .filter(part -> part.phases() == profile.installation().supply().phases()
                        && part.ratedCurrent() >= current
                        && part.stages().size() > fitted)
                .sorted(Comparator.comparingDouble(FilterPart::ratedCurrent))
                .forEach(part -> smallest.putIfAbsent(part.stages().size(), part));
        return smallest.values().stream().map(FilterPart::name).toList();
    }

    private static void put(
            Map<String, Map<String, SetRow>> candidates, String words, String quantity, String value, String unit) {
        candidates.put(words, Map.of(quantity, new SetRow(value, unit)));
    }
}
