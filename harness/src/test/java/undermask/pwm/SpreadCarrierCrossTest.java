package undermask.pwm;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import undermask.drive.Carrier;
import undermask.drive.CarrierSampling;
import undermask.drive.DriveSettings;
import undermask.drive.EdgeForm;
import undermask.drive.Edges;
import undermask.drive.Modulation;
import undermask.drive.ModulationPlan;
import undermask.drive.OperatingPoint;
import undermask.drive.Spread;
import undermask.drive.SpreadForm;
import undermask.drive.Switching;
import undermask.drive.VoltageCurve;
import undermask.receiver.Receiver;
import undermask.receiver.ReceiverStandard;
import undermask.signal.EdgeTrain;
import undermask.unit.Decibels;

class SpreadCarrierCrossTest {
    private static final double CARRIER = 8000;
    private static final double DEVIATION = 1000;
    /** The 25th multiple of the carrier. */
    private static final double TUNED = 200e3;

    private static Bridge spread(SpreadForm form, double deviation, long seed) {
        Spread spread = form == SpreadForm.NONE ? Spread.NONE : new Spread(form, deviation, 50, seed);
        DriveSettings settings = new DriveSettings(
                new Carrier(
                        OptionalDouble.of(CARRIER),
                        OptionalInt.empty(),
                        Optional.empty(),
                        CarrierSampling.TWICE,
                        spread),
                ModulationPlan.of(Modulation.SPACE_VECTOR),
                Switching.of(0),
                Edges.of(5e9, 5e9, EdgeForm.EXPONENTIAL),
                new VoltageCurve(250, Bridges.OUTPUT, 0),
                OptionalDouble.of(Bridges.LINK));
        return Bridges.switched(settings, new OperatingPoint(Bridges.OUTPUT, 5, 0.8));
    }

    @ParameterizedTest
    @EnumSource(names = "NONE", mode = EnumSource.Mode.EXCLUDE)
    void aVanishingSpreadIsTheFixedCarrier(SpreadForm form) {
        Receiver receiver = Receiver.of(ReceiverStandard.CISPR_16);
        var fixed =
                receiver.at(TUNED, spread(SpreadForm.NONE, 0, 1).commonMode().lines());
        var narrow = receiver.at(TUNED, spread(form, 1e-4, 1).commonMode().lines());
        assertThat(Decibels.ofRatio(narrow.peak() / fixed.peak())).isCloseTo(0, within(0.01));
        assertThat(Decibels.ofRatio(narrow.quasiPeak() / fixed.quasiPeak())).isCloseTo(0, within(0.01));
        assertThat(Decibels.ofRatio(narrow.average() / fixed.average())).isCloseTo(0, within(0.01));
    }

    @ParameterizedTest
    @EnumSource(names = "NONE", mode = EnumSource.Mode.EXCLUDE)
    void powerStaysWhatItIs(SpreadForm form) {
        double fixed = power(spread(SpreadForm.NONE, 0, 1).commonMode());
        assertThat(power(spread(form, DEVIATION, 1).commonMode())).isCloseTo(fixed, withinPercentage(1));
    }

    @Test
    void equalSeedsGiveEqualCarriers() {
        EdgeTrain first = spread(SpreadForm.RANDOM, DEVIATION, 5).leg(0);
        EdgeTrain again = spread(SpreadForm.RANDOM, DEVIATION, 5).leg(0);
        EdgeTrain other = spread(SpreadForm.RANDOM, DEVIATION, 6).leg(0);
        assertThat(again.size()).isEqualTo(first.size());
        boolean differs = other.size() != first.size();
        for (int e = 0; e < first.size(); e++) {
            assertThat(again.time(e)).isEqualTo(first.time(e));
            differs |= e < other.size() && other.time(e) != first.time(e);
        }
        assertThat(differs).isTrue();
    }

    @Test
    void theWindowOutlastsTheDetectorsAndSaysSo() {
        Bridge bridge = spread(SpreadForm.RANDOM, DEVIATION, 1);
        assertThat(bridge.window().seconds()).isGreaterThanOrEqualTo(0.32);
        assertThat(bridge.remarks()).anyMatch(remark -> remark.contains("quasi-peak"));
    }

    // Source: the other way samples the waveform at 20 MHz, shifts it to zero frequency and weights it with the
    // Gaussian
    // whose transform has 9 kHz between its 6 dB points, every 20 µs; the average detector shows the mean modulus.
    @ParameterizedTest
    @EnumSource(names = "NONE", mode = EnumSource.Mode.EXCLUDE)
    void averageFallsAsInASampledSimulation(SpreadForm form) {
        Receiver receiver = Receiver.of(ReceiverStandard.CISPR_16);
        EdgeTrain fixed = spread(SpreadForm.NONE, 0, 1).commonMode();
        EdgeTrain wide = spread(form, DEVIATION, 1).commonMode();
        double reduction = Decibels.ofRatio(receiver.at(TUNED, fixed.lines()).average()
                / receiver.at(TUNED, wide.lines()).average());
        double sampled = 20 * Math.log10(sampledAverage(fixed) / sampledAverage(wide));
        assertThat(reduction).isCloseTo(sampled, within(1.0)).isGreaterThan(1);
    }

    private static double power(EdgeTrain train) {
        int count = (int) (1e6 * train.period());
        double[] re = new double[count];
        double[] im = new double[count];
        train.lines().read(1, count, re, im);
        double sum = 0;
        for (int i = 0; i < count; i++) {
            sum += re[i] * re[i] + im[i] * im[i];
        }
        return sum;
    }

    private static double sampledAverage(EdgeTrain train) {
        double rate = 20e6;
        int count = (int) Math.round(rate * train.period());
        float[] re = new float[count];
        float[] im = new float[count];
        double level = train.initialLevel();
        int edge = 0;
        for (int i = 0; i < count; i++) {
            double time = i / rate;
            while (edge < train.size() && train.time(edge) <= time) {
                level += train.step(edge++);
            }
            double turns = time * TUNED;
            double angle = 2 * Math.PI * (turns - Math.floor(turns));
            re[i] = (float) (level * Math.cos(angle));
            im[i] = (float) (-level * Math.sin(angle));
        }
        double sigma = Math.sqrt(2 * Math.log(2)) / (Math.PI * 9000);
        int reach = (int) (4 * sigma * rate);
        float[] weight = new float[2 * reach + 1];
        for (int k = -reach; k <= reach; k++) {
            weight[k + reach] = (float) Math.exp(-0.5 * Math.pow(k / rate / sigma, 2));
        }
        double sum = 0;
        int hops = 0;
        for (int centre = 0; centre < count; centre += 400, hops++) {
            float x = 0;
            float y = 0;
            for (int k = -reach; k <= reach; k++) {
                int at = Math.floorMod(centre + k, count);
                x += weight[k + reach] * re[at];
                y += weight[k + reach] * im[at];
            }
            sum += Math.hypot(x, y);
        }
        return sum / hops;
    }
}
