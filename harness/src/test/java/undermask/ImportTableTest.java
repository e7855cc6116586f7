package undermask;

import static org.assertj.core.api.Assertions.assertThat;

import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.lang.syntax.ArchRuleDefinition;
import com.tngtech.archunit.library.dependencies.SlicesRuleDefinition;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

/** Holds the code to the import table of DEVELOPERS.md, which is read and not repeated. */
class ImportTableTest {
    private static final Pattern ROW = Pattern.compile("\\| `([a-z]+)` \\| [^|]+ \\| ([^|]*) \\|");
    private static final Map<String, Set<String>> TABLE = readTable();
    private static final JavaClasses CODE = new ClassFileImporter()
            .withImportOption(ImportOption.Predefined.DO_NOT_INCLUDE_TESTS)
            .importPackages("undermask");

    @Test
    void everyPackageHasItsRow() {
        Set<String> packages = new TreeSet<>();
        for (JavaClass type : CODE) {
            packages.add(packageOf(type));
        }
        assertThat(packages).isEqualTo(TABLE.keySet());
    }

    @TestFactory
    Stream<DynamicTest> packagesImportWhatTheirRowAllows() {
        return TABLE.entrySet().stream()
                .map(row -> DynamicTest.dynamicTest(row.getKey(), () -> {
                    String[] refused = TABLE.keySet().stream()
                            .filter(other -> !other.equals(row.getKey()))
                            .filter(other -> !row.getValue().contains(other))
                            .map(other -> "undermask." + other)
                            .toArray(String[]::new);
                    if (refused.length > 0) {
                        ArchRuleDefinition.noClasses()
                                .that()
                                .resideInAPackage("undermask." + row.getKey())
                                .should()
                                .dependOnClassesThat()
                                .resideInAnyPackage(refused)
                                .check(CODE);
                    }
                }));
    }

    @Test
    void noCircles() {
        SlicesRuleDefinition.slices()
                .matching("undermask.(*)")
                .should()
                .beFreeOfCycles()
                .check(CODE);
    }

    @Test
    void pureCoreKnowsNoFileClockOrConsole() {
        String[] core = Stream.of(
                        "unit", "signal", "drive", "installation", "pwm", "network", "receiver", "mask", "check")
                .map(name -> "undermask." + name)
                .toArray(String[]::new);
        ArchRuleDefinition.noClasses()
                .that()
                .resideInAnyPackage(core)
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage("java.io", "java.nio.file", "java.time", "java.util.concurrent", "org.knowm..")
                .orShould()
                .accessField(System.class, "out")
                .orShould()
                .accessField(System.class, "err")
                .orShould()
                .callMethod(System.class, "nanoTime")
                .orShould()
                .callMethod(System.class, "currentTimeMillis")
                .orShould()
                .callMethod(Math.class, "random")
                .check(CODE);
    }

    private static String packageOf(JavaClass type) {
        return type.getPackageName().substring("undermask.".length());
    }

    private static Map<String, Set<String>> readTable() {
        Path page = Path.of(System.getProperty("undermask.root"), "DEVELOPERS.md");
        Map<String, Set<String>> table = new TreeMap<>();
        try {
            for (String line : Files.readAllLines(page)) {
                Matcher row = ROW.matcher(line);
                if (row.matches()) {
                    table.put(
                            row.group(1),
                            Arrays.stream(row.group(2).trim().split(" "))
                                    .filter(name -> !name.equals("—"))
                                    .collect(Collectors.toCollection(TreeSet::new)));
                }
            }
        } catch (IOException e) {
            throw new IllegalStateException("cannot read " + page, e);
        }
        assertThat(table).as("import table of " + page).isNotEmpty();
        return table;
    }
}
