package undermask.input;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assumptions.assumeThat;

import java.io.IOException;
import java.io.RandomAccessFile;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import undermask.check.Policy;
import undermask.check.Profile;
import undermask.drive.Carrier;
import undermask.drive.CarrierSampling;
import undermask.drive.DriveSettings;
import undermask.drive.EdgeForm;
import undermask.drive.Edges;
import undermask.drive.Modulation;
import undermask.drive.ModulationPlan;
import undermask.drive.OperatingPoint;
import undermask.drive.Overmodulation;
import undermask.drive.ReducedCarrier;
import undermask.drive.Ringing;
import undermask.drive.ShortPulses;
import undermask.drive.Spread;
import undermask.drive.SpreadForm;
import undermask.drive.Switching;
import undermask.drive.VoltageCurve;
import undermask.installation.CablePart;
import undermask.installation.Capacitor;
import undermask.installation.Installation;
import undermask.installation.Link;
import undermask.installation.MainsLead;
import undermask.installation.Supply;
import undermask.mask.LimitSegment;
import undermask.mask.Mask;
import undermask.network.MainsNetwork;
import undermask.receiver.Detector;
import undermask.receiver.ReceiverStandard;
import undermask.unit.Place;

class ProfileFolderTest {
    @TempDir
    Path folder;

    @BeforeEach
    void copyGoodFolder() {
        GoodFolder.copyTo(folder);
    }

    private Profile read(String name) throws Refused {
        return new ProfileFolder(folder).read(List.of(name)).get(0);
    }

    private List<String> told(String... profiles) {
        return GoodFolder.problems(folder, profiles).stream()
                .map(problem -> problem.toString().replace(folder.toString(), "FOLDER"))
                .toList();
    }

    @Test
    void listsProfilesButNotThePolicy() throws Refused {
        assertThat(new ProfileFolder(folder).names()).containsExactly("brine-pump", "dock-conveyor");
        assertThat(new ProfileFolder(folder).readAll())
                .extracting(Profile::name)
                .containsExactly("brine-pump", "dock-conveyor");
    }

    @Test
    void readsEveryDriveSetting() throws Refused {
        Profile conveyor = read("dock-conveyor");

        assertThat(conveyor.settings())
                .isEqualTo(new DriveSettings(
                        new Carrier(
                                OptionalDouble.of(8000),
                                OptionalInt.empty(),
                                Optional.of(new ReducedCarrier(4000, OptionalDouble.of(6), OptionalDouble.of(8))),
                                CarrierSampling.NATURAL,
                                new Spread(SpreadForm.TRIANGLE, 500, 40, 1)),
                        new ModulationPlan(
                                Modulation.SINE_TRIANGLE,
                                Overmodulation.CLIPPED,
                                Optional.of(Modulation.CLAMP_60_LAG),
                                OptionalDouble.of(30),
                                OptionalDouble.of(300)),
                        new Switching(1.5e-6, true, 3e-6, ShortPulses.HOLD, 100e-9, 150e-9),
                        new Edges(
                                5e9,
                                3.5e9,
                                EdgeForm.RAISED_COSINE,
                                0.4,
                                9,
                                500e-12,
                                Optional.of(new Ringing(8e6, 0.1, 0.2)),
                                Optional.of(new Ringing(6e6, 0.2, 0.1))),
                        new VoltageCurve(400, 50, 12),
                        OptionalDouble.of(560)));
        assertThat(conveyor.points())
                .containsExactly(new OperatingPoint(20, 3.1, 0.72), new OperatingPoint(50, 4.2, 0.72));
        assertThat(conveyor.policy()).isEqualTo(new Policy(3, true));
    }

    @Test
    void readsEveryValueOfAnInstallation() throws Refused {
        Installation dock = read("dock-conveyor").installation();

        assertThat(dock.name()).isEqualTo("dock");
        assertThat(dock.supply()).isEqualTo(new Supply(1, 230, 60));
        assertThat(dock.mainsLead()).isEqualTo(new MainsLead(1.5, 0.6e-6, 650e-9));
        assertThat(dock.filter()).isEmpty();
        assertThat(dock.filterEarthLead()).isEqualTo(0.08);
        assertThat(dock.link())
                .isEqualTo(new Link(new Capacitor(330e-6, 0.2, 30e-9), new Capacitor(4.7e-9, 0.05, 8e-9)));
        assertThat(dock.heatsinkCapacitance()).isEqualTo(0.1e-9);
        assertThat(dock.motorLead())
                .isEqualTo(new CablePart("own-lead", 0.4e-9, 0.12e-6, 0.045, 1e6, 0.015, true, "measured"));
        assertThat(dock.motorLeadLength()).isEqualTo(7.5);
        assertThat(dock.motor().ratedPower()).isEqualTo(1500);
        assertThat(dock.frameBond()).hasValue(1.2e-6);
    }

    @Test
    void readsAMaskOfTheFolder() throws Refused {
        Mask mask = read("dock-conveyor").mask();

        assertThat(mask.name()).isEqualTo("dock-own");
        assertThat(mask.source()).endsWith("dock-own.csv");
        assertThat(mask.receiver()).isEqualTo(ReceiverStandard.CISPR_16);
        assertThat(mask.network()).isEqualTo(MainsNetwork.CISPR_150_KHZ);
        assertThat(mask.segments())
                .containsExactly(
                        new LimitSegment(Detector.QUASI_PEAK, 150e3, 500e3, 79, 79),
                        new LimitSegment(Detector.QUASI_PEAK, 500e3, 30e6, 73, 73),
                        new LimitSegment(Detector.AVERAGE, 150e3, 500e3, 66, 66),
                        new LimitSegment(Detector.AVERAGE, 500e3, 30e6, 60, 60));
    }

    @Test
    void fillsInTheDefaults() throws Refused {
        Profile pump = read("brine-pump");
        Installation plant = pump.installation();

        assertThat(pump.settings().carrier().sampling()).isEqualTo(CarrierSampling.TWICE);
        assertThat(pump.settings().edges().slewFalling()).isEqualTo(4e9);
        assertThat(pump.settings().edges().form()).isEqualTo(EdgeForm.EXPONENTIAL);
        assertThat(pump.settings().edges().referenceCurrent()).isCloseTo(8 * Math.sqrt(2), within(1e-12));
        assertThat(pump.settings().edges().ringingFalling()).isEmpty();
        assertThat(pump.settings().carrier().spread().none()).isTrue();
        assertThat(pump.settings().switching()).isEqualTo(Switching.of(2e-6));
        assertThat(pump.settings().modulation()).isEqualTo(ModulationPlan.of(Modulation.SPACE_VECTOR));
        assertThat(pump.settings().voltageCurve().boost()).isZero();
        assertThat(pump.settings().linkVoltage()).isEmpty();
        assertThat(pump.points()).extracting(OperatingPoint::outputHz).containsExactly(10.0, 25.0, 50.0);
        assertThat(pump.points()).extracting(OperatingPoint::loadCurrentRms).containsOnly(8.0);
        // Source: common practice
        assertThat(plant.supply().frequencyHz()).isEqualTo(50);
        assertThat(plant.mainsLead()).isEqualTo(new MainsLead(2, 0.7e-6, 0.8e-6));
        assertThat(plant.filterEarthLead()).isEqualTo(0.1);
        assertThat(plant.link()).isEqualTo(new Link(new Capacitor(470e-6, 0.1, 40e-9), new Capacitor(0, 0.1, 10e-9)));
        assertThat(plant.frameBond()).isEmpty();
    }

    @Test
    void aPolicyFileHoldsForProfilesThatSayNothing() throws Refused, IOException {
        assertThat(read("brine-pump").policy()).isEqualTo(new Policy(4.5, false));
        Files.delete(folder.resolve("policy.csv"));
        assertThat(read("brine-pump").policy()).isEqualTo(new Policy(6, false));
    }

    @Test
    void aPartOfTheFolderOverridesABuiltInOne() throws Refused, IOException {
        assertThat(read("brine-pump").installation().motorLead().source()).isEqualTo("data sheet");
        Files.delete(folder.resolve("parts/cables.csv"));
        assertThat(read("brine-pump").installation().motorLead().source()).isEqualTo("generic");
    }

    @Test
    void remembersWhereEachQuantityStands() throws Refused {
        Profile conveyor = read("dock-conveyor");
        String file = folder.resolve("dock-conveyor.csv").toString();

        assertThat(conveyor.place("carrier frequency")).isEqualTo(new Place(file, 3, 19));
        assertThat(conveyor.place("mask")).isEqualTo(new Place(file, 21, 6));
        assertThat(conveyor.place(Profile.FILE)).isEqualTo(Place.of(file));
    }

    @Test
    void aProfileElsewhereFindsWhatStandsBesideItFirst() throws Refused, IOException {
        Path elsewhere = Files.createDirectories(folder.resolve("examples-over"));
        Path profile = elsewhere.resolve("pump-2.csv");
        Files.copy(folder.resolve("brine-pump.csv"), profile);
        assertThat(read(profile.toString()).installation().motorLeadLength()).isEqualTo(15);

        Path beside =
                Files.createDirectories(elsewhere.resolve("installations")).resolve("plant.csv");
        String plant = Files.readString(folder.resolve("installations/plant.csv"));
        Files.writeString(beside, plant.replace("motor lead length,15", "motor lead length,80"));
        Files.writeString(elsewhere.resolve("policy.csv"), "quantity,value,unit,note\nrequired margin,9,dB,\n");

        Profile read = read(profile.toString());
        assertThat(read.name()).isEqualTo("pump-2");
        assertThat(read.installation().motorLeadLength()).isEqualTo(80);
        assertThat(read.policy().requiredMarginDb()).isEqualTo(9);
        assertThat(read("brine-pump").installation().motorLeadLength()).isEqualTo(15);
    }

    @Test
    void aProfileNamedTwiceIsReadOnce() throws Refused {
        List<String> twice =
                List.of("brine-pump", folder.resolve("brine-pump.csv").toString(), "brine-pump.csv");
        assertThat(new ProfileFolder(folder).read(twice)).hasSize(1);
    }

    @Test
    void twoFilesOfOneNameAreRefused() throws IOException {
        Path other = Files.createDirectories(folder.resolve("other")).resolve("brine-pump.csv");
        Files.copy(folder.resolve("brine-pump.csv"), other);
        assertThat(told("brine-pump", other.toString()))
                .containsExactly("FOLDER/other/brine-pump.csv: has the same name as FOLDER/brine-pump.csv; "
                        + "the report of one would replace the other's");
    }

    @Test
    void listsPublishedAndOwnMasks() throws Refused {
        assertThat(new ProfileFolder(folder).masks())
                .extracting(Mask::name)
                .contains("dock-own", "iec61800-3-c2", "ce102-28v")
                .isSorted()
                .hasSize(28);
    }

    @Test
    void anOwnMaskMayNotTakeAPublishedName() throws IOException {
        Files.copy(folder.resolve("masks/dock-own.csv"), folder.resolve("masks/cispr11-b.csv"));
        assertThat(told("brine-pump"))
                .containsExactly(
                        "FOLDER/masks/cispr11-b.csv: \"cispr11-b\", the name of a published mask that is built "
                                + "in; give this file another name");
    }

    @ParameterizedTest
    @ValueSource(strings = {"comma", "semicolon", "byte order mark", "CRLF", "CR", "spreadsheet", "quoted"})
    void readsTheSameFromEveryDialect(String dialect) throws IOException, Refused {
        Profile plain = read("dock-conveyor");
        Path file = folder.resolve("dock-conveyor.csv");
        String text = Files.readString(file);
        Files.writeString(
                file,
                switch (dialect) {
                    case "comma" -> text + "\n\n# the end";
                    case "semicolon" ->
                        text.replace("20; 50", "\"20\t 50\"")
                                .replace("3.1;4.2", "\"3.1\t4.2\"")
                                .replace("start, ", "start\t ")
                                .replace(',', ';')
                                .replace('\t', ';');
                    case "byte order mark" -> "\uFEFF" + text;
                    case "CRLF" -> text.replace("\n", "\r\n");
                    case "CR" -> text.replace("\n", "\r");
                    case "spreadsheet" -> text.replace("\n\n", "\n,,,\n").replace("defaults\n", "defaults,,,\n");
                    case "quoted" ->
                        text.replace("carrier frequency,8000,Hz", "\"carrier frequency\" , \"8000\",\" Hz \"");
                    default -> throw new IllegalArgumentException(dialect);
                });
        Profile read = read("dock-conveyor");
        assertThat(read.settings()).isEqualTo(plain.settings());
        assertThat(read.points()).isEqualTo(plain.points());
        assertThat(read.policy()).isEqualTo(plain.policy());
        assertThat(read.place("mask").line()).isEqualTo(21);
    }

    @Test
    void namesTheFaultsOfAllFilesAtOnceSortedByPlace() throws IOException {
        GoodFolder.writeBrinePump(folder, "carrier frequency,4,kHz,", "carrier frequency,4,m,");
        spoil("dock-conveyor.csv", "modulation,sine-triangle", "modulation,sine");
        spoil("installations/plant.csv", "supply voltage,400,V", "supply voltage,4,V");
        spoil("installations/dock.csv", "motor,motor-1.5kw", "motor,motor-1.5k");
        spoil("masks/dock-own.csv", "500000,30000000,60,60", "600000,30000000,60,60");
        spoil("parts/cables.csv", "0.4 nF/m", "0.4 nF");
        spoil("policy.csv", "4.5,dB", "4.5,V");

        assertThat(told("brine-pump", "dock-conveyor"))
                .extracting(problem -> problem.replaceAll(": \".*", ""))
                .containsExactly(
                        "FOLDER/brine-pump.csv:2:21",
                        "FOLDER/dock-conveyor.csv:4:12",
                        "FOLDER/installations/dock.csv:19:7",
                        "FOLDER/installations/plant.csv:3:16",
                        "FOLDER/masks/dock-own.csv:4:9",
                        "FOLDER/parts/cables.csv:2:10",
                        "FOLDER/policy.csv:2:21");
    }

    private void spoil(String file, String sound, String spoilt) throws IOException {
        String text = Files.readString(folder.resolve(file));
        assertThat(text).contains(sound);
        Files.writeString(folder.resolve(file), text.replace(sound, spoilt));
    }

    @Test
    void noProfileIsRefused() throws IOException {
        Path empty = Files.createDirectories(folder.resolve("empty"));
        Refused refused = catchThrowableOfType(Refused.class, () -> new ProfileFolder(empty).readAll());
        assertThat(refused).hasMessage(empty + ": no profile found; wanted are files NAME.csv in this folder");

        Path absent = folder.resolve("absent");
        assertThat(catchThrowableOfType(Refused.class, () -> new ProfileFolder(absent).names()))
                .hasMessage(absent + ": no such folder of profiles");
        assertThat(told()).containsExactly("FOLDER: no profile was asked for");
    }

    @Test
    void anUnknownProfileIsRefusedWithTheNearestName() {
        String known = "no such profile: neither a name nor the path of a file that ends in .csv; nearest: brine-pump; "
                + "known in FOLDER are brine-pump, dock-conveyor";
        assertThat(told("brine-pmp")).containsExactly("brine-pmp: " + known);
        assertThat(told(folder + "/brine-pumps.csv")).containsExactly("FOLDER/brine-pumps.csv: " + known);
        assertThat(told("\0")).singleElement().asString().contains("no such profile");
    }

    @Test
    void aFolderInPlaceOfAFileIsRefused() throws IOException {
        Files.delete(folder.resolve("policy.csv"));
        Files.createDirectory(folder.resolve("policy.csv"));
        assertThat(told("brine-pump", folder.toString()))
                .containsExactly("FOLDER: a folder, wanted is a file", "FOLDER/policy.csv: a folder, wanted is a file");
    }

    @Test
    void aHugeFileIsRefusedUnread() throws IOException {
        Path huge = folder.resolve("brine-pump.csv");
        try (RandomAccessFile file = new RandomAccessFile(huge.toFile(), "rw")) {
            file.setLength(50_000_000);
        }
        assertThat(told("brine-pump"))
                .containsExactly("FOLDER/brine-pump.csv: file of 50 MB; a table of settings, parts or limits may have "
                        + "1 MiB at most");
    }

    @Test
    void aBinaryFileIsRefused() throws IOException {
        byte[] text = Files.readAllBytes(folder.resolve("brine-pump.csv"));
        byte[] binary = Arrays.copyOf(text, text.length + 4);
        Files.write(folder.resolve("brine-pump.csv"), binary);
        assertThat(told("brine-pump"))
                .containsExactly("FOLDER/brine-pump.csv:13:1: control character U+0000; wanted is a text file, this "
                        + "looks binary");
    }

    @Test
    void otherEncodingsAreRefusedAtTheirPlaceAndHideNothing() throws IOException {
        String text = Files.readString(folder.resolve("dock-conveyor.csv")).replace("sine-triangle", "sine");
        Files.write(folder.resolve("dock-conveyor.csv"), text.getBytes(StandardCharsets.ISO_8859_1));
        assertThat(told("dock-conveyor"))
                .containsExactly(
                        "FOLDER/dock-conveyor.csv:4:12: \"sine\", modulation must be sine-triangle or third-harmonic-1/6 or third-harmonic-1/4 or space-vector or clamp-60 or clamp-60-lead or clamp-60-lag or clamp-30 or clamp-120-upper or clamp-120-lower",
                        "FOLDER/dock-conveyor.csv:7:15: a byte here is no UTF-8; save the file as UTF-8");

        Files.write(folder.resolve("dock-conveyor.csv"), ("\uFEFF" + text).getBytes(StandardCharsets.UTF_16LE));
        assertThat(told("dock-conveyor"))
                .containsExactly("FOLDER/dock-conveyor.csv: text in UTF-16; save the file as UTF-8");
    }

    @Test
    void filesThatDifferInTheirEndingAloneAreNotPassedOverInSilence() throws IOException {
        assumeThat(folder.resolve("BRINE-PUMP.CSV"))
                .as("file names differ in case")
                .doesNotExist();
        Files.copy(folder.resolve("brine-pump.csv"), folder.resolve("brine-pump.CSV"));
        assertThat(told("brine-pump")).containsExactly("FOLDER: two files are named brine-pump.csv");
    }

    @Test
    void aHiddenFileIsNotPassedOverInSilence() throws IOException {
        Files.copy(folder.resolve("brine-pump.csv"), folder.resolve("...csv"));
        Refused refused = catchThrowableOfType(Refused.class, () -> new ProfileFolder(folder).readAll());
        assertThat(refused.problems())
                .extracting(Problem::message)
                .containsExactly("the name of a profile may not begin with a point");
    }
}
