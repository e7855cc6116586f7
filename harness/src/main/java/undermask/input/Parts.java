package undermask.input;

import static undermask.unit.Dimension.CAPACITANCE;
import static undermask.unit.Dimension.CAPACITANCE_PER_LENGTH;
import static undermask.unit.Dimension.CURRENT;
import static undermask.unit.Dimension.FREQUENCY;
import static undermask.unit.Dimension.INDUCTANCE;
import static undermask.unit.Dimension.INDUCTANCE_PER_LENGTH;
import static undermask.unit.Dimension.NUMBER;
import static undermask.unit.Dimension.POWER;
import static undermask.unit.Dimension.RESISTANCE;
import static undermask.unit.Dimension.RESISTANCE_PER_LENGTH;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import undermask.installation.CablePart;
import undermask.installation.Capacitor;
import undermask.installation.FilterPart;
import undermask.installation.MotorPart;

/**
 * The parts that installations may name.
 *
 * @param filters mains filters
 * @param cables motor leads
 * @param motors motors
 */
record Parts(PartTable<FilterPart> filters, PartTable<CablePart> cables, PartTable<MotorPart> motors) {
    private static final List<String> FILTER = columns("name,phases,rated current,x mains,x drive,x esr,x esl,y,y esr,"
            + "y esl,choke,leakage,winding capacitance,loss resistance,source");
    private static final List<String> CABLE =
            columns("name,capacitance,inductance,resistance,resistance frequency,loss factor,source");
    private static final List<String> MOTOR = columns("name,rated power,terminal capacitance,star capacitance,"
            + "winding inductance,winding resistance,frame resistance,leakage inductance,source");

    /**
     * Reads the built-in tables and those of some folders.
     *
     * @param folders with a folder {@code parts} or without; the first one wins where a part has the same name in several
     * @throws IllegalStateException when a built-in table is not right
     */
    static Parts read(List<Path> folders, Problems problems) {
        Parts parts = new Parts(
                new PartTable<>("mains filter", problems),
                new PartTable<>("motor lead", problems),
                new PartTable<>("motor", problems));
        parts.addBuiltIn();
        for (int i = folders.size() - 1; i >= 0; i--) {
            Path folder = folders.get(i).resolve("parts");
            parts.add(folder.resolve("filters.csv"), parts.filters, FILTER, Parts::filter, problems);
            parts.add(folder.resolve("cables.csv"), parts.cables, CABLE, Parts::cable, problems);
            parts.add(folder.resolve("motors.csv"), parts.motors, MOTOR, Parts::motor, problems);
        }
        return parts;
    }

    private static List<String> columns(String header) {
        return List.of(header.split(","));
    }

    private void addBuiltIn() {
        Problems faults = new Problems();
        String folder = "/undermask/input/parts/";
        SourceText.builtIn(folder + "filters.csv", faults).ifPresent(text -> filters.add(text, FILTER, Parts::filter));
        SourceText.builtIn(folder + "cables.csv", faults).ifPresent(text -> cables.add(text, CABLE, Parts::cable));
        SourceText.builtIn(folder + "motors.csv", faults).ifPresent(text -> motors.add(text, MOTOR, Parts::motor));
        if (!faults.none()) {
            throw new IllegalStateException("built-in parts are not right: " + faults.sorted());
        }
    }

    private static <T> void add(
            Path file, PartTable<T> table, List<String> columns, PartTable.Maker<T> maker, Problems problems) {
        if (Files.exists(file)) {
            SourceText.read(file, problems).ifPresent(text -> table.add(text, columns, maker));
        }
    }

    private static FilterPart filter(PartRow row) {
        double esr = row.number("x esr", RESISTANCE, 0, 10);
        double esl = row.number("x esl", INDUCTANCE, 0, 1e-6);
        Capacitor y = new Capacitor(
                row.number("y", CAPACITANCE, 0, 10e-6),
                row.number("y esr", RESISTANCE, 0, 10),
                row.number("y esl", INDUCTANCE, 0, 1e-6));
        return new FilterPart(
                row.text("name"),
                row.count("phases", 1, 3),
                row.number("rated current", CURRENT, 0.1, 5000),
                new Capacitor(row.number("x mains", CAPACITANCE, 0, 100e-6), esr, esl),
                new Capacitor(row.number("x drive", CAPACITANCE, 0, 100e-6), esr, esl),
                y,
                row.number("choke", INDUCTANCE, 1e-6, 1),
                row.number("leakage", INDUCTANCE, 1e-9, 0.1),
                row.number("winding capacitance", CAPACITANCE, 0.1e-12, 100e-9),
                row.number("loss resistance", RESISTANCE, 1, 10e6),
                row.text("source"));
    }

    private static CablePart cable(PartRow row) {
        return new CablePart(
                row.text("name"),
                row.number("capacitance", CAPACITANCE_PER_LENGTH, 10e-12, 10e-9),
                row.number("inductance", INDUCTANCE_PER_LENGTH, 10e-9, 5e-6),
                row.number("resistance", RESISTANCE_PER_LENGTH, 0.1e-3, 100),
                row.number("resistance frequency", FREQUENCY, 1e3, 100e6),
                row.number("loss factor", NUMBER, 1e-5, 1),
                row.text("source"));
    }

    private static MotorPart motor(PartRow row) {
        return new MotorPart(
                row.text("name"),
                row.number("rated power", POWER, 1, 10e6),
                row.number("terminal capacitance", CAPACITANCE, 1e-12, 1e-6),
                row.number("star capacitance", CAPACITANCE, 1e-12, 1e-6),
                row.number("winding inductance", INDUCTANCE, 1e-6, 1),
                row.number("winding resistance", RESISTANCE, 1, 10e6),
                row.number("frame resistance", RESISTANCE, 0.01, 10e3),
                row.number("leakage inductance", INDUCTANCE, 1e-6, 10),
                row.text("source"));
    }
}
