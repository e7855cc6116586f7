package undermask.installation;

import java.util.List;
import java.util.Objects;

/**
 * A mains filter of the catalogue: an X capacitor at the mains, then any number of stages.
 *
 * @param name as installations name it
 * @param phases 1 or 3
 * @param ratedCurrent in A
 * @param xMains X capacitor on the mains side, between each pair of lines
 * @param stages from mains to drive, at least one
 * @param dischargeResistance between each pair of lines at the mains, ohm; infinite for none
 * @param source where the values come from
 */
public record FilterPart(
        String name,
        int phases,
        double ratedCurrent,
        Capacitor xMains,
        List<FilterStage> stages,
        double dischargeResistance,
        String source) {
    /** Builds a part of at least one stage. */
    public FilterPart {
        Objects.requireNonNull(name);
        Objects.requireNonNull(source);
        Objects.requireNonNull(xMains);
        stages = List.copyOf(stages);
        if (phases != 1 && phases != 3) {
            throw new IllegalArgumentException("a filter has 1 or 3 phases, not " + phases);
        }
        if (!(ratedCurrent > 0) || Double.isInfinite(ratedCurrent)) {
            throw new IllegalArgumentException("rated current of a filter is " + ratedCurrent);
        }
        if (stages.isEmpty()) {
            throw new IllegalArgumentException("a filter needs a stage");
        }
        if (!(dischargeResistance > 0)) {
            throw new IllegalArgumentException("discharge resistance of a filter is " + dischargeResistance);
        }
    }

    /** Y capacitance from each line to the case, all stages together, F. */
    public double yPerLine() {
        return stages.stream().mapToDouble(stage -> stage.y().capacitance()).sum();
    }
}
