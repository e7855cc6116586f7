package undermask.report;

import java.util.List;
import java.util.stream.Collectors;
import undermask.installation.CablePart;
import undermask.installation.Catalogue;
import undermask.installation.CorePart;
import undermask.installation.FilterPart;
import undermask.installation.Material;
import undermask.installation.MotorPart;
import undermask.unit.Dimension;
import undermask.unit.Figures;

/** The catalogue of parts for a console of 80 columns. */
public final class PartList {
    private PartList() {}

    /** A heading per kind, a paragraph per part: name, values, source. */
    public static String of(Catalogue catalogue) {
        StringBuilder text = new StringBuilder();
        text.append("mains filters\n");
        catalogue.filters().values().forEach(part -> part(text, part.name(), words(part), part.source()));
        text.append("\nmotor leads\n");
        catalogue.cables().values().forEach(part -> part(text, part.name(), words(part), part.source()));
        text.append("\nring cores\n");
        catalogue.cores().values().forEach(part -> part(text, part.name(), words(part), part.source()));
        text.append("\nmaterials\n");
        catalogue.materials().values().forEach(part -> part(text, part.name(), words(part), part.source()));
        text.append("\nmotors\n");
        catalogue.motors().values().forEach(part -> part(text, part.name(), words(part), part.source()));
        return text.toString();
    }

    private static void part(StringBuilder text, String name, String words, String source) {
        Paragraph.append(text, name + ": " + words + " (" + source + ")", "  ", "      ");
    }

    private static String words(FilterPart part) {
        List<String> chokes = part.stages().stream()
                .map(stage -> Figures.withUnit(stage.choke(), Dimension.INDUCTANCE, 3))
                .collect(Collectors.toList());
        return part.phases() + "-phase, " + Figures.withUnit(part.ratedCurrent(), Dimension.CURRENT, 3) + ", "
                + part.stages().size() + (part.stages().size() == 1 ? " stage" : " stages") + ", choke "
                + String.join(" and ", chokes) + ", Y "
                + Figures.withUnit(part.yPerLine(), Dimension.CAPACITANCE, 3) + " per line"
                + part.stages()
                        .get(0)
                        .core()
                        .map(core -> ", core " + core.name())
                        .orElse("");
    }

    private static String words(CablePart part) {
        return (part.shielded() ? "shielded, " : "unshielded, ")
                + Figures.withUnit(part.capacitance(), Dimension.CAPACITANCE_PER_LENGTH, 3) + ", "
                + Figures.withUnit(part.inductance(), Dimension.INDUCTANCE_PER_LENGTH, 3);
    }

    private static String words(CorePart part) {
        return part.material().name() + ", " + Figures.withUnit(part.outer(), Dimension.LENGTH, 3) + " over "
                + Figures.withUnit(part.inner(), Dimension.LENGTH, 3) + ", height "
                + Figures.withUnit(part.height(), Dimension.LENGTH, 3)
                + (part.gap() > 0 ? ", clamps on" : "");
    }

    private static String words(Material part) {
        return "permeability " + Figures.significant(part.initial(), 3) + ", saturates at "
                + Figures.significant(part.saturation(), 3) + " T";
    }

    private static String words(MotorPart part) {
        return Figures.withUnit(part.ratedPower(), Dimension.POWER, 3) + ", "
                + Figures.withUnit(part.totalCapacitance(), Dimension.CAPACITANCE, 3) + " to frame, leakage "
                + Figures.withUnit(part.leakageInductance(), Dimension.INDUCTANCE, 3);
    }
}
