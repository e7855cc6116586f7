package undermask.check;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import org.hipparchus.linear.Array2DRowRealMatrix;
import org.hipparchus.linear.MatrixUtils;
import org.hipparchus.linear.RealMatrix;
import org.hipparchus.linear.SingularValueDecomposition;
import org.hipparchus.ode.ODEState;
import org.hipparchus.ode.nonstiff.DormandPrince54Integrator;
import org.hipparchus.ode.sampling.ODEStateInterpolator;
import org.hipparchus.ode.sampling.ODEStepHandler;
import org.jtransforms.fft.DoubleFFT_1D;
import org.junit.jupiter.api.Test;
import undermask.drive.Carrier;
import undermask.drive.CarrierSampling;
import undermask.drive.DriveSettings;
import undermask.drive.EdgeForm;
import undermask.drive.Edges;
import undermask.drive.Modulation;
import undermask.drive.ModulationPlan;
import undermask.drive.OperatingPoint;
import undermask.drive.Switching;
import undermask.drive.VoltageCurve;
import undermask.installation.CablePart;
import undermask.installation.Capacitor;
import undermask.installation.Installation;
import undermask.installation.Link;
import undermask.installation.MainsLead;
import undermask.installation.MotorPart;
import undermask.installation.Supply;
import undermask.network.InstallationNetwork;
import undermask.network.MainsNetwork;
import undermask.network.OneStage;
import undermask.pwm.Bridge;
import undermask.pwm.LinkVoltage;
import undermask.pwm.OutputLoad;
import undermask.signal.EdgeTrain;
import undermask.signal.Lines;

/**
 * From switching instants to the mains terminals by two ways that share nothing but those instants: exact lines through
 * the solved network, and the edges in time through state equations, integrated over one window in periodic steady
 * state and transformed.
 *
 * <p>The losses of the motor lead's conductors and insulation depend on frequency and have no exact counterpart in time;
 * this lead has hardly any, and what damps it is what hangs on its ends.
 */
class WholeWayCrossTest {
    private static final double CARRIER = 16e3;
    private static final int SECTIONS = 8;
    /** 131 MHz: what aliases down to 5 MHz lies above 120 MHz. */
    private static final int SAMPLES = 1 << 18;
    /** V and A. Output and lead swing by hundreds of volts, behind the filter millivolts count. */
    private static final double TOLERANCE = 1e-7;

    private static final double TOLERANCE_OF_LEAD = 1e-5;

    private static Installation installation() {
        return installation(new CablePart("lead of low loss", 380e-12, 135e-9, 1e-3, 1e6, 1e-5, true, "generic"));
    }

    /** An evaporator fan of 0.75 kW on single-phase mains. */
    static Installation installation(CablePart lead) {
        return new Installation(
                "evaporator fan",
                new Supply(1, 230, 50),
                new MainsLead(1.5, 0.6e-6, 0.7e-6),
                Optional.of(OneStage.filter(
                        "one stage",
                        1,
                        10,
                        new Capacitor(470e-9, 30e-3, 15e-9),
                        new Capacitor(220e-9, 30e-3, 15e-9),
                        new Capacitor(15e-9, 60e-3, 12e-9),
                        6e-3,
                        60e-6,
                        12e-12,
                        12e3)),
                0.1,
                new Link(new Capacitor(470e-6, 150e-3, 40e-9), new Capacitor(4.7e-9, 100e-3, 0)),
                80e-12,
                lead,
                5,
                new MotorPart("motor of 0.75 kW", 750, 111e-12, 996e-12, 3.14e-3, 2270, 11.5, 0.113, "generic"),
                OptionalDouble.of(1e-6));
    }

    private static EdgeTrain commonMode() {
        DriveSettings settings = new DriveSettings(
                Carrier.fixed(CARRIER, CarrierSampling.TWICE),
                ModulationPlan.of(Modulation.SPACE_VECTOR),
                Switching.of(1e-6),
                Edges.of(4e9, 3e9, EdgeForm.RAMP),
                new VoltageCurve(180, 50, 10),
                OptionalDouble.of(325));
        return Bridge.switching(
                        settings, new OperatingPoint(500, 2.5, 0.8), LinkVoltage.constant(325), OutputLoad.IDEAL)
                .commonMode();
    }

    // Source: none needed, the two ways share no code; 0.3 dB
    @Test
    void frequencyDomainAgreesWithTime() {
        EdgeTrain edges = commonMode();
        Lines lines = edges.lines()
                .through(InstallationNetwork.of(installation(), MainsNetwork.CISPR_9_KHZ)
                        .ports()
                        .get(0)
                        .commonMode());
        int count = (int) (5.1e6 * edges.period());
        double[] re = new double[count + 1];
        double[] im = new double[count + 1];
        lines.read(1, count, re, im);
        double[] inTime = spectrumInTime(edges);
        int perCarrier = (int) Math.round(CARRIER * edges.period());
        for (int m = (int) Math.ceil(150e3 / CARRIER); m * CARRIER <= 5e6; m++) {
            int first = m * perCarrier - perCarrier / 2;
            int last = m * perCarrier + perCarrier / 2;
            double byLines = groupDb(IntStream.range(first, last).mapToDouble(n -> square(re[n - 1], im[n - 1])));
            double byTime =
                    groupDb(IntStream.range(first, last).mapToDouble(n -> square(inTime[2 * n], inTime[2 * n + 1])));
            assertThat(byTime).as("carrier multiple %d", m).isCloseTo(byLines, within(0.3));
            int strongest = IntStream.range(first, last)
                    .boxed()
                    .max((a, b) -> Double.compare(square(re[a - 1], im[a - 1]), square(re[b - 1], im[b - 1])))
                    .orElseThrow();
            assertThat(groupDb(DoubleStream.of(square(inTime[2 * strongest], inTime[2 * strongest + 1]))))
                    .as("strongest line, %d, of carrier multiple %d", strongest, m)
                    .isCloseTo(groupDb(DoubleStream.of(square(re[strongest - 1], im[strongest - 1]))), within(0.3));
        }
    }

    private static double square(double re, double im) {
        return re * re + im * im;
    }

    private static double groupDb(DoubleStream squares) {
        return 10 * Math.log10(squares.sum());
    }

    /** The Fourier coefficients of the terminal voltage, real and imaginary parts in turn. */
    private static double[] spectrumInTime(EdgeTrain edges) {
        EdgesInTime source = new EdgesInTime(edges);
        CommonModeInTime circuit = new CommonModeInTime(installation(), SECTIONS, source);
        double period = edges.period();
        double[] fromRest = overOnePeriod(circuit, source, new double[circuit.getDimension()], null);
        double[] start = steadyState(fromRest, period);
        double[] samples = new double[2 * SAMPLES];
        double[] end = overOnePeriod(circuit, source, start, samples);
        double largest = Arrays.stream(start).map(Math::abs).max().orElseThrow();
        for (int i = 0; i < end.length; i++) {
            // the lead's sections ring at 100 MHz, far above what is compared, and are not held in phase over the
            // window
            if (!circuit.belongsToLead(i)) {
                assertThat(end[i]).as("state %d repeats", i).isCloseTo(start[i], within(1e-4 * largest));
            }
        }
        new DoubleFFT_1D(SAMPLES).realForwardFull(samples);
        return Arrays.stream(samples).map(value -> value / SAMPLES).toArray();
    }

    /**
     * The start that repeats after a period: x = Φ·x + x₀, where x₀ is what a period makes of rest and Φ what it makes of
     * each state by itself. Charges that nothing can move stay as they are at rest.
     */
    private static double[] steadyState(double[] fromRest, double period) {
        int halvings = 10;
        CommonModeInTime unfed = new CommonModeInTime(installation(), SECTIONS, time -> 0);
        int size = fromRest.length;
        RealMatrix transition = new Array2DRowRealMatrix(size, size);
        for (int j = 0; j < size; j++) {
            double[] unit = new double[size];
            unit[j] = 1;
            transition.setColumn(
                    j,
                    integrator(unfed)
                            .integrate(unfed, new ODEState(0, unit), period / (1 << halvings))
                            .getPrimaryState());
        }
        for (int i = 0; i < halvings; i++) {
            transition = transition.multiply(transition);
        }
        RealMatrix rest = MatrixUtils.createRealIdentityMatrix(size).subtract(transition);
        return new SingularValueDecomposition(rest)
                .getSolver()
                .solve(MatrixUtils.createRealVector(fromRest))
                .toArray();
    }

    private static DormandPrince54Integrator integrator(CommonModeInTime circuit) {
        double[] tolerance = new double[circuit.getDimension()];
        Arrays.setAll(tolerance, i -> circuit.belongsToLead(i) ? TOLERANCE_OF_LEAD : TOLERANCE);
        return new DormandPrince54Integrator(1e-15, 1e-6, tolerance, tolerance);
    }

    /** Integrates from kink to kink of the source; samples the terminal voltage when asked to. */
    private static double[] overOnePeriod(
            CommonModeInTime circuit, EdgesInTime source, double[] start, double[] samples) {
        double time = 0;
        double[] state = start.clone();
        DormandPrince54Integrator integrator = integrator(circuit);
        if (samples != null) {
            integrator.addStepHandler(new Sampler(circuit, samples, source.period()));
        }
        for (double kink : source.kinks()) {
            state = integrator
                    .integrate(circuit, new ODEState(time, state), kink)
                    .getPrimaryState();
            time = kink;
        }
        return state;
    }

    private record Sampler(CommonModeInTime circuit, double[] samples, double period) implements ODEStepHandler {
        @Override
        public void handleStep(ODEStateInterpolator interpolator) {
            double step = period / SAMPLES;
            int next = (int) Math.ceil(interpolator.getPreviousState().getTime() / step);
            int last = (int) Math.ceil(interpolator.getCurrentState().getTime() / step);
            for (int n = next; n < Math.min(last, SAMPLES); n++) {
                samples[n] = circuit.terminal(
                        interpolator.getInterpolatedState(n * step).getPrimaryState());
            }
        }
    }

    /**
     * The edges as a voltage in time, those of the windows before and after included. They are ramps: outside half a
     * transition time an edge is all or nothing.
     */
    private static final class EdgesInTime implements CommonModeInTime.Source {
        private final EdgeTrain edges;
        private final double[] times;
        /** Level before each edge when all edges before are complete. */
        private final double[] levels;

        private final double longest;

        EdgesInTime(EdgeTrain edges) {
            this.edges = edges;
            int size = edges.size();
            times = IntStream.range(0, 3 * size)
                    .mapToDouble(e -> edges.time(e % size) + (e / size - 1) * edges.period())
                    .toArray();
            levels = new double[3 * size + 1];
            levels[0] = edges.initialLevel();
            for (int e = 0; e < 3 * size; e++) {
                levels[e + 1] = levels[e] + edges.step(e % size);
            }
            longest = IntStream.range(0, size)
                    .mapToDouble(e -> edges.shape(e).transitionTime())
                    .max()
                    .orElseThrow();
        }

        double period() {
            return edges.period();
        }

        @Override
        public double at(double time) {
            int found = Arrays.binarySearch(times, time - longest);
            int first = found >= 0 ? found : -found - 1;
            double voltage = levels[first];
            for (int e = first; times[e] < time + longest; e++) {
                int edge = e % edges.size();
                voltage += edges.step(edge) * edges.shape(edge).response(time - times[e]);
            }
            return voltage;
        }

        /** Instants within the period where a ramp begins or ends, and the end of the period. */
        double[] kinks() {
            DoubleStream ramps = IntStream.range(0, times.length).boxed().flatMapToDouble(e -> {
                double half = edges.shape(e % edges.size()).transitionTime() / 2;
                return DoubleStream.of(times[e] - half, times[e] + half);
            });
            return DoubleStream.concat(ramps, DoubleStream.of(edges.period()))
                    .filter(time -> time > 0 && time <= edges.period())
                    .sorted()
                    .distinct()
                    .toArray();
        }
    }
}
