package undermask.bench;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import undermask.check.Check;
import undermask.check.Policy;
import undermask.check.Profile;
import undermask.check.ProfileResult;
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
import undermask.installation.FilterPart;
import undermask.installation.FilterStage;
import undermask.installation.Installation;
import undermask.installation.Link;
import undermask.installation.MainsLead;
import undermask.installation.MotorPart;
import undermask.installation.Supply;
import undermask.mask.LimitSegment;
import undermask.mask.Mask;
import undermask.network.MainsNetwork;
import undermask.receiver.Detector;
import undermask.receiver.ReceiverStandard;
import undermask.unit.Place;

/** From saved settings to the verdict: a 4 kW drive at one operating point, one core. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 5, time = 3)
@Measurement(iterations = 5, time = 3)
@Fork(1)
public class WholeCheck {
    @Param({"4000", "16000"})
    public double carrierHz;

    private Profile profile;

    @Setup
    public void takeProfile() {
        DriveSettings settings = new DriveSettings(
                Carrier.fixed(carrierHz, CarrierSampling.TWICE),
                ModulationPlan.of(Modulation.SPACE_VECTOR),
                Switching.of(1e-6),
                new Edges(5e9, 3e9, EdgeForm.EXPONENTIAL, 0.3, 11.6, 0.3e-9, Optional.empty(), Optional.empty()),
                new VoltageCurve(380, 50, 0),
                OptionalDouble.empty());
        FilterPart filter = new FilterPart(
                "three-phase",
                3,
                16,
                new Capacitor(1e-6, 0.02, 15e-9),
                List.of(new FilterStage(
                        3e-3,
                        15e-6,
                        20e-12,
                        8e3,
                        Optional.empty(),
                        new Capacitor(1e-6, 0.02, 15e-9),
                        new Capacitor(33e-9, 0.05, 10e-9))),
                Double.POSITIVE_INFINITY,
                "typical");
        CablePart lead = new CablePart("shielded", 250e-12, 150e-9, 0.05, 1e6, 0.02, true, "typical");
        MotorPart motor = new MotorPart("4 kW", 4e3, 0.3e-9, 3e-9, 2e-3, 4e3, 5, 22e-3, "typical");
        Installation installation = new Installation(
                "bench",
                new Supply(3, 400, 50),
                new MainsLead(2, 0.8e-6, 0.8e-6),
                Optional.of(filter),
                0.05,
                new Link(new Capacitor(500e-6, 0.1, 30e-9), new Capacitor(100e-9, 0.05, 20e-9)),
                100e-12,
                lead,
                20,
                motor,
                OptionalDouble.empty());
        Mask mask = new Mask(
                "bench",
                "flat",
                "none",
                ReceiverStandard.CISPR_16,
                MainsNetwork.CISPR_9_KHZ,
                List.of(
                        new LimitSegment(Detector.QUASI_PEAK, 150e3, 30e6, 79, 73),
                        new LimitSegment(Detector.AVERAGE, 150e3, 30e6, 66, 60)));
        profile = new Profile(
                "bench",
                settings,
                List.of(new OperatingPoint(50, 8.2, 0.82)),
                installation,
                mask,
                new Policy(3, false),
                Map.of(Profile.FILE, Place.of("bench.csv")));
    }

    @Benchmark
    public ProfileResult check() {
        return Check.of(profile);
    }
}
