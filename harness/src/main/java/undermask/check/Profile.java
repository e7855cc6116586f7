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
        double link = linkVoltage(settings, installation);
        points.forEach(point -> Bridge.refuseImpossible(settings, point, link));
    }

    /** Where a quantity stands, or the file when it was left to its default. */
    public Place place(String quantity) {
        return places.getOrDefault(quantity, places.get(FILE));
    }

    /** Mean voltage of the DC link in V: as set, else from the supply at light load. */
    public double linkVoltage() {
        return linkVoltage(settings, installation);
    }

    private static double linkVoltage(DriveSettings settings, Installation installation) {
        return settings.linkVoltage().orElseGet(() -> installation.supply().lightLoadLinkVoltage());
    }
}
