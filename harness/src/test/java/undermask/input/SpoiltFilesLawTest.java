package undermask.input;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import undermask.check.Profile;

/** Whatever is typed into a file, reading ends with profiles or with a refusal that names places inside the folder. */
class SpoiltFilesLawTest {
    private static final String KEYS = "\"\",,;;#\n\r\t 0123456789.-+eEµ\0\uFEFF\uFFFDnkHzm/x";
    private static final int SPOILT = 100;

    @TempDir
    Path folder;

    @BeforeEach
    void copyGoodFolder() {
        GoodFolder.copyTo(folder);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "dock-conveyor.csv",
                "installations/dock.csv",
                "masks/dock-own.csv",
                "parts/cables.csv",
                "policy.csv"
            })
    void readingEndsWithProfilesOrARefusal(String name) throws IOException {
        Path file = folder.resolve(name);
        String sound = Files.readString(file);
        SplittableRandom random = new SplittableRandom(name.hashCode());
        int refusals = 0;
        for (int i = 0; i < SPOILT; i++) {
            Files.writeString(file, spoil(sound, random));
            try {
                List<Profile> read = new ProfileFolder(folder).read(List.of("dock-conveyor", "brine-pump"));
                assertThat(read).hasSize(2);
            } catch (Refused refused) {
                refusals++;
                assertThat(refused.problems())
                        .isNotEmpty()
                        .isSorted()
                        .allSatisfy(
                                problem -> assertThat(problem.place().file()).startsWith(folder.toString()));
            }
        }
        assertThat(refusals).isBetween(SPOILT / 4, SPOILT);
    }

    /** Replaces, inserts, deletes or repeats a few characters. */
    private static String spoil(String sound, SplittableRandom random) {
        StringBuilder text = new StringBuilder(sound);
        int slips = random.nextInt(1, 4);
        for (int i = 0; i < slips; i++) {
            int at = random.nextInt(text.length());
            char key = KEYS.charAt(random.nextInt(KEYS.length()));
            switch (random.nextInt(4)) {
                case 0 -> text.setCharAt(at, key);
                case 1 -> text.insert(at, key);
                case 2 -> text.deleteCharAt(at);
                default -> text.insert(at, text.substring(at, Math.min(text.length(), at + random.nextInt(1, 60))));
            }
        }
        return text.toString();
    }
}
