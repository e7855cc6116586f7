package undermask.input;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import undermask.check.Policy;
import undermask.check.Profile;
import undermask.drive.DriveSettings;
import undermask.drive.OperatingPoint;
import undermask.installation.Installation;
import undermask.mask.Mask;
import undermask.unit.Place;
import undermask.unit.Range;

/** Reads the quantity file of a profile. */
final class ProfileFile {
    private ProfileFile() {}

    /**
     * Reads a profile and everything that it names.
     *
     * @param name of the profile
     * @param shelf where installation, mask and policy are looked up
     * @return empty when anything is wrong, which the problems say
     */
    static Optional<Profile> read(SourceText source, String name, Shelf shelf, Problems problems) {
        Optional<QuantityTable> table = QuantityTable.read(source, "a profile", problems);
        if (table.isEmpty()) {
            return Optional.empty();
        }
        QuantityTable rows = table.get();
        List<OperatingPoint> points = points(rows);
        double largest = points.stream()
                .mapToDouble(OperatingPoint::loadCurrentRms)
                .max()
                .orElse(0);
        Optional<DriveSettings> settings = DriveRows.settings(rows, largest);
        Optional<Installation> installation = rows.word(
                        "installation", "must name a file of the folder " + Shelf.INSTALLATIONS)
                .flatMap(shelf::installation);
        Optional<Mask> mask = rows.word("mask", "must name a published mask or a file of the folder " + Shelf.MASKS)
                .flatMap(shelf::mask);
        Optional<Policy> policy = PolicyFile.read(rows, shelf.policy());
        rows.rejectUnknown();
        shelf.knowProfile(rows.asked());
        if (settings.isEmpty() || points.isEmpty() || installation.isEmpty() || mask.isEmpty() || policy.isEmpty()) {
            return Optional.empty();
        }
        Map<String, Place> places = new HashMap<>(rows.places());
        places.put(Profile.FILE, Place.of(source.file()));
        return rows.record(
                OperatingPoint.OUTPUT.quantity(),
                () -> new Profile(name, settings.get(), points, installation.get(), mask.get(), policy.get(), places));
    }

    /** The operating points: a list has a value for each, a single value holds for all. */
    private static List<OperatingPoint> points(QuantityTable rows) {
        List<Range> ranges = List.of(OperatingPoint.OUTPUT, OperatingPoint.CURRENT, OperatingPoint.POWER_FACTOR);
        List<List<Double>> lists = ranges.stream().map(rows::numbers).toList();
        int count = lists.stream().mapToInt(List::size).max().orElseThrow();
        boolean fitting = true;
        for (int i = 0; i < lists.size(); i++) {
            int size = lists.get(i).size();
            if (size > 1 && size < count) {
                String quantity = ranges.get(i).quantity();
                rows.refuse(
                        rows.written(quantity),
                        quantity + " has " + size + " values where another row has " + count
                                + "; wanted is one value or as many as there are operating points");
            }
            fitting &= size == 1 || size == count;
        }
        if (!fitting || lists.stream().anyMatch(List::isEmpty)) {
            return List.of();
        }
        List<OperatingPoint> points = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            points.add(new OperatingPoint(of(lists.get(0), i), of(lists.get(1), i), of(lists.get(2), i)));
        }
        return points;
    }

    private static double of(List<Double> list, int point) {
        return list.get(list.size() == 1 ? 0 : point);
    }
}
