package undermask.pwm;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import undermask.drive.CarrierSampling;
import undermask.drive.DriveSettings;
import undermask.drive.Modulation;
import undermask.drive.OperatingPoint;
import undermask.signal.EdgeTrain;
import undermask.signal.Lines;

class LinkCrossTest {
    // Source: the other way steps capacitor and ideal rectifier in time, 0.1 µs at a time, until they repeat.
    @ParameterizedTest(name = "{0} pulses, {2} uF, {3} W")
    @CsvSource({
        "6, 565.7, 470, 4500",
        "6, 565.7, 1000, 15000",
        "6, 565.7, 20, 4000",
        "2, 325.3, 680, 700",
        "2, 325.3, 330, 1500"
    })
    void meanAndRippleAreThoseOfASteppedRectifier(int pulses, double peak, double microfarads, double power) {
        LinkVoltage link = LinkVoltage.rectified(pulses, peak, 50, microfarads * 1e-6, power);
        double step = 1e-7;
        double period = 1 / (pulses * 50.0);
        int steps = (int) Math.round(period / step);
        double volts = peak;
        double sum = 0;
        double low = peak;
        for (int i = 0; i < 3 * steps; i++) {
            double angle = 2 * Math.PI * 50 * (i % steps) * step;
            double mains = peak * Math.max(Math.abs(Math.cos(angle)), Math.abs(Math.cos(angle - 2 * Math.PI / pulses)));
            volts = Math.max(mains, volts - power / volts / (microfarads * 1e-6) * step);
            if (i >= 2 * steps) {
                sum += volts;
                low = Math.min(low, volts);
            }
        }
        assertThat(link.mean()).isCloseTo(sum / steps, withinPercentage(0.05));
        assertThat(link.peakToPeak()).isCloseTo(peak - low, withinPercentage(1));
        assertThat(link.rippleHz()).isEqualTo(pulses * 50);
    }

    // Source: mean of a six-pulse rectifier without capacitor, 3/π of the peak; standard.
    @Test
    void withoutCapacitorTheMeanIsThatOfTheRectifiedMains() {
        assertThat(LinkVoltage.rectified(6, 100, 50, 1e-9, 1000).mean()).isCloseTo(300 / Math.PI, within(0.01));
        assertThat(LinkVoltage.rectified(6, 100, 50, 1e-3, 0).mean()).isEqualTo(100);
    }

    // Source: Kolar and Round, IEE Proc. Electr. Power Appl. 153 (2006), from memory: the rms in the link capacitor is
    // I_rms·√(2M(√3/(4π) + cos²φ(√3/π − 9M/16))) for any scheme whose carrier is fast.
    @ParameterizedTest(name = "M = {0}, power factor {1}")
    @CsvSource({"0.3, 1", "0.6, 0.9", "0.9, 0.8", "1.1, 0.6", "0.6, 0.2"})
    void capacitorCurrentFollowsTheClosedForm(double index, double powerFactor) {
        Bridge bridge = bridge(index, powerFactor, 240);
        double closed = 10
                * Math.sqrt(2
                        * index
                        * (Math.sqrt(3) / (4 * Math.PI)
                                + powerFactor * powerFactor * (Math.sqrt(3) / Math.PI - 9 * index / 16)));
        assertThat(bridge.linkCurrent().capacitorRms()).isCloseTo(closed, withinPercentage(1.5));
        // power in is power out: V_dc·I = 3·V·I·cosφ
        double mean = 3 * index / 2 / Math.sqrt(2) * 10 * powerFactor;
        assertThat(bridge.linkCurrent().mean()).isCloseTo(mean, withinPercentage(1));
    }

    // Source: Parseval; the lines left out beyond 2 MHz carry less than 0.2 % of the square.
    @Test
    void linesCarryTheCapacitorsCurrent() {
        Bridge bridge = bridge(0.8, 0.85, 80);
        Lines lines = bridge.linkCurrent().lines();
        int count = (int) (2e6 * bridge.window().seconds());
        double[] re = new double[count];
        double[] im = new double[count];
        lines.read(1, count, re, im);
        double sum = 0;
        for (int i = 0; i < count; i++) {
            sum += 2 * (re[i] * re[i] + im[i] * im[i]);
        }
        assertThat(Math.sqrt(sum)).isCloseTo(bridge.linkCurrent().capacitorRms(), withinPercentage(0.2));
        double[] block = new double[300];
        double[] blockIm = new double[300];
        lines.read(701, 300, block, blockIm);
        for (int i = 0; i < 300; i++) {
            assertThat(block[i]).isCloseTo(re[700 + i], within(1e-9));
            assertThat(blockIm[i]).isCloseTo(im[700 + i], within(1e-9));
        }
    }

    // Source: a product of two waveforms in time, transformed by direct summation over fine samples.
    @Test
    void rippleModulatesTheLegs() {
        DriveSettings settings = Bridges.settings(4000, Modulation.SPACE_VECTOR, CarrierSampling.TWICE, 0, 0.8);
        OperatingPoint point = new OperatingPoint(Bridges.OUTPUT, 5, 0.8);
        LinkVoltage link = LinkVoltage.rectified(6, 565, 50, 100e-6, 5000);
        EdgeTrain leg =
                Bridge.switching(settings, point, link, OutputLoad.IDEAL).leg(0);
        int samples = 2_000_000;
        double[] volts = new double[samples];
        double level = leg.initialLevel() > 0 ? 0.5 : -0.5;
        int edge = 0;
        for (int i = 0; i < samples; i++) {
            double time = leg.period() * i / samples;
            while (edge < leg.size() && leg.time(edge) <= time) {
                level = leg.step(edge) > 0 ? 0.5 : leg.step(edge) < 0 ? -0.5 : level;
                edge++;
            }
            volts[i] = level * link.at(time);
        }
        double[] re = new double[300];
        double[] im = new double[300];
        leg.lines().read(1, 300, re, im);
        for (int n : List.of(1, 5, 6, 7, 13, 74, 80, 86, 160, 240)) {
            double x = 0;
            double y = 0;
            for (int i = 0; i < samples; i++) {
                double angle = 2 * Math.PI * ((long) n * i % samples) / samples;
                x += volts[i] * Math.cos(angle) / samples;
                y -= volts[i] * Math.sin(angle) / samples;
            }
            // straight pieces between edges follow the ripple to a few hundredths of a volt
            assertThat(Math.hypot(re[n - 1] - x, im[n - 1] - y))
                    .as("line %d", n)
                    .isLessThan(0.05);
        }
    }

    private static Bridge bridge(double index, double powerFactor, int ratio) {
        return Bridges.switched(
                Bridges.settings(ratio * Bridges.OUTPUT, Modulation.SPACE_VECTOR, CarrierSampling.NATURAL, 0, index),
                new OperatingPoint(Bridges.OUTPUT, 10, powerFactor));
    }
}
