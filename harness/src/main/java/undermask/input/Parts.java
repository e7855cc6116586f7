package undermask.input;

import static undermask.unit.Dimension.CAPACITANCE;
import static undermask.unit.Dimension.CAPACITANCE_PER_LENGTH;
import static undermask.unit.Dimension.CURRENT;
import static undermask.unit.Dimension.FREQUENCY;
import static undermask.unit.Dimension.INDUCTANCE;
import static undermask.unit.Dimension.INDUCTANCE_PER_LENGTH;
import static undermask.unit.Dimension.LENGTH;
import static undermask.unit.Dimension.NUMBER;
import static undermask.unit.Dimension.POWER;
import static undermask.unit.Dimension.RESISTANCE;
import static undermask.unit.Dimension.RESISTANCE_PER_LENGTH;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import undermask.installation.CablePart;
import undermask.installation.Capacitor;
import undermask.installation.CorePart;
import undermask.installation.FilterPart;
import undermask.installation.FilterStage;
import undermask.installation.Material;
import undermask.installation.MotorPart;

/** The parts that installations may name. */
final class Parts {
    private static final CsvTable.Columns MATERIAL = columns("name,frequencies,mu real,mu loss,saturation,source", "");
    private static final CsvTable.Columns CORE = columns("name,material,outer,inner,height,gap,source", "");
    private static final CsvTable.Columns FILTER = columns(
            "name,phases,rated current,x mains,x drive,x esr,x esl,y,y esr,y esl,choke,leakage,winding capacitance,"
                    + "loss resistance,source",
            "core material,discharge resistance");
    private static final CsvTable.Columns CABLE =
            columns("name,capacitance,inductance,resistance,resistance frequency,loss factor,source", "shield");
    private static final CsvTable.Columns MOTOR = columns(
            "name,rated power,terminal capacitance,star capacitance,winding inductance,winding resistance,"
                    + "frame resistance,leakage inductance,source",
            "");

    private final PartTable<Material> materials;
    private final PartTable<CorePart> cores;
    private final PartTable<FilterPart> filters;
    private final PartTable<CablePart> cables;
    private final PartTable<MotorPart> motors;

    private Parts(Problems problems) {
        materials = new PartTable<>("material", problems);
        cores = new PartTable<>("ring core", problems);
        filters = new PartTable<>("mains filter", problems);
        cables = new PartTable<>("motor lead", problems);
        motors = new PartTable<>("motor", problems);
    }

    /**
     * Reads the built-in tables and those of some folders.
     *
     * @param folders with a folder {@code parts} or without; the first one wins where a part has the same name in several
     * @throws IllegalStateException when a built-in table is not right
     */
    static Parts read(List<Path> folders, Problems problems) {
        Parts parts = new Parts(problems);
        Problems faults = new Problems();
        parts.addAll(name -> SourceText.builtIn("/undermask/input/parts/" + name, faults));
        if (!faults.none()) {
            throw new IllegalStateException("built-in parts are not right: " + faults.sorted());
        }
        for (int i = folders.size() - 1; i >= 0; i--) {
            Path folder = folders.get(i).resolve("parts");
            parts.addAll(name -> Files.exists(folder.resolve(name))
                    ? SourceText.read(folder.resolve(name), problems)
                    : Optional.empty());
        }
        return parts;
    }

    private static CsvTable.Columns columns(String needed, String optional) {
        List<String> columns = List.of(needed.split(","));
        return new CsvTable.Columns(
                columns, optional.isEmpty() ? List.of() : List.of(optional.split(",")), columns.size());
    }

    private interface Source {
        Optional<SourceText> of(String file);
    }

    private void addAll(Source source) {
        // materials first: cores and chokes are made of them
        source.of("materials.csv").ifPresent(text -> materials.add(text, MATERIAL, Parts::material));
        source.of("cores.csv").ifPresent(text -> cores.add(text, CORE, this::core));
        source.of("filters.csv").ifPresent(text -> filters.add(text, FILTER, this::filter));
        source.of("cables.csv").ifPresent(text -> cables.add(text, CABLE, Parts::cable));
        source.of("motors.csv").ifPresent(text -> motors.add(text, MOTOR, Parts::motor));
    }

    PartTable<Material> materials() {
        return materials;
    }

    PartTable<CorePart> cores() {
        return cores;
    }

    PartTable<FilterPart> filters() {
        return filters;
    }

    PartTable<CablePart> cables() {
        return cables;
    }

    PartTable<MotorPart> motors() {
        return motors;
    }

    private static Material material(PartRow row) {
        return new Material(
                row.text("name"),
                row.numbers("frequencies", FREQUENCY, 1, 1e9),
                row.numbers("mu real", NUMBER, 1, 1e6),
                row.numbers("mu loss", NUMBER, 0, 1e6),
                row.number("saturation", NUMBER, 0.01, 3),
                row.text("source"));
    }

    private CorePart core(PartRow row) {
        return new CorePart(
                row.text("name"),
                row.part("material", materials).orElse(null),
                row.number("outer", LENGTH, 1e-3, 1),
                row.number("inner", LENGTH, 1e-3, 1),
                row.number("height", LENGTH, 1e-3, 1),
                row.number("gap", LENGTH, 0, 0.01),
                row.text("source"));
    }

    private FilterPart filter(PartRow row) {
        double esr = row.number("x esr", RESISTANCE, 0, 10);
        double esl = row.number("x esl", INDUCTANCE, 0, 1e-6);
        double yEsr = row.number("y esr", RESISTANCE, 0, 10);
        double yEsl = row.number("y esl", INDUCTANCE, 0, 1e-6);
        List<Double> chokes = row.numbers("choke", INDUCTANCE, 1e-6, 1);
        List<Double> leakages = row.numbers("leakage", INDUCTANCE, 1e-9, 0.1);
        List<Double> windings = row.numbers("winding capacitance", CAPACITANCE, 0.1e-12, 100e-9);
        List<Double> losses = row.numbers("loss resistance", RESISTANCE, 1, 10e6);
        List<Double> x = row.numbers("x drive", CAPACITANCE, 0, 100e-6);
        List<Double> y = row.numbers("y", CAPACITANCE, 0, 10e-6);
        Optional<Material> core = row.gives("core material") ? row.part("core material", materials) : Optional.empty();
        double discharge = row.gives("discharge resistance")
                ? row.number("discharge resistance", RESISTANCE, 1e3, 100e6)
                : Double.POSITIVE_INFINITY;
        List<FilterStage> stages = new ArrayList<>();
        for (int i = 0; i < chokes.size(); i++) {
            stages.add(new FilterStage(
                    chokes.get(i),
                    ofStage(leakages, i, chokes.size(), "leakage"),
                    ofStage(windings, i, chokes.size(), "winding capacitance"),
                    ofStage(losses, i, chokes.size(), "loss resistance"),
                    core,
                    new Capacitor(ofStage(x, i, chokes.size(), "x drive"), esr, esl),
                    new Capacitor(ofStage(y, i, chokes.size(), "y"), yEsr, yEsl)));
        }
        return new FilterPart(
                row.text("name"),
                row.count("phases", 1, 3),
                row.number("rated current", CURRENT, 0.1, 5000),
                new Capacitor(row.number("x mains", CAPACITANCE, 0, 100e-6), esr, esl),
                stages,
                discharge,
                row.text("source"));
    }

    /** The value of a stage: its own, or the one that holds for all. */
    private static double ofStage(List<Double> values, int stage, int stages, String column) {
        if (values.size() != 1 && values.size() != stages) {
            throw new IllegalArgumentException(
                    column + " has " + values.size() + " values for " + stages + " stages of choke");
        }
        return values.get(values.size() == 1 ? 0 : stage);
    }

    private static CablePart cable(PartRow row) {
        return new CablePart(
                row.text("name"),
                row.number("capacitance", CAPACITANCE_PER_LENGTH, 10e-12, 10e-9),
                row.number("inductance", INDUCTANCE_PER_LENGTH, 10e-9, 5e-6),
                row.number("resistance", RESISTANCE_PER_LENGTH, 0.1e-3, 100),
                row.number("resistance frequency", FREQUENCY, 1e3, 100e6),
                row.number("loss factor", NUMBER, 1e-5, 1),
                row.yes("shield", true),
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
