package undermask.report;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.function.Consumer;
import undermask.check.Check;
import undermask.check.PointResult;
import undermask.check.Profile;
import undermask.check.ProfileResult;
import undermask.input.ProfileFolder;

/**
 * Checks profiles side by side and writes their reports. A profile's own reports are written as soon as it is done, and
 * only its judgements are kept.
 */
public final class CheckRun {
    private final ProfileFolder source;
    private final ReportFolder folder;
    private final int jobs;
    private final ChartMaker charts;

    /**
     * Prepares a run.
     *
     * @param source where the profiles are read from; advice on failing ones reads them anew
     * @param jobs profiles checked at a time, at least 1
     * @param charts whether charts are drawn
     * @param warnings receives what went wrong without touching a verdict
     */
    public CheckRun(ProfileFolder source, ReportFolder folder, int jobs, boolean charts, Consumer<String> warnings) {
        this.source = source;
        if (jobs < 1) {
            throw new IllegalArgumentException("jobs is " + jobs + "; allowed: at least 1");
        }
        this.folder = folder;
        this.jobs = jobs;
        this.charts = new ChartMaker(charts, warnings);
    }

    /**
     * Checks and reports.
     *
     * @return an outcome per profile, in their order
     * @throws IOException when a report cannot be written
     */
    public List<Outcome> of(List<Profile> profiles) throws IOException {
        ExecutorService workers = Executors.newFixedThreadPool(jobs, work -> {
            Thread thread = new Thread(work, "check");
            thread.setDaemon(true);
            return thread;
        });
        try {
            List<Future<Outcome>> pending = new ArrayList<>();
            for (Profile profile : profiles) {
                pending.add(workers.submit(() -> one(profile)));
            }
            List<Outcome> outcomes = new ArrayList<>();
            for (Future<Outcome> outcome : pending) {
                outcomes.add(outcome.get());
            }
            Summary summary = new Summary(outcomes);
            folder.write("", "summary.csv", summary.csv());
            folder.write("", "summary.md", summary.markdown());
            return outcomes;
        } catch (ExecutionException e) {
            if (e.getCause() instanceof IOException io) {
                throw io;
            }
            throw new IllegalStateException(e.getCause());
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new IllegalStateException("interrupted", e);
        } finally {
            workers.shutdownNow();
        }
    }

    private Outcome one(Profile profile) throws IOException {
        ProfileResult result = Check.of(profile);
        Outcome judged = Outcome.of(result);
        Outcome outcome = judged.passes() ? judged : judged.with(Advice.of(source, result));
        folder.write(profile.name(), "envelope.csv", EnvelopeCsv.of(result.envelope(), result.band(), profile.mask()));
        charts.draw(
                folder,
                profile.name(),
                "spectrum",
                () -> Charts.spectrum(
                        profile.name() + " against " + profile.mask().name() + ": "
                                + outcome.verdict().words(),
                        result.envelope(),
                        result.band(),
                        profile.mask(),
                        result.judgements()));
        PointResult first = result.points().get(0);
        charts.draw(
                folder,
                profile.name(),
                "waveform",
                () -> WaveformCharts.waveform(
                        profile.name() + ", " + first.point().label(), first.bridge()));
        return outcome;
    }
}
