package undermask.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import undermask.check.TraceBand;
import undermask.mask.Mask;
import undermask.receiver.Detector;
import undermask.receiver.Trace;

/** What the receiver shows at each tuning step, with the limits beside it. */
final class EnvelopeCsv {
    private static final List<String> HEADER = List.of(
            "frequency_hz",
            "peak_dbuv",
            "quasi_peak_dbuv",
            "average_dbuv",
            "limit_quasi_peak_dbuv",
            "limit_average_dbuv");

    private static final List<String> PERCENTILES = List.of("_p05", "_p50", "_p95");

    private EnvelopeCsv() {}

    /**
     * The table; a mask that limits the peak detector gets a column more, tolerance runs get three per detector.
     *
     * @param band where the trace lies with tolerances
     */
    static String of(Trace trace, Optional<TraceBand> band, Mask mask) {
        boolean limitsPeak = mask.detectors().contains(Detector.PEAK);
        List<String> header = new ArrayList<>(HEADER);
        List<Detector> limited = new ArrayList<>(List.of(Detector.QUASI_PEAK, Detector.AVERAGE));
        if (limitsPeak) {
            header.add("limit_peak_dbuv");
            limited.add(Detector.PEAK);
        }
        List<Trace> percentiles =
                band.map(b -> List.of(b.low(), b.middle(), b.high())).orElse(List.of());
        for (int p = 0; p < percentiles.size(); p++) {
            for (String column : HEADER.subList(1, 1 + Detector.values().length)) {
                header.add(column.replace("_dbuv", PERCENTILES.get(p) + "_dbuv"));
            }
        }
        Csv csv = new Csv(header);
        for (int step = 0; step < trace.size(); step++) {
            double frequency = trace.frequency(step);
            List<String> cells = new ArrayList<>();
            cells.add(Csv.frequency(frequency));
            for (Detector detector : Detector.values()) {
                cells.add(Csv.level(trace.levelDbuv(detector, step)));
            }
            for (Detector detector : limited) {
                cells.add(Csv.level(mask.limitDbuv(detector, frequency).orElse(Double.NaN)));
            }
            for (Trace percentile : percentiles) {
                for (Detector detector : Detector.values()) {
                    cells.add(Csv.level(percentile.levelDbuv(detector, step)));
                }
            }
            csv.row(cells.toArray());
        }
        return csv.toString();
    }
}
