package undermask.installation;

import java.util.Map;

/** The parts that installations of a folder may name, built-in ones and own ones, each kind sorted by name. */
public record Catalogue(
        Map<String, FilterPart> filters,
        Map<String, CablePart> cables,
        Map<String, CorePart> cores,
        Map<String, Material> materials,
        Map<String, MotorPart> motors) {}
