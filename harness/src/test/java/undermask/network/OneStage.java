package undermask.network;

import java.util.List;
import java.util.Optional;
import undermask.installation.Capacitor;
import undermask.installation.FilterPart;
import undermask.installation.FilterStage;

/** Filters of one stage for tests. */
public final class OneStage {
    private OneStage() {}

    /** A filter whose choke has a constant inductance. */
    public static FilterPart filter(
            String name,
            int phases,
            double ratedCurrent,
            Capacitor xMains,
            Capacitor xDrive,
            Capacitor y,
            double choke,
            double leakage,
            double windingCapacitance,
            double lossResistance) {
        return new FilterPart(
                name,
                phases,
                ratedCurrent,
                xMains,
                List.of(new FilterStage(
                        choke, leakage, windingCapacitance, lossResistance, Optional.empty(), xDrive, y)),
                Double.POSITIVE_INFINITY,
                "test");
    }
}
