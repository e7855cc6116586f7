package undermask.gate;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.TestFactory;
import undermask.check.FurtherLimit;
import undermask.input.ProfileFolder;
import undermask.input.Refused;
import undermask.report.CheckRun;
import undermask.report.Finding;
import undermask.report.Outcome;
import undermask.report.ReportFolder;

/**
 * A test for each profile and detector of a folder, for builds that run JUnit. The system properties
 * {@code undermask.profiles} and {@code undermask.reports} name the folders; without them they are {@code .} and
 * {@code reports}.
 */
public final class ProfilesGate {
    /** Public for the test engine. */
    public ProfilesGate() {}

    @TestFactory
    @DisplayName("profile")
    Stream<DynamicTest> profiles() throws IOException {
        Path profiles = Path.of(System.getProperty("undermask.profiles", "."));
        Path reports = Path.of(System.getProperty("undermask.reports", "reports"));
        ProfileFolder folder = new ProfileFolder(profiles);
        List<Outcome> outcomes;
        try {
            outcomes = new CheckRun(
                            folder,
                            new ReportFolder(reports),
                            Runtime.getRuntime().availableProcessors(),
                            true,
                            System.err::println)
                    .of(folder.readAll());
        } catch (Refused e) {
            return Stream.of(DynamicTest.dynamicTest("profiles can be read", () -> {
                throw failure("refused, no profile was checked:\n" + e.getMessage());
            }));
        }
        return outcomes.stream().flatMap(ProfilesGate::tests);
    }

    private static Stream<DynamicTest> tests(Outcome outcome) {
        return Stream.concat(emission(outcome), outcome.furtherLimits().stream().map(limit -> further(outcome, limit)));
    }

    private static DynamicTest further(Outcome outcome, FurtherLimit limit) {
        return DynamicTest.dynamicTest(outcome.profile().name() + ": " + limit.text(), () -> {
            if (!limit.kept()) {
                throw failure(limit.place() + ": " + limit.text());
            }
        });
    }

    private static Stream<DynamicTest> emission(Outcome outcome) {
        return outcome.judgements().stream().map(judgement -> {
            Finding finding = new Finding(outcome, judgement);
            return DynamicTest.dynamicTest(finding.title(), () -> {
                if (!outcome.passes(judgement)) {
                    throw failure(finding.text() + "\n" + String.join("\n", outcome.advice()));
                }
            });
        });
    }

    /** A failure without a stack trace: it is about a file, not about code. */
    private static AssertionError failure(String message) {
        AssertionError failure = new AssertionError(message);
        failure.setStackTrace(new StackTraceElement[0]);
        return failure;
    }
}
