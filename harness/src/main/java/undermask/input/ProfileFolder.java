package undermask.input;

import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import undermask.check.Profile;
import undermask.installation.Catalogue;
import undermask.mask.Mask;
import undermask.unit.Place;

/**
 * A folder of profiles, {@code NAME.csv} each, with what they refer to in {@code installations/}, {@code masks/},
 * {@code parts/} and {@code policy.csv}.
 *
 * <p>A profile in another folder is read with what stands beside it, and with this folder's files for the rest.
 */
public final class ProfileFolder {
    static final String POLICY = "policy.csv";

    private final Path root;

    /**
     * Names the folder; nothing is read yet.
     *
     * @param root as the user names it: messages begin with it
     */
    public ProfileFolder(Path root) {
        this.root = root;
    }

    /**
     * The names of all profiles that stand directly in the folder, sorted.
     *
     * @return at least one
     * @throws Refused when there is none
     */
    public List<String> names() throws Refused {
        Problems problems = new Problems();
        Map<String, Path> files = files(problems);
        if (files.isEmpty()) {
            problems.add(
                    Place.of(root.toString()),
                    Files.isDirectory(root)
                            ? "no profile found; wanted are files NAME.csv in this folder"
                            : "no such folder of profiles");
        }
        problems.refuseAny();
        return List.copyOf(files.keySet());
    }

    /**
     * Reads every profile of the folder.
     *
     * @throws Refused with every problem of every file when there is any, or when there is no profile
     */
    public List<Profile> readAll() throws Refused {
        return read(names());
    }

    /**
     * Reads some profiles.
     *
     * @param profiles names of profiles in this folder, or paths of files that end in {@code .csv}
     * @return the profiles in the order asked for, each once
     * @throws Refused with every problem of every file when there is any, or when no profile is asked for
     */
    public List<Profile> read(List<String> profiles) throws Refused {
        Problems problems = new Problems();
        if (profiles.isEmpty()) {
            problems.add(Place.of(root.toString()), "no profile was asked for");
        }
        Map<String, Path> known = files(problems);
        Map<Path, Path> files = new LinkedHashMap<>();
        for (String profile : profiles) {
            find(profile, known, problems).ifPresent(file -> files.putIfAbsent(absolute(file), file));
        }
        Map<Path, Shelf> shelves = new HashMap<>();
        Map<String, Path> named = new HashMap<>();
        List<Profile> read = new ArrayList<>();
        for (Path file : files.values()) {
            String name = CsvFolder.name(file);
            Path other = named.putIfAbsent(name, file);
            if (name.startsWith(".")) {
                problems.add(Place.of(file.toString()), "the name of a profile may not begin with a point");
            } else if (other != null) {
                problems.add(
                        Place.of(file.toString()),
                        "has the same name as " + other + "; the report of one would replace the other's");
            }
            Shelf shelf =
                    shelves.computeIfAbsent(absolute(folderOf(file)), folder -> new Shelf(foldersFor(file), problems));
            SourceText.read(file, problems)
                    .flatMap(text -> ProfileFile.read(text, name, shelf, problems))
                    .ifPresent(read::add);
        }
        problems.refuseAny();
        return List.copyOf(read);
    }

    /**
     * A profile to be read with other values.
     *
     * @param profile name of a profile in this folder, or path of a file that ends in {@code .csv}
     * @throws Refused when it cannot be read as it is
     */
    public VariedProfile varied(String profile) throws Refused {
        Problems problems = new Problems();
        Optional<Path> file = find(profile, files(problems), problems);
        problems.refuseAny();
        return new VariedProfile(CsvFolder.name(file.orElseThrow()), file.get(), foldersFor(file.get()));
    }

    /**
     * Every mask that a profile of this folder may name, published ones and own ones, sorted by name.
     *
     * @throws Refused when an own one is wrong
     */
    public List<Mask> masks() throws Refused {
        Problems problems = new Problems();
        List<Mask> masks = new Shelf(List.of(root), problems).allMasks();
        problems.refuseAny();
        return masks;
    }

    /**
     * Every part that an installation of this folder may name.
     *
     * @throws Refused when an own one is wrong
     */
    public Catalogue parts() throws Refused {
        Problems problems = new Problems();
        Parts parts = new Shelf(List.of(root), problems).parts();
        problems.refuseAny();
        return new Catalogue(
                parts.filters().all(),
                parts.cables().all(),
                parts.cores().all(),
                parts.materials().all(),
                parts.motors().all());
    }

    private Map<String, Path> files(Problems problems) {
        Map<String, Path> files = CsvFolder.list(root, problems);
        files.values().removeIf(file -> file.getFileName().toString().equals(POLICY));
        return files;
    }

    /** The file of a profile: the one of that name, else the text is taken as a path. */
    private Optional<Path> find(String profile, Map<String, Path> known, Problems problems) {
        if (known.containsKey(profile)) {
            return Optional.of(known.get(profile));
        }
        String name = profile;
        try {
            Path path = Path.of(profile);
            name = CsvFolder.name(path);
            if (Files.exists(path) && (CsvFolder.isCsv(path) || !Files.isRegularFile(path))) {
                return Optional.of(path);
            }
            if (path.getNameCount() == 1 && known.containsKey(name)) {
                return Optional.of(known.get(name));
            }
        } catch (InvalidPathException e) {
            // no file can have that name: the same message as for one that does not exist
        }
        String listed = known.isEmpty()
                ? "there is none in " + root
                : "known in " + root + " are " + String.join(", ", known.keySet());
        problems.add(
                Place.of(profile),
                "no such profile: neither a name nor the path of a file that ends in .csv"
                        + NearestName.hint(name, known.keySet(), listed));
        return Optional.empty();
    }

    /** Where the files that a profile refers to are looked up, in that order. */
    private List<Path> foldersFor(Path file) {
        Path own = folderOf(file);
        return absolute(own).equals(absolute(root)) ? List.of(root) : List.of(own, root);
    }

    private static Path folderOf(Path file) {
        return file.getParent() == null ? Path.of("") : file.getParent();
    }

    private static Path absolute(Path path) {
        return path.toAbsolutePath().normalize();
    }
}
