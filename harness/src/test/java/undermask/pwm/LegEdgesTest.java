package undermask.pwm;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Optional;
import org.junit.jupiter.api.Test;
import undermask.drive.EdgeForm;
import undermask.drive.Edges;
import undermask.drive.Ringing;
import undermask.drive.ShortPulses;
import undermask.drive.Switching;
import undermask.signal.EdgeTrain;
import undermask.signal.RingingEdge;

/** One pulse of 40 µs in a window of 100 µs on a 600 V link: what its two edges become. Common practice throughout. */
class LegEdgesTest {
    private static final double WINDOW = 100e-6;
    private static final double DEAD_TIME = 2e-6;
    private static final double LINK = 600;
    private static final double CAPACITANCE = 2e-9;

    private static Edges edges(double slowing, Optional<Ringing> rising) {
        return new Edges(6e9, 3e9, EdgeForm.RAMP, slowing, 10, 0, rising, Optional.empty());
    }

    private static EdgeTrain pulse(Edges edges, Switching switching, double amperes) {
        SwitchingInstants commands = new SwitchingInstants(WINDOW, new double[] {20e-6, 60e-6}, true, false);
        return new LegEdges(edges, switching, LinkVoltage.constant(LINK), CAPACITANCE, WINDOW)
                .of(commands, new double[] {amperes, amperes});
    }

    @Test
    void currentOutOfTheLegForcesTheRiseAfterDeadTimeAndFallsByItself() {
        EdgeTrain train = pulse(edges(0.5, Optional.empty()), Switching.of(DEAD_TIME), 5);
        // 600 V at 6 kV/us are 100 ns, a quarter more at half the reference current
        assertThat(train.shape(0).transitionTime()).isCloseTo(125e-9, within(1e-12));
        assertThat(train.time(0)).isCloseTo(22e-6 + 62.5e-9, within(1e-12));
        // 5 A into 2 nF are 2.5 kV/us, slower than what is set
        assertThat(train.shape(1).transitionTime()).isCloseTo(240e-9, within(1e-12));
        assertThat(train.time(1)).isCloseTo(60e-6 + 120e-9, within(1e-12));
    }

    @Test
    void currentIntoTheLegRisesByItselfAndForcesTheFall() {
        EdgeTrain train = pulse(edges(0, Optional.empty()), Switching.of(DEAD_TIME), -5);
        assertThat(train.time(0)).isCloseTo(20e-6 + 120e-9, within(1e-12));
        assertThat(train.shape(1).transitionTime()).isCloseTo(200e-9, within(1e-12));
        assertThat(train.time(1)).isCloseTo(62e-6 + 100e-9, within(1e-12));
    }

    @Test
    void aLargeCurrentChargesNoFasterThanSet() {
        EdgeTrain train = pulse(edges(0, Optional.empty()), Switching.of(DEAD_TIME), 50);
        assertThat(train.shape(1).transitionTime()).isCloseTo(200e-9, within(1e-12));
    }

    @Test
    void whatASmallCurrentLeavesIsForcedWhenTheDeadTimeEnds() {
        // 0.3 A moves 2 nF by 300 V in 2 us: half of the way
        EdgeTrain train = pulse(edges(0, Optional.empty()), Switching.of(DEAD_TIME), 0.3);
        assertThat(train.size()).isEqualTo(3);
        assertThat(train.step(1)).isCloseTo(-0.5, within(1e-9));
        assertThat(train.shape(1).transitionTime()).isCloseTo(DEAD_TIME, within(1e-12));
        assertThat(train.step(2)).isCloseTo(-0.5, within(1e-9));
        assertThat(train.shape(2).transitionTime()).isCloseTo(100e-9, within(1e-12));
        assertThat(train.time(2)).isCloseTo(62e-6 + 50e-9, within(1e-12));
    }

    @Test
    void onlyForcedEdgesRing() {
        Ringing ringing = new Ringing(8e6, 0.1, 0.3);
        EdgeTrain out = pulse(edges(0, Optional.of(ringing)), Switching.of(DEAD_TIME), 5);
        assertThat(out.shape(0)).isInstanceOf(RingingEdge.class);
        assertThat(out.shape(1)).isNotInstanceOf(RingingEdge.class);
        EdgeTrain in = pulse(edges(0, Optional.of(ringing)), Switching.of(DEAD_TIME), -5);
        assertThat(in.shape(0)).isNotInstanceOf(RingingEdge.class);
    }

    @Test
    void upperAndLowerSwitchHaveTheirOwnDelays() {
        Switching switching = new Switching(DEAD_TIME, false, 0, ShortPulses.DROP, 300e-9, 500e-9);
        assertThat(pulse(edges(0, Optional.empty()), switching, 5).time(0)).isCloseTo(22.3e-6 + 50e-9, within(1e-12));
        assertThat(pulse(edges(0, Optional.empty()), switching, -5).time(1)).isCloseTo(62.5e-6 + 100e-9, within(1e-12));
    }

    @Test
    void aPulseShorterThanTheDeadTimeVanishes() {
        SwitchingInstants commands =
                new SwitchingInstants(WINDOW, new double[] {20e-6, 21e-6, 50e-6, 70e-6}, true, false);
        EdgeTrain train = new LegEdges(
                        edges(0, Optional.empty()), Switching.of(DEAD_TIME), LinkVoltage.constant(LINK), 0, WINDOW)
                .of(commands, new double[] {5, 5, 5, 5});
        assertThat(train.size()).isEqualTo(2);
        assertThat(train.time(0)).isGreaterThan(50e-6);
    }

    @Test
    void shortPulsesAndGapsAreDroppedOrHeld() {
        double[] times = {10e-6, 11e-6, 30e-6, 50e-6, 50.5e-6, 80e-6};
        SwitchingInstants commands = new SwitchingInstants(WINDOW, times, true, false);
        assertThat(commands.shorterThan(3e-6)).isEqualTo(2);
        SwitchingInstants dropped = commands.atLeast(3e-6, ShortPulses.DROP);
        assertThat(dropped.size()).isEqualTo(2);
        assertThat(dropped.time(0)).isEqualTo(30e-6);
        assertThat(dropped.time(1)).isEqualTo(80e-6);
        SwitchingInstants held = commands.atLeast(3e-6, ShortPulses.HOLD);
        assertThat(held.size()).isEqualTo(6);
        assertThat(held.time(1) - held.time(0)).isCloseTo(3e-6, within(1e-15));
        assertThat((held.time(1) + held.time(0)) / 2).isCloseTo(10.5e-6, within(1e-15));
        assertThat(held.shorterThan(2.999e-6)).isZero();
    }
}
