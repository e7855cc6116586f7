package undermask.input;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.TreeSet;
import undermask.check.Profile;
import undermask.unit.Place;

/** A profile that is read anew with some of its rows, or of its installation's, set to other values. */
public final class VariedProfile {
    private final String name;
    private final Path file;
    private final List<Path> folders;
    private final TreeSet<String> profileQuantities;
    private final TreeSet<String> installationQuantities;

    VariedProfile(String name, Path file, List<Path> folders) throws Refused {
        this.name = name;
        this.file = file;
        this.folders = folders;
        Problems problems = new Problems();
        Shelf shelf = new Shelf(folders, problems);
        SourceText.read(file, problems).ifPresent(text -> ProfileFile.read(text, name, shelf, problems));
        problems.refuseAny();
        profileQuantities = new TreeSet<>(shelf.profileQuantities());
        installationQuantities = new TreeSet<>(shelf.installationQuantities());
    }

    /** Name of the profile as it is saved. */
    public String name() {
        return name;
    }

    /**
     * The full name of a quantity of the profile or its installation.
     *
     * @throws Refused when neither has it
     */
    public String quantity(String written) throws Refused {
        if (profileQuantities.contains(written) || installationQuantities.contains(written)) {
            return written;
        }
        Problems problems = new Problems();
        TreeSet<String> known = new TreeSet<>(profileQuantities);
        known.addAll(installationQuantities);
        problems.add(
                Place.of(file.toString()),
                written,
                "not a quantity of this profile or its installation"
                        + NearestName.hint(written, known, "the README lists them"));
        throw new Refused(problems.sorted());
    }

    /**
     * Reads it with rows set.
     *
     * @throws Refused with every problem, the values set among them
     */
    public Profile with(Map<String, SetRow> rows) throws Refused {
        Map<String, SetRow> ofProfile = new TreeMap<>(rows);
        ofProfile.keySet().retainAll(profileQuantities);
        Map<String, SetRow> ofInstallation = new TreeMap<>(rows);
        ofInstallation.keySet().removeAll(ofProfile.keySet());
        Problems problems = new Problems();
        Shelf shelf = new Shelf(folders, problems, ofInstallation);
        Optional<Profile> profile = SourceText.read(file, problems)
                .map(text -> text.withRows(ofProfile))
                .flatMap(text -> ProfileFile.read(text, name, shelf, problems));
        problems.refuseAny();
        return profile.orElseThrow();
    }

    /** Whether a row belongs to the profile and not to its installation. */
    public boolean ofProfile(String quantity) {
        return profileQuantities.contains(quantity);
    }

    /** The text of the profile with rows set, those of the installation left out. */
    public String text(Map<String, SetRow> rows) throws Refused {
        Map<String, SetRow> ofProfile = new TreeMap<>(rows);
        ofProfile.keySet().retainAll(profileQuantities);
        Problems problems = new Problems();
        Optional<SourceText> text = SourceText.read(file, problems).map(read -> read.withRows(ofProfile));
        problems.refuseAny();
        return text.orElseThrow().text().stripTrailing() + "\n";
    }
}
