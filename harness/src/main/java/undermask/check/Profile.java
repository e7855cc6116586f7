package undermask.check;

import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Set;
import undermask.drive.DriveSettings;
import undermask.drive.OperatingPoint;
import undermask.installation.Installation;
import undermask.mask.Mask;
import undermask.pwm.Bridge;
import undermask.pwm.LinkVoltage;
import undermask.pwm.OutputLoad;
import undermask.unit.Figures;
import undermask.unit.Place;

/**
 * A saved profile with everything that it is checked with.
 *
 * @param name file name without its ending
 * @param settings drive settings
 * @param points operating points, at least one
 * @param places where each quantity of the profile stands; {@link #FILE} for the file itself
 */
public record Profile(
        String name,
        DriveSettings settings,
        List<OperatingPoint> points,
        Installation installation,
        Mask mask,
        Policy policy,
        Map<String, Place> places) {
    /** Key of the place that means the profile's file as a whole. */
    public static final String FILE = "";

    /**
     * Builds a profile of at least one operating point.
     *
     * @throws IllegalArgumentException when a point is named twice or asks for what no bridge can do
     */
    public Profile {
        Objects.requireNonNull(name);
        Objects.requireNonNull(settings);
        points = List.copyOf(points);
        Objects.requireNonNull(installation);
        Objects.requireNonNull(mask);
        Objects.requireNonNull(policy);
        places = Map.copyOf(places);
        if (points.isEmpty()) {
            throw new IllegalArgumentException("profile " + name + " has no operating point");
        }
        if (!places.containsKey(FILE)) {
            throw new IllegalArgumentException("profile " + name + " does not say which file it came from");
        }
        if (Set.copyOf(points).size() < points.size()) {
            throw new IllegalArgumentException("two operating points are alike");
        }
        for (OperatingPoint point : points) {
            Bridge.refuseImpossible(settings, point, link(settings, installation, point));
        }
    }

    /** Where a quantity stands, or the file when it was left to its default. */
    public Place place(String quantity) {
        return places.getOrDefault(quantity, places.get(FILE));
    }

    /** The DC link at a point: as set, else as supply, capacitor and load leave it. */
    public LinkVoltage link(OperatingPoint point) {
        return link(settings, installation, point);
    }

    private static LinkVoltage link(DriveSettings settings, Installation installation, OperatingPoint point) {
        if (settings.linkVoltage().isPresent()) {
            return LinkVoltage.constant(settings.linkVoltage().getAsDouble());
        }
        double power = Math.sqrt(3)
                * settings.voltageCurve().lineVoltage(point.outputHz())
                * point.loadCurrentRms()
                * point.displacementPowerFactor();
        return LinkVoltage.rectified(
                installation.supply().pulses(),
                installation.supply().lightLoadLinkVoltage(),
                installation.supply().frequencyHz(),
                installation.link().capacitor().capacitance(),
                power);
    }

    /** What hangs on the bridge's output. */
    public OutputLoad load() {
        return new OutputLoad(
                installation.phaseInductance(), settings.edges().outputCapacitance() + installation.legCapacitance());
    }

    /** Largest peak current of a motor conductor over all points, A; motors in parallel share the drive's. */
    public double peakCurrent() {
        double largest = points.stream()
                .mapToDouble(OperatingPoint::loadCurrentRms)
                .max()
                .orElseThrow();
        return Math.sqrt(2) * largest;
    }

    /** What a drive engineer should know of the installation at these currents, in sentences. */
    public List<String> remarks() {
        return installation
                .fitting()
                .cores()
                .filter(cores -> cores.unsaturated(peakCurrent()) < 1)
                .map(cores -> "ring core " + cores.core().name() + " saturates: the load current's field of "
                        + Figures.significant(cores.field(peakCurrent()), 3) + " A/m exceeds "
                        + Figures.significant(cores.core().saturationField(), 3) + " A/m, "
                        + Figures.fixed(100 * cores.unsaturated(peakCurrent()), 0)
                        + " % of its permeability are left")
                .stream()
                .toList();
    }
}
