package undermask.report;

import java.io.IOException;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.function.Consumer;
import undermask.check.Check;
import undermask.check.Profile;
import undermask.input.Refused;
import undermask.input.SetRow;
import undermask.input.VariedProfile;
import undermask.unit.Dimension;
import undermask.unit.Figures;

/** Checks a profile over a grid of settings and weighs margin, motor heat, drive losses and sound. */
public final class SweepRun {
    private final ReportFolder folder;
    private final int jobs;
    private final ChartMaker charts;
    private final Progress progress;

    /** Told how far a sweep has come. */
    @FunctionalInterface
    public interface Progress {
        /** So many of so many settings are done. */
        void done(int done, int of);
    }

    /**
     * What a sweep found.
     *
     * @param lines for a console of 80 columns
     * @param recommended rows of the setting to take; empty when none passes
     */
    public record Found(List<String> lines, Optional<Map<String, SetRow>> recommended) {}

    /** Prepares a sweep. */
    public SweepRun(ReportFolder folder, int jobs, boolean charts, Consumer<String> warnings, Progress progress) {
        this.folder = folder;
        this.jobs = jobs;
        this.charts = new ChartMaker(charts, warnings);
        this.progress = progress;
    }

    /** Number of settings of a grid. */
    public static long size(List<Vary> varied) {
        return varied.stream().mapToLong(vary -> vary.values().size()).reduce(1, Math::multiplyExact);
    }

    /**
     * Reads every setting first, so that none is refused half-way, then checks them and writes {@code tradeoff.csv} as it
     * goes on: what is done stays when a sweep is interrupted.
     *
     * @throws Refused when a setting cannot be read
     */
    public Found of(VariedProfile profile, List<Vary> varied) throws Refused, IOException {
        List<Vary> quantities = new ArrayList<>();
        for (Vary vary : varied) {
            quantities.add(new Vary(
                    vary.quantity().equals("dv/dt") ? "dv/dt" : profile.quantity(vary.quantity()),
                    vary.values(),
                    vary.unit()));
        }
        List<List<String>> grid = grid(quantities);
        List<Profile> settings = new ArrayList<>();
        for (List<String> values : grid) {
            settings.add(profile.with(rows(quantities, values)));
        }
        Tradeoff saved = Tradeoff.of(List.of(), Check.of(profile.with(Map.of())));
        List<Tradeoff> results = check(profile.name(), quantities, grid, settings, saved);
        charts.draw(
                folder,
                profile.name(),
                "tradeoff",
                () -> TradeoffCharts.of(
                        profile.name() + " over " + quantities.get(0).quantity(), quantities.get(0), results, saved));
        return found(quantities, results, saved);
    }

    private static List<List<String>> grid(List<Vary> quantities) {
        List<List<String>> grid = List.of(List.of());
        for (Vary vary : quantities) {
            List<List<String>> longer = new ArrayList<>();
            for (List<String> values : grid) {
                for (String value : vary.values()) {
                    List<String> more = new ArrayList<>(values);
                    more.add(value);
                    longer.add(more);
                }
            }
            grid = longer;
        }
        return grid;
    }

    private static Map<String, SetRow> rows(List<Vary> quantities, List<String> values) {
        Map<String, SetRow> rows = new LinkedHashMap<>();
        for (int i = 0; i < values.size(); i++) {
            Vary vary = quantities.get(i);
            SetRow row = new SetRow(values.get(i), vary.unit());
            if (vary.quantity().equals("dv/dt")) {
                rows.put("dv/dt rising", row);
                rows.put("dv/dt falling", row);
            } else {
                rows.put(vary.quantity(), row);
            }
        }
        return rows;
    }

    private List<Tradeoff> check(
            String name, List<Vary> quantities, List<List<String>> grid, List<Profile> settings, Tradeoff saved)
            throws IOException {
        ExecutorService workers = Executors.newFixedThreadPool(jobs, work -> {
            Thread thread = new Thread(work, "sweep");
            thread.setDaemon(true);
            return thread;
        });
        List<Tradeoff> results = new ArrayList<>();
        try {
            List<Future<Tradeoff>> pending = new ArrayList<>();
            for (int i = 0; i < grid.size(); i++) {
                int place = i;
                pending.add(workers.submit(() -> Tradeoff.of(grid.get(place), Check.of(settings.get(place)))));
            }
            for (Future<Tradeoff> result : pending) {
                results.add(result.get());
                folder.write(name, "tradeoff.csv", csv(quantities, results, saved));
                progress.done(results.size(), grid.size());
            }
            return results;
        } catch (ExecutionException e) {
            throw new IllegalStateException(e.getCause());
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new IllegalStateException("interrupted", e);
        } finally {
            workers.shutdownNow();
        }
    }

    private static String csv(List<Vary> quantities, List<Tradeoff> results, Tradeoff saved) {
        List<String> header = new ArrayList<>();
        quantities.forEach(vary -> header.add(vary.quantity() + (vary.unit().isEmpty() ? "" : " in " + vary.unit())));
        header.addAll(List.of(
                "margin_db",
                "passes",
                "winding_celsius",
                "harmonic_loss_w",
                "drive_loss_w",
                "sound_dba",
                "tone_hz",
                "motor_peak_v",
                "unbeaten"));
        Csv csv = new Csv(header);
        for (Tradeoff result : results) {
            List<String> cells = new ArrayList<>(result.values());
            cells.add(Csv.level(result.marginDb()));
            cells.add(result.passes() ? "yes" : "no");
            cells.add(Figures.fixed(result.windingCelsius(), 1));
            cells.add(Figures.fixed(result.harmonicLoss(), 2));
            cells.add(Figures.fixed(result.driveLoss(), 2));
            cells.add(Figures.fixed(result.sound() - saved.sound(), 1));
            cells.add(Csv.frequency(result.toneHz()));
            cells.add(Figures.fixed(result.motorPeak(), 1));
            cells.add(results.stream().noneMatch(result::beatenBy) ? "yes" : "no");
            csv.row(cells.toArray());
        }
        return csv.toString();
    }

    private static Found found(List<Vary> quantities, List<Tradeoff> results, Tradeoff saved) {
        List<String> lines = new ArrayList<>();
        lines.add(String.format(
                java.util.Locale.ROOT,
                "%-28s %8s %8s %9s %8s %8s",
                quantities.get(0).quantity().length() > 28 || quantities.size() > 1
                        ? "setting"
                        : quantities.get(0).quantity(),
                "margin",
                "winding",
                "drive",
                "sound",
                "tone"));
        for (Tradeoff result : results) {
            String setting = setting(quantities, result);
            lines.add(String.format(
                    java.util.Locale.ROOT,
                    "%-28s %5s dB %5s C %7s W %5s dB %8s%s",
                    setting.length() > 28 ? setting.substring(0, 27) + "…" : setting,
                    Figures.fixed(result.marginDb(), 1),
                    Figures.fixed(result.windingCelsius(), 0),
                    Figures.fixed(result.driveLoss(), 1),
                    Figures.fixed(result.sound() - saved.sound(), 1),
                    Figures.withUnit(result.toneHz(), Dimension.FREQUENCY, 2),
                    result.passes() ? "" : "  !"));
        }
        lines.add("");
        long passing = results.stream().filter(Tradeoff::passes).count();
        Optional<Tradeoff> best =
                results.stream().filter(Tradeoff::passes).min(Comparator.comparingDouble(Tradeoff::addedHeat));
        StringBuilder said = new StringBuilder();
        Paragraph.append(
                said,
                best.map(taken -> "take " + setting(quantities, taken)
                                + (passing == 1
                                        ? ": the only setting that passes, "
                                        : ": of " + passing + " settings that pass it adds the least heat, ")
                                + Figures.fixed(taken.driveLoss(), 0) + " W in the drive and "
                                + Figures.fixed(taken.harmonicLoss(), 1) + " W of harmonics in the motor, with "
                                + Figures.fixed(taken.marginDb(), 1) + " dB margin")
                        .orElse("no setting passes; the nearest is "
                                + setting(
                                        quantities,
                                        results.stream()
                                                .max(Comparator.comparingDouble(Tradeoff::marginDb))
                                                .orElseThrow())),
                "",
                "  ");
        said.toString().lines().forEach(lines::add);
        lines.add("sound is relative to the profile as saved; ! does not pass");
        return new Found(lines, best.map(taken -> rows(quantities, taken.values())));
    }

    private static String setting(List<Vary> quantities, Tradeoff result) {
        List<String> parts = new ArrayList<>();
        for (int i = 0; i < quantities.size(); i++) {
            parts.add(result.values().get(i)
                    + (quantities.get(i).unit().isEmpty()
                            ? ""
                            : " " + quantities.get(i).unit()));
        }
        return String.join(", ", parts);
    }
}
