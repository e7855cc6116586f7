package undermask.input;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import undermask.installation.ElementKind;
import undermask.installation.OwnElement;
import undermask.unit.Dimension;
import undermask.unit.Range;

/** Reads a table of elements that an installation adds to its circuit: {@code from,to,kind,value,unit}. */
final class ElementFile {
    private static final CsvTable.Columns COLUMNS =
            new CsvTable.Columns(List.of("from", "to", "kind", "value", "unit"), List.of("note"), 5);

    private ElementFile() {}

    /** Reads it; empty when anything is wrong, which the problems say. */
    static Optional<List<OwnElement>> read(SourceText source, Problems problems) {
        Optional<CsvTable> table = CsvTable.read(source, COLUMNS, problems);
        if (table.isEmpty()) {
            return Optional.empty();
        }
        List<OwnElement> elements = new ArrayList<>();
        boolean right = true;
        for (CsvTable.Row row : table.get().rows()) {
            Optional<OwnElement> element = row.whole() ? element(row, problems) : Optional.empty();
            element.ifPresent(elements::add);
            right &= element.isPresent();
        }
        return right ? Optional.of(elements) : Optional.empty();
    }

    private static Optional<OwnElement> element(CsvTable.Row row, Problems problems) {
        Cell kind = row.cell("kind");
        Optional<Range> range = range(kind.text());
        if (range.isEmpty()) {
            problems.add(kind, "kind must be resistor, inductor or capacitor");
            return Optional.empty();
        }
        OptionalDouble value = new Numbers(problems).number(row.cell("value"), row.cell("unit"), range.get());
        if (value.isEmpty()) {
            return Optional.empty();
        }
        try {
            return Optional.of(new OwnElement(
                    row.cell("from").text(),
                    row.cell("to").text(),
                    ElementKind.valueOf(kind.text().toUpperCase(java.util.Locale.ROOT)),
                    value.getAsDouble()));
        } catch (IllegalArgumentException contradiction) {
            problems.add(row.first(), contradiction.getMessage());
            return Optional.empty();
        }
    }

    private static Optional<Range> range(String kind) {
        return switch (kind) {
            case "resistor" -> Optional.of(new Range("resistor", Dimension.RESISTANCE, 1e-6, 1e12));
            case "inductor" -> Optional.of(new Range("inductor", Dimension.INDUCTANCE, 1e-12, 1e3));
            case "capacitor" -> Optional.of(new Range("capacitor", Dimension.CAPACITANCE, 1e-15, 1));
            default -> Optional.empty();
        };
    }
}
