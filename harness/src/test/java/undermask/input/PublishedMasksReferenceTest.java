package undermask.input;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Collectors;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import undermask.mask.Mask;
import undermask.network.MainsNetwork;
import undermask.receiver.Detector;
import undermask.receiver.ReceiverStandard;

/** Every built-in mask against the published limits; the sources stand in {@code limits.csv}. */
class PublishedMasksReferenceTest {
    private record Limit(
            Detector detector, double fromHz, double toHz, double fromDbuv, double toDbuv, String network) {
        private static Limit of(CSVRecord row) {
            Detector detector = switch (row.get("detector")) {
                case "QP" -> Detector.QUASI_PEAK;
                case "AV" -> Detector.AVERAGE;
                case "peak" -> Detector.PEAK;
                default -> throw new IllegalStateException(row.get("detector"));
            };
            return new Limit(
                    detector,
                    Double.parseDouble(row.get("f_start_Hz")),
                    Double.parseDouble(row.get("f_stop_Hz")),
                    Double.parseDouble(row.get("level_start_dBuV")),
                    Double.parseDouble(row.get("level_stop_dBuV")),
                    row.get("network"));
        }
    }

    private static List<CSVRecord> published() throws IOException {
        CSVFormat format = CSVFormat.Builder.create()
                .setHeader()
                .setSkipHeaderRecord(true)
                .setCommentMarker('#')
                .get();
        try (CSVParser rows = CSVParser.parse(
                PublishedMasksReferenceTest.class.getResourceAsStream("/undermask/input/limits.csv"),
                StandardCharsets.UTF_8,
                format)) {
            return rows.getRecords();
        }
    }

    private static Map<String, List<Limit>> limits() throws IOException {
        return published().stream()
                .filter(row -> !row.get("mask").isEmpty())
                .collect(Collectors.groupingBy(
                        row -> row.get("mask"), TreeMap::new, Collectors.mapping(Limit::of, Collectors.toList())));
    }

    static List<String> masks() throws IOException {
        return List.copyOf(limits().keySet());
    }

    @Test
    void nothingPublishedIsMissingAndNothingElseIsBuiltIn() throws IOException {
        assertThat(PublishedMasks.names()).containsExactlyInAnyOrderElementsOf(masks());
        assertThat(published().stream().filter(row -> row.get("mask").isEmpty()))
                .extracting(row -> row.get("network"))
                .containsOnly("voltage probe", "network level");
    }

    @ParameterizedTest
    @MethodSource("masks")
    void holdsEveryCornerAndTheLowerLimitAtEachStep(String name) throws IOException {
        Mask mask = PublishedMasks.read(name);
        List<Limit> limits = limits().get(name);
        for (Limit limit : limits) {
            for (double corner : new double[] {limit.fromHz(), limit.toHz()}) {
                double lower = limits.stream()
                        .filter(other -> other.detector() == limit.detector())
                        .mapToDouble(other -> other.fromHz() == corner
                                ? other.fromDbuv()
                                : other.toHz() == corner ? other.toDbuv() : Double.POSITIVE_INFINITY)
                        .min()
                        .orElseThrow();
                assertThat(mask.limitDbuv(limit.detector(), corner)).hasValue(lower);
            }
            // just inside a segment its own corner values hold, however the neighbour lies
            assertThat(mask.limitDbuv(limit.detector(), limit.fromHz() * (1 + 1e-9))
                            .orElseThrow())
                    .isCloseTo(limit.fromDbuv(), within(1e-6));
            assertThat(mask.limitDbuv(limit.detector(), limit.toHz() * (1 - 1e-9))
                            .orElseThrow())
                    .isCloseTo(limit.toDbuv(), within(1e-6));
        }
    }

    /** Straight over the logarithm of frequency: halfway in frequency ratio is halfway in decibels. */
    @ParameterizedTest
    @MethodSource("masks")
    void isStraightOverTheLogarithmOfFrequency(String name) throws IOException {
        for (Limit limit : limits().get(name)) {
            double halfway = Math.sqrt(limit.fromHz() * limit.toHz());
            assertThat(PublishedMasks.read(name)
                            .limitDbuv(limit.detector(), halfway)
                            .orElseThrow())
                    .isCloseTo((limit.fromDbuv() + limit.toDbuv()) / 2, within(1e-9));
        }
    }

    @ParameterizedTest
    @MethodSource("masks")
    void limitsNothingOutsideItsRange(String name) throws IOException {
        Mask mask = PublishedMasks.read(name);
        Map<Detector, List<Limit>> byDetector =
                limits().get(name).stream().collect(Collectors.groupingBy(Limit::detector));
        assertThat(mask.detectors()).containsExactlyInAnyOrderElementsOf(byDetector.keySet());
        byDetector.forEach((detector, limits) -> {
            double lowest = limits.stream().mapToDouble(Limit::fromHz).min().orElseThrow();
            double highest = limits.stream().mapToDouble(Limit::toHz).max().orElseThrow();
            assertThat(mask.limitDbuv(detector, lowest * (1 - 1e-9))).isEmpty();
            assertThat(mask.limitDbuv(detector, highest * (1 + 1e-9))).isEmpty();
        });
    }

    @ParameterizedTest
    @MethodSource("masks")
    void namesReceiverAndNetworkThatTheLevelsAreMeantFor(String name) throws IOException {
        Mask mask = PublishedMasks.read(name);
        List<Limit> limits = limits().get(name);
        boolean military = limits.stream().anyMatch(limit -> limit.network().startsWith("MIL-STD-461"));
        boolean below150kHz = limits.stream().anyMatch(limit -> limit.fromHz() < 150e3);

        assertThat(mask.receiver()).isEqualTo(military ? ReceiverStandard.MIL_STD_461 : ReceiverStandard.CISPR_16);
        assertThat(mask.network())
                .isEqualTo(
                        military
                                ? MainsNetwork.MIL_STD_461
                                : below150kHz ? MainsNetwork.CISPR_9_KHZ : MainsNetwork.CISPR_150_KHZ);
    }

    @ParameterizedTest
    @MethodSource("masks")
    void saysWhereTheFiguresComeFrom(String name) throws IOException {
        Mask mask = PublishedMasks.read(name);
        boolean seen = published().stream()
                .filter(row -> row.get("mask").equals(name))
                .allMatch(row -> row.get("evidence").equals("seen"));

        assertThat(mask.title()).isNotBlank();
        assertThat(mask.source()).containsPattern(seen ? "\\(seen in print\\)$" : "\\(from memory.*\\)$");
        assertThat(mask.source()).containsPattern("(IEC|CISPR|CFR|MIL-STD).*\\d{4}");
    }
}
