package undermask.network;

import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVRecord;
import undermask.installation.CablePart;
import undermask.installation.Capacitor;
import undermask.installation.FilterPart;
import undermask.installation.MotorPart;
import undermask.unit.Dimension;

/** The built-in parts, read straight from their tables. */
final class Parts {
    private Parts() {}

    static FilterPart filter(String name) {
        CSVRecord row = row("/undermask/input/parts/filters.csv", name);
        return OneStage.filter(
                name,
                Integer.parseInt(row.get("phases")),
                si(row.get("rated current")),
                new Capacitor(si(row.get("x mains")), si(row.get("x esr")), si(row.get("x esl"))),
                new Capacitor(si(row.get("x drive")), si(row.get("x esr")), si(row.get("x esl"))),
                new Capacitor(si(row.get("y")), si(row.get("y esr")), si(row.get("y esl"))),
                si(row.get("choke")),
                si(row.get("leakage")),
                si(row.get("winding capacitance")),
                si(row.get("loss resistance")));
    }

    static CablePart cable(String name) {
        CSVRecord row = row("/undermask/input/parts/cables.csv", name);
        return new CablePart(
                name,
                si(row.get("capacitance")),
                si(row.get("inductance")),
                si(row.get("resistance")),
                si(row.get("resistance frequency")),
                si(row.get("loss factor")),
                true,
                row.get("source"));
    }

    static MotorPart motor(String name) {
        return motor(row("/undermask/input/parts/motors.csv", name));
    }

    static List<MotorPart> motors() {
        return rows("/undermask/input/parts/motors.csv").stream()
                .map(Parts::motor)
                .toList();
    }

    static List<String> names(String table) {
        return rows("/undermask/input/parts/" + table).stream()
                .map(row -> row.get("name"))
                .toList();
    }

    /** The rows of a table in the class path; lines that begin with # are left out. */
    static List<CSVRecord> rows(String resource) {
        CSVFormat format = CSVFormat.DEFAULT
                .builder()
                .setHeader()
                .setSkipHeaderRecord(true)
                .setCommentMarker('#')
                .get();
        try (InputStream in = Parts.class.getResourceAsStream(resource);
                InputStreamReader reader = new InputStreamReader(in, StandardCharsets.UTF_8)) {
            return format.parse(reader).getRecords();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static MotorPart motor(CSVRecord row) {
        return new MotorPart(
                row.get("name"),
                si(row.get("rated power")),
                si(row.get("terminal capacitance")),
                si(row.get("star capacitance")),
                si(row.get("winding inductance")),
                si(row.get("winding resistance")),
                si(row.get("frame resistance")),
                si(row.get("leakage inductance")),
                row.get("source"));
    }

    private static CSVRecord row(String resource, String name) {
        return rows(resource).stream()
                .filter(row -> row.get("name").equals(name))
                .findFirst()
                .orElseThrow();
    }

    private static double si(String cell) {
        int space = cell.indexOf(' ');
        if (space < 0) {
            return Double.parseDouble(cell);
        }
        String unit = cell.substring(space + 1);
        return Double.parseDouble(cell.substring(0, space))
                * Dimension.of(unit).orElseThrow().factor(unit).orElseThrow();
    }
}
