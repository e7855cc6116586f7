package undermask.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.TimeZone;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import undermask.SmallPlant;

class CheckCommandTest {
    private static final String HEADER =
            "profile,point,mask,detector,frequency_hz,level_dbuv,limit_dbuv,margin_db,required_db,verdict";

    @TempDir
    private Path folder;

    @Test
    void clearProfilesGiveZeroAndReports() throws IOException {
        SmallPlant.write(folder.resolve("profiles"), "pump", "filter-3ph-16a", "");
        Run run = Run.in(folder, "check");
        assertThat(run.err()).isEmpty();
        assertThat(run.status()).isZero();
        assertThat(run.out()).contains("pump").contains("1 profile: 1 clear, 0 tight, 0 over");
        List<String> summary = Files.readAllLines(folder.resolve("reports/summary.csv"));
        assertThat(summary.get(0)).isEqualTo(HEADER);
        assertThat(summary).hasSize(5);
        assertThat(summary.get(1)).startsWith("pump,200 Hz 8 A 0.8,iec61800-3-c2,quasi-peak,");
        assertThat(summary.get(4)).startsWith("pump,all,iec61800-3-c2,average,").endsWith(",clear");
        assertThat(Files.readAllLines(folder.resolve("reports/pump/envelope.csv"))
                        .get(0))
                .isEqualTo(
                        "frequency_hz,peak_dbuv,quasi_peak_dbuv,average_dbuv,limit_quasi_peak_dbuv,limit_average_dbuv");
        assertThat(folder.resolve("reports/summary.md")).isNotEmptyFile();
        for (String chart : List.of("spectrum", "waveform")) {
            assertThat(Files.readAllBytes(folder.resolve("reports/pump/" + chart + ".png")))
                    .startsWith(0x89, 'P', 'N', 'G');
            assertThat(folder.resolve("reports/pump/" + chart + ".svg"))
                    .content()
                    .contains("<svg");
        }
        assertThat(everyFile(folder.resolve("reports"))).noneMatch(name -> name.contains(".part"));
    }

    @Test
    void aProfileThatIsOverGivesOneAndSaysWhereAndWhatNext() throws IOException {
        SmallPlant.write(folder.resolve("profiles"), "bare", "none", "");
        SmallPlant.write(folder.resolve("profiles"), "pump", "filter-3ph-16a", "");
        Run run = Run.in(folder, "check", "--no-charts");
        assertThat(run.status()).isOne();
        assertThat(run.out())
                .contains("bare.csv:4:19: quasi-peak over by ")
                .contains("mask iec61800-3-c2, 6.0 dB margin required")
                .contains("next: fit a mains filter")
                .contains("2 profiles: 1 clear, 0 tight, 1 over");
        assertThat(run.out().indexOf("bare")).isLessThan(run.out().indexOf("pump"));
        // the paths of a finding are the user's own and may be long
        assertThat(run.out().lines().filter(line -> !line.contains(".csv:") && !line.startsWith("reports:")))
                .allSatisfy(line -> assertThat(line.length()).isLessThanOrEqualTo(80));
    }

    // an X capacitor works between lines and a motor lead to earth: the next step follows the mode that rules
    @Test
    void theNextStepFollowsTheModeThatRules() throws IOException {
        Path profiles = folder.resolve("profiles");
        SmallPlant.write(profiles, "pump", "filter-3ph-16a", "required margin,40,dB,");
        Path pump = profiles.resolve("pump.csv");
        Files.writeString(pump, Files.readString(pump).replace("iec61800-3-c2", "ce102-115v"));
        String out = Run.in(folder, "check", "--no-charts").out();
        assertThat(out).contains("differential mode rules").contains("next: try a lower carrier, a larger X capacitor");
    }

    // each line of advice is a check of its own: the same change, saved as a profile, gains the same
    @Test
    void adviceIsComputed() throws IOException {
        Path profiles = folder.resolve("profiles");
        SmallPlant.write(profiles, "bare", "none", "");
        Run run = Run.in(folder, "check", "--no-charts");
        assertThat(run.out())
                .contains("what single changes would do at the worst point, each checked:")
                .contains("filter-3ph-8a ");
        double before = margin("bare");
        java.util.regex.Matcher line = java.util.regex.Pattern.compile("carrier 2 kHz +\\+([0-9.]+) dB")
                .matcher(run.out());
        assertThat(line.find()).isTrue();
        Files.writeString(
                profiles.resolve("bare.csv"),
                Files.readString(profiles.resolve("bare.csv")).replace("carrier frequency,4,", "carrier frequency,2,"));
        Run.in(folder, "check", "--no-charts");
        assertThat(margin("bare") - before)
                .isCloseTo(Double.parseDouble(line.group(1)), org.assertj.core.api.Assertions.within(0.06));
    }

    private double margin(String profile) throws IOException {
        return Files.readAllLines(folder.resolve("reports/summary.csv")).stream()
                .filter(row -> row.startsWith(profile + ",all,"))
                .mapToDouble(row -> Double.parseDouble(row.split(",")[7]))
                .min()
                .orElseThrow();
    }

    @Test
    void tightFailsUnlessThePolicyLetsItPass() throws IOException {
        SmallPlant.write(folder.resolve("profiles"), "pump", "filter-3ph-16a", "required margin,30,dB,");
        assertThat(Run.in(folder, "check", "--no-charts").status()).isOne();
        SmallPlant.write(
                folder.resolve("profiles"), "pump", "filter-3ph-16a", "required margin,30,dB,\ntight passes,yes,,");
        Run run = Run.in(folder, "check", "--no-charts");
        assertThat(run.status()).isZero();
        assertThat(run.out()).contains("0 clear, 1 tight, 0 over");
    }

    @Test
    void refusedInputGivesTwoAndLeavesEarlierReportsAlone() throws IOException {
        SmallPlant.write(folder.resolve("profiles"), "pump", "filter-3ph-16a", "");
        assertThat(Run.in(folder, "check").status()).isZero();
        Path reports = folder.resolve("reports");
        List<String> before = everyFile(reports);
        String summary = Files.readString(reports.resolve("summary.csv"));
        SmallPlant.write(folder.resolve("profiles"), "second", "filter-3ph-16a", "carrier,4,kHz,");
        Run run = Run.in(folder, "check");
        assertThat(run.status()).isEqualTo(2);
        assertThat(run.out()).isEmpty();
        assertThat(run.err()).contains("second.csv:14:1: ").contains("nearest: carrier");
        assertThat(everyFile(reports)).isEqualTo(before);
        assertThat(reports.resolve("summary.csv")).hasContent(summary);
    }

    @Test
    void nothingToCheckIsRefused() throws IOException {
        Files.createDirectories(folder.resolve("profiles"));
        Run run = Run.in(folder, "check");
        assertThat(run.status()).isEqualTo(2);
        assertThat(run.err()).contains("no profile");
        assertThat(Run.in(folder, "check", "nobody").status()).isEqualTo(2);
    }

    @Test
    void usageErrorsGiveTwo() {
        assertThat(Run.of().status()).isEqualTo(2);
        assertThat(Run.of("chek").status()).isEqualTo(2);
        assertThat(Run.of("check", "--job", "2").err()).contains("Unknown option");
        assertThat(Run.of("check", "--jobs", "0").err()).contains("--jobs is 0; at least 1 is wanted");
        assertThat(Run.of("check", "--jobs", "many").status()).isEqualTo(2);
    }

    @Test
    void aReportThatCannotBeWrittenIsAFaultThatNamesIt() throws IOException {
        SmallPlant.write(folder.resolve("profiles"), "pump", "filter-3ph-16a", "");
        Files.writeString(folder.resolve("reports"), "a file stands where the folder should");
        Run run = Run.in(folder, "check", "--no-charts");
        assertThat(run.status()).isEqualTo(3);
        assertThat(run.err()).contains("cannot write").contains("envelope.csv");
        assertThat(folder.resolve("reports")).hasContent("a file stands where the folder should");
    }

    @Test
    void sameBytesWithOneJobOrManyAndInAnyLocale() throws IOException {
        for (String name : List.of("a", "b", "c")) {
            SmallPlant.write(folder.resolve("profiles"), name, name.equals("b") ? "none" : "filter-3ph-16a", "");
        }
        Run.in(folder, "check", "--no-charts", "--jobs", "1");
        String summary = Files.readString(folder.resolve("reports/summary.csv"));
        String envelope = Files.readString(folder.resolve("reports/b/envelope.csv"));
        Locale locale = Locale.getDefault();
        TimeZone zone = TimeZone.getDefault();
        try {
            Locale.setDefault(Locale.forLanguageTag("ar-EG"));
            TimeZone.setDefault(TimeZone.getTimeZone("Asia/Kathmandu"));
            Run.in(folder, "check", "--no-charts", "--jobs", "3");
        } finally {
            Locale.setDefault(locale);
            TimeZone.setDefault(zone);
        }
        assertThat(folder.resolve("reports/summary.csv")).hasContent(summary);
        assertThat(folder.resolve("reports/b/envelope.csv")).hasContent(envelope);
    }

    @Test
    void namesMayHoldSpacesAndLettersOfAnyScript() throws IOException {
        SmallPlant.write(folder.resolve("profiles"), "Kühlraum 2 – Lüfter", "filter-3ph-16a", "");
        Run run = Run.in(folder, "check", "--no-charts");
        assertThat(run.err()).isEmpty();
        assertThat(run.status()).isZero();
        assertThat(folder.resolve("reports/Kühlraum 2 – Lüfter/envelope.csv")).isNotEmptyFile();
    }

    @Test
    void whatASpreadsheetWouldTakeForAFormulaIsMadeText() throws IOException {
        SmallPlant.write(folder.resolve("profiles"), "=1+2", "filter-3ph-16a", "");
        SmallPlant.write(folder.resolve("profiles"), "a|b", "filter-3ph-16a", "");
        assertThat(Run.in(folder, "check", "--no-charts").status()).isZero();
        assertThat(Files.readAllLines(folder.resolve("reports/summary.csv")).get(1))
                .doesNotStartWith("=");
        assertThat(folder.resolve("reports/summary.md")).content().contains("| a\\|b |");
    }

    @Test
    void aLeakageLimitIsHeldAndNamedLikeAnyOther() throws IOException {
        SmallPlant.write(folder.resolve("profiles"), "pump", "filter-3ph-16a", "leakage current limit,3.5,mA,");
        Run run = Run.in(folder, "check", "--no-charts");
        assertThat(run.status()).isOne();
        // 231 V on 100 nF at 50 Hz
        assertThat(run.out()).contains("pump.csv:2:14: pump: leakage current at mains frequency 7.26 mA, limit 3.5 mA");
        SmallPlant.write(folder.resolve("profiles"), "pump", "filter-3ph-16a", "leakage current limit,10,mA,");
        assertThat(Run.in(folder, "check", "--no-charts").status()).isZero();
    }

    @Test
    void aQuietProfileThatCooksTheMotorFails() throws IOException {
        SmallPlant.write(
                folder.resolve("profiles"),
                "pump",
                "filter-3ph-16a",
                "winding temperature limit,60,degC,\nmotor peak voltage limit,800,V,");
        Run run = Run.in(folder, "check", "--no-charts");
        assertThat(run.status()).isOne();
        assertThat(run.out())
                .contains("1 clear")
                .containsPattern("pump.csv:12:14: pump: winding temperature \\d+ degC, limit 60 degC")
                .containsPattern("pump.csv:7:14: pump: peak voltage at the motor [0-9.]+ k?V, limit 800 V");
    }

    @Test
    void toleranceRunsAddPercentilesToTheEnvelope() throws IOException {
        SmallPlant.write(folder.resolve("profiles"), "pump", "filter-3ph-16a", "tolerance runs,10,,\npercentile,80,%,");
        Run run = Run.in(folder, "check", "--no-charts");
        assertThat(run.out()).contains("percentile 80 of 10").contains("CISPR 16-4-2");
        assertThat(Files.readAllLines(folder.resolve("reports/pump/envelope.csv"))
                        .get(0))
                .isEqualTo("frequency_hz,peak_dbuv,quasi_peak_dbuv,average_dbuv,limit_quasi_peak_dbuv,"
                        + "limit_average_dbuv,peak_p05_dbuv,quasi_peak_p05_dbuv,average_p05_dbuv,peak_p50_dbuv,"
                        + "quasi_peak_p50_dbuv,average_p50_dbuv,peak_p95_dbuv,quasi_peak_p95_dbuv,average_p95_dbuv");
    }

    @Test
    void aSaturatedCoreIsNamed() throws IOException {
        Path profiles = folder.resolve("profiles");
        SmallPlant.write(profiles, "pump", "filter-3ph-16a", "");
        Files.writeString(
                profiles.resolve("installations/plant-filter-3ph-16a.csv"),
                "ring core,ring-25-tape,,\nring core placement,on-each,,\n",
                java.nio.file.StandardOpenOption.APPEND);
        Run run = Run.in(folder, "check", "--no-charts");
        assertThat(run.out()).contains("note: pump: ring core ring-25-tape saturates");
    }

    @Test
    void ownElementsJoinTheCircuitOrAreRefused() throws IOException {
        Path profiles = folder.resolve("profiles");
        SmallPlant.write(profiles, "pump", "filter-3ph-16a", "");
        Files.createDirectories(profiles.resolve("elements"));
        Path installation = profiles.resolve("installations/plant-filter-3ph-16a.csv");
        Run.in(folder, "check", "--no-charts");
        String before = Files.readString(folder.resolve("reports/summary.csv"));
        Files.writeString(installation, "own elements,snubber,,\n", java.nio.file.StandardOpenOption.APPEND);
        Files.writeString(
                profiles.resolve("elements/snubber.csv"),
                "from,to,kind,value,unit\nlink plus,snubber middle,capacitor,100,nF\nsnubber middle,drive PE,resistor,1,ohm\n");
        assertThat(Run.in(folder, "check", "--no-charts").status()).isZero();
        assertThat(folder.resolve("reports/summary.csv")).content().isNotEqualTo(before);
        Files.writeString(
                profiles.resolve("elements/snubber.csv"),
                "from,to,kind,value,unit\nlink plus,nowhere,capacitor,100,nF\n");
        Run floating = Run.in(folder, "check", "--no-charts");
        assertThat(floating.status()).isEqualTo(2);
        assertThat(floating.err())
                .contains("plant-filter-3ph-16a.csv:13:14: ")
                .contains("nothing else is connected to \"nowhere\"")
                .contains("motor terminals");
        Files.writeString(
                profiles.resolve("elements/snubber.csv"),
                "from,to,kind,value,unit\nlink plus,drive PE,coil,100,nF\nlink plus,drive PE,capacitor,100,ohm\n");
        assertThat(Run.in(folder, "check", "--no-charts").err())
                .contains("snubber.csv:2:20: \"coil\", kind must be resistor, inductor or capacitor")
                .contains("snubber.csv:3:34: \"ohm\"");
    }

    @Test
    void quietPrintsNothing() throws IOException {
        SmallPlant.write(folder.resolve("profiles"), "pump", "filter-3ph-16a", "");
        Run run = Run.in(folder, "check", "--no-charts", "--quiet");
        assertThat(run.out() + run.err()).isEmpty();
    }

    private static List<String> everyFile(Path folder) throws IOException {
        try (Stream<Path> files = Files.walk(folder)) {
            return files.map(file -> folder.relativize(file).toString())
                    .sorted()
                    .toList();
        }
    }
}
