package undermask.input;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class CsvTableTest {
    private static final CsvTable.Columns COLUMNS =
            new CsvTable.Columns(List.of("name", "value"), List.of("note", "source"), 2);

    @TempDir
    Path folder;

    private final Problems problems = new Problems();

    /** Cells as {@code line:column text}, a list per row. */
    private List<List<String>> cells(String text) throws IOException {
        Path file = folder.resolve("table.csv");
        Files.writeString(file, text);
        return SourceText.read(file, problems)
                .flatMap(source -> CsvTable.read(source, COLUMNS, problems))
                .map(CsvTable::rows)
                .orElse(List.of())
                .stream()
                .map(row -> row.cells().stream()
                        .map(cell -> cell.place().line() + ":" + cell.place().column() + " " + cell.text())
                        .toList())
                .toList();
    }

    private List<String> told() {
        return problems.sorted().stream()
                .map(problem -> problem.toString().substring(folder.toString().length() + 1))
                .toList();
    }

    @Test
    void knowsThePlaceOfEveryCell() throws IOException {
        assertThat(cells("name,value,note\n\n  a ,\t5,  \"x, \"\"y\"\"\" ,\n# b,6\nlong,7,"))
                .containsExactly(
                        List.of("3:3 a", "3:7 5", "3:11 x, \"y\"", "3:23 "), List.of("5:1 long", "5:6 7", "5:8 "));
        assertThat(told()).isEmpty();
    }

    @Test
    void countsCharactersNotCodeUnits() throws IOException {
        assertThat(cells("\uFEFFname,value\n\uD83D\uDD0Aµ,5")).containsExactly(List.of("2:1 \uD83D\uDD0Aµ", "2:4 5"));
    }

    @Test
    void takesNoBreakSpacesForSpaces() throws IOException {
        assertThat(cells("name,value\na\u00A0,\u00A05\u202F")).containsExactly(List.of("2:1 a", "2:4 5"));
    }

    @Test
    void aCellMayGoOnOverLines() throws IOException {
        assertThat(cells("name;value;note\r\na;5;\"one\r\n\r\ntwo\";\r\nb;6"))
                .containsExactly(List.of("2:1 a", "2:3 5", "2:5 one\n\ntwo", "4:6 "), List.of("5:1 b", "5:3 6"));
        assertThat(told()).isEmpty();
    }

    @Test
    void aForgottenQuoteSwallowsNoOtherRow() throws IOException {
        assertThat(cells("name,value,note\na,5,\"one\nb,6,two\nc,7,\"three\"\nd,8,\"four"))
                .extracting(row -> row.get(0))
                .containsExactly("2:1 a", "3:1 b", "4:1 c", "5:1 d");
        assertThat(told())
                .extracting(problem -> problem.substring(0, problem.indexOf(", ")))
                .containsExactly("table.csv:2:5: \"\"one\"", "table.csv:5:5: \"\"four\"");
    }

    @Test
    void aTextInQuotesMayHoldTheOtherSeparator() throws IOException {
        assertThat(cells("name;value\na, b;5")).containsExactly(List.of("2:1 a, b", "2:6 5"));
        assertThat(cells("name,value\na; b,5")).containsExactly(List.of("2:1 a; b", "2:6 5"));
    }

    @Test
    void optionalColumnsMayFollowInAnyOrder() throws IOException {
        assertThat(cells("name,value,source,note\na,5,b,c")).hasSize(1);
        assertThat(told()).isEmpty();
        assertThat(cells("name,value,note,note\na,5,b,c")).isEmpty();
        assertThat(cells("value,name\n5,a")).isEmpty();
        assertThat(told())
                .containsExactly(
                        "table.csv:1:1: \"name,value,note,note\", the header must be name,value[,note][,source] (all "
                                + "separated by commas, or all by semicolons)",
                        "table.csv:1:1: \"value,name\", the header must be name,value[,note][,source] (all separated "
                                + "by commas, or all by semicolons)");
    }
}
