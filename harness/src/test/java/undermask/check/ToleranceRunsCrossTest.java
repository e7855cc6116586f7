package undermask.check;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import undermask.SmallPlant;
import undermask.input.ProfileFolder;
import undermask.input.Refused;
import undermask.installation.Parasitic;
import undermask.network.InstallationNetwork;
import undermask.network.PortResponse;
import undermask.network.Variation;
import undermask.receiver.Detector;
import undermask.receiver.Receiver;
import undermask.receiver.Trace;
import undermask.signal.Lines;
import undermask.signal.TabulatedTransfer;

class ToleranceRunsCrossTest {
    @TempDir
    private Path folder;

    private Profile profile;

    @BeforeEach
    void write() throws IOException, Refused {
        profile = read("tolerance runs,40,,");
    }

    private Profile read(String rows) throws IOException, Refused {
        SmallPlant.write(folder, "pump", "filter-3ph-16a", rows);
        return new ProfileFolder(folder).read(List.of("pump")).get(0);
    }

    // Source: the other way solves the changed network as a whole and reads its lines with the receiver. A resonance
    // that moves within a bandwidth is where the two may part.
    @ParameterizedTest
    @EnumSource(
            value = Parasitic.class,
            names = {"LEAD_CAPACITANCE", "FILTER_EARTH_LEAD", "Y_CAPACITOR", "HEATSINK", "MOTOR_TERMINALS", "LINK_ESR"})
    void aChangedValueShiftsTheReadingAsAFullScanHasIt(Parasitic parasitic) {
        Variation variation = other -> other == parasitic ? 1.3 : 1;
        InstallationNetwork network =
                InstallationNetwork.of(profile.installation(), profile.mask().network(), profile.peakCurrent());
        var point = profile.points().get(0);
        var bridge = undermask.pwm.Bridge.switching(profile.settings(), point, profile.link(point), profile.load());
        Receiver receiver = Receiver.of(profile.mask().receiver());
        PortLines nominal = PortLines.few(bridge, network);
        PortResponse as = network.response(Variation.NONE);
        PortResponse moved = network.response(variation);
        for (double frequency : new double[] {150e3, 400e3, 1.2e6, 3.3e6, 9e6, 17e6}) {
            double[] common = PortMix.ratio(moved.commonMode(0, frequency), as.commonMode(0, frequency));
            double[] link = PortMix.ratio(moved.linkCurrent(0, frequency), as.linkCurrent(0, frequency));
            PortReadings readings = PortReadings.of(nominal, 0, receiver, new double[] {frequency});
            float[] factor = {(float) common[0], (float) common[1], (float) link[0], (float) link[1]};
            double shift = 10
                    * Math.log10(
                            readings.square(Detector.QUASI_PEAK, 0, factor) / readings.square(Detector.QUASI_PEAK, 0));
            double before = receiver.at(frequency, nominal.both(0)).quasiPeak();
            double after = receiver.at(frequency, changed(bridge, moved)).quasiPeak();
            assertThat(20 * Math.log10(after / before))
                    .as("%s at %s Hz", parasitic, frequency)
                    .isCloseTo(shift, within(0.2));
        }
    }

    private static Lines changed(undermask.pwm.Bridge bridge, PortResponse response) {
        return bridge.commonMode()
                .lines()
                .through(TabulatedTransfer.of(
                        (f, out) -> System.arraycopy(response.commonMode(0, f), 0, out, 0, 2), 7e3, 30.1e6, 1e6, 1e-3))
                .plus(bridge.linkCurrent()
                        .lines()
                        .through(TabulatedTransfer.of(
                                (f, out) -> System.arraycopy(response.linkCurrent(0, f), 0, out, 0, 2),
                                7e3,
                                30.1e6,
                                1e6,
                                1e-3)));
    }

    @Test
    void percentilesStandInOrderAndEqualSeedsAgree() throws IOException, Refused {
        ProfileResult result = Check.of(profile);
        ProfileResult again = Check.of(read("tolerance runs,40,,"));
        ProfileResult other = Check.of(read("tolerance runs,40,,\ntolerance seed,2,,"));
        TraceBand band = result.band().orElseThrow();
        boolean differs = false;
        for (int step = 0; step < band.low().size(); step++) {
            double low = band.low().levelDbuv(Detector.QUASI_PEAK, step);
            double middle = band.middle().levelDbuv(Detector.QUASI_PEAK, step);
            double high = band.high().levelDbuv(Detector.QUASI_PEAK, step);
            assertThat(low).isLessThanOrEqualTo(middle);
            assertThat(middle).isLessThanOrEqualTo(high);
            assertThat(again.band().orElseThrow().high().levelDbuv(Detector.QUASI_PEAK, step))
                    .isEqualTo(high);
            differs |= other.band().orElseThrow().high().levelDbuv(Detector.QUASI_PEAK, step) != high;
        }
        assertThat(differs).isTrue();
    }

    @Test
    void aHigherPercentileLeavesLessMargin() throws IOException, Refused {
        double half = Check.of(read("tolerance runs,40,,\npercentile,50,%,"))
                .judgements()
                .get(0)
                .marginDb();
        double most = Check.of(read("tolerance runs,40,,\npercentile,95,%,"))
                .judgements()
                .get(0)
                .marginDb();
        assertThat(most).isLessThan(half);
    }

    // a receiver of MIL-STD-461 begins at 10 kHz and has no quasi-peak detector
    @Test
    void runsStayWithinTheReceiverOfTheMask() throws IOException, Refused {
        SmallPlant.write(folder, "pump", "filter-3ph-16a", "tolerance runs,10,,");
        Path pump = folder.resolve("pump.csv");
        Files.writeString(pump, Files.readString(pump).replace("iec61800-3-c2", "ce102-440v"));
        ProfileResult result =
                Check.of(new ProfileFolder(folder).read(List.of("pump")).get(0));
        TraceBand band = result.band().orElseThrow();
        assertThat(band.high().frequency(0)).isEqualTo(10e3);
        for (int step = 0; step < band.low().size(); step++) {
            assertThat(band.low().levelDbuv(Detector.PEAK, step))
                    .isLessThanOrEqualTo(band.high().levelDbuv(Detector.PEAK, step));
            assertThat(band.low().levelDbuv(Detector.QUASI_PEAK, step)).isNaN();
        }
    }

    @Test
    void withoutRunsThereIsNoBand() throws IOException, Refused {
        ProfileResult result = Check.of(read(""));
        assertThat(result.band()).isEmpty();
        Trace envelope = result.envelope();
        assertThat(envelope.size()).isPositive();
    }

    @Test
    void leverageNamesWhatMovesTheReading() throws IOException, Refused {
        ProfileResult result = Check.of(read(""));
        assertThat(result.leverages()).hasSameSizeAs(result.judgements());
        for (Leverage leverage : result.leverages()) {
            assertThat(leverage.elements()).hasSize(3);
            assertThat(Math.abs(leverage.elements().get(0).decibels()))
                    .isGreaterThanOrEqualTo(Math.abs(leverage.elements().get(2).decibels()))
                    .isGreaterThan(0.1);
        }
    }
}
