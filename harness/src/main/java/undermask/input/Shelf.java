package undermask.input;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import undermask.check.Policy;
import undermask.installation.Installation;
import undermask.installation.OwnElement;
import undermask.mask.Mask;
import undermask.unit.Place;

/** What the profiles of one folder may refer to: installations, masks, parts and policy, each file read once. */
final class Shelf {
    static final String INSTALLATIONS = "installations";
    static final String MASKS = "masks";
    static final String ELEMENTS = "elements";

    private final List<Path> folders;
    private final Problems problems;
    private final Map<String, Path> installationFiles;
    private final Map<String, Path> maskFiles;
    /** Empty for a file that is wrong: its problems are told once. */
    private final Map<String, Optional<Installation>> installations = new HashMap<>();

    private final Map<String, Optional<Mask>> masks = new HashMap<>();
    private final Map<String, SetRow> installationRows;
    private final Set<String> profileQuantities = new TreeSet<>();
    private final Set<String> installationQuantities = new TreeSet<>();
    private Parts parts;
    private Optional<Policy> policy;

    /**
     * Looks things up.
     *
     * @param folders in the order in which they are asked
     */
    Shelf(List<Path> folders, Problems problems) {
        this(folders, problems, Map.of());
    }

    /**
     * Looks things up with some rows of installations set.
     *
     * @param installationRows what every installation's rows are set to
     */
    Shelf(List<Path> folders, Problems problems, Map<String, SetRow> installationRows) {
        this.installationRows = installationRows;
        this.folders = List.copyOf(folders);
        this.problems = problems;
        this.installationFiles = list(INSTALLATIONS);
        this.maskFiles = list(MASKS);
        maskFiles.forEach((name, file) -> {
            if (PublishedMasks.names().contains(name)) {
                problems.add(
                        Place.of(file.toString()),
                        name,
                        "the name of a published mask that is built in; give this file another name");
            }
        });
    }

    private Map<String, Path> list(String kind) {
        Map<String, Path> files = new TreeMap<>();
        for (Path folder : folders) {
            CsvFolder.list(folder.resolve(kind), problems).forEach(files::putIfAbsent);
        }
        return files;
    }

    /** The installation that a cell names; empty when it is unknown or wrong, which the problems say. */
    Optional<Installation> installation(Cell name) {
        if (!isFileName(name, INSTALLATIONS)) {
            return Optional.empty();
        }
        Path file = installationFiles.get(name.text());
        if (file == null) {
            String known = installationFiles.isEmpty()
                    ? "there is none in " + places(INSTALLATIONS)
                    : "known are " + String.join(", ", installationFiles.keySet());
            problems.add(
                    name, "no such installation" + NearestName.hint(name.text(), installationFiles.keySet(), known));
            return Optional.empty();
        }
        // not computeIfAbsent: a reading must not happen inside another one's map
        if (!installations.containsKey(name.text())) {
            installations.put(
                    name.text(),
                    SourceText.read(file, problems)
                            .map(text -> installationRows.isEmpty() ? text : text.withRows(installationRows))
                            .flatMap(text -> InstallationFile.read(text, name.text(), this, problems)));
        }
        return installations.get(name.text());
    }

    /** The mask that a cell names, published or of a folder; empty when it is unknown or wrong, which the problems say. */
    Optional<Mask> mask(Cell name) {
        if (!isFileName(name, MASKS)) {
            return Optional.empty();
        }
        Set<String> known = maskNames();
        if (!known.contains(name.text())) {
            problems.add(
                    name,
                    "no such mask" + NearestName.hint(name.text(), known, "the command \"masks\" lists what is known"));
            return Optional.empty();
        }
        return readMask(name.text());
    }

    /** Every mask that is right, sorted by name. */
    List<Mask> allMasks() {
        return maskNames().stream()
                .map(this::readMask)
                .flatMap(Optional::stream)
                .toList();
    }

    private Set<String> maskNames() {
        Set<String> names = new TreeSet<>(PublishedMasks.names());
        names.addAll(maskFiles.keySet());
        return names;
    }

    private Optional<Mask> readMask(String name) {
        if (!masks.containsKey(name)) {
            masks.put(
                    name,
                    PublishedMasks.names().contains(name)
                            ? Optional.of(PublishedMasks.read(name))
                            : readOwnMask(name, maskFiles.get(name)));
        }
        return masks.get(name);
    }

    private Optional<Mask> readOwnMask(String name, Path file) {
        return SourceText.read(file, problems)
                .flatMap(text -> MaskFile.read(text, name, "own mask", file.toString(), problems));
    }

    /** The policy of the first folder that has one; empty when it is wrong. */
    Optional<Policy> policy() {
        if (policy == null) {
            policy = folders.stream()
                    .map(folder -> folder.resolve(ProfileFolder.POLICY))
                    .filter(Files::exists)
                    .findFirst()
                    .map(file -> SourceText.read(file, problems).flatMap(text -> PolicyFile.read(text, problems)))
                    .orElse(Optional.of(PolicyFile.DEFAULT));
        }
        return policy;
    }

    /** The elements of a file that a cell names; empty when it is unknown or wrong, which the problems say. */
    Optional<List<OwnElement>> elements(Cell name) {
        if (!isFileName(name, ELEMENTS)) {
            return Optional.empty();
        }
        Map<String, Path> files = list(ELEMENTS);
        Path file = files.get(name.text());
        if (file == null) {
            problems.add(
                    name,
                    "no such table of elements"
                            + NearestName.hint(
                                    name.text(),
                                    files.keySet(),
                                    files.isEmpty()
                                            ? "there is none in " + places(ELEMENTS)
                                            : "known are " + String.join(", ", files.keySet())));
            return Optional.empty();
        }
        return SourceText.read(file, problems).flatMap(text -> ElementFile.read(text, problems));
    }

    void knowProfile(Set<String> quantities) {
        profileQuantities.addAll(quantities);
    }

    void knowInstallation(Set<String> quantities) {
        installationQuantities.addAll(quantities);
    }

    /** What the profiles read so far may say. */
    Set<String> profileQuantities() {
        return profileQuantities;
    }

    /** What their installations may say. */
    Set<String> installationQuantities() {
        return installationQuantities;
    }

    /** The catalogue. */
    Parts parts() {
        if (parts == null) {
            parts = Parts.read(folders, problems);
        }
        return parts;
    }

    /** Whether a text can only name a file inside the folder. */
    private boolean isFileName(Cell name, String kind) {
        boolean inside = name.text().chars().noneMatch(c -> "/\\:\n\t".indexOf(c) >= 0)
                && !name.text().startsWith(".");
        if (!inside) {
            problems.add(name, "wanted is the name of a file in " + places(kind) + ", without path and ending");
        }
        return inside;
    }

    private String places(String kind) {
        return String.join(
                " or ",
                folders.stream().map(folder -> folder.resolve(kind).toString()).toList());
    }
}
