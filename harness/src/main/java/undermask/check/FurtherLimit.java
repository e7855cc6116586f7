package undermask.check;

import java.util.ArrayList;
import java.util.List;
import undermask.unit.Figures;
import undermask.unit.Place;
import undermask.unit.Range;

/**
 * A limit of the policy that is not about emission.
 *
 * @param quantity what is limited
 * @param value what the profile has, SI
 * @param limit what the policy allows, SI
 * @param range the policy's row
 * @param place the row of the profile to begin at
 */
public record FurtherLimit(String quantity, double value, double limit, Range range, Place place) {
    /** The limits that a profile's policy sets. */
    public static List<FurtherLimit> of(Profile profile) {
        List<FurtherLimit> limits = new ArrayList<>();
        profile.policy()
                .leakageLimit()
                .ifPresent(limit -> limits.add(new FurtherLimit(
                        "leakage current at mains frequency",
                        profile.installation().leakageCurrent(),
                        limit,
                        Policy.LEAKAGE_LIMIT,
                        profile.place("installation"))));
        return limits;
    }

    /** Whether the profile stays within. */
    public boolean kept() {
        return value <= limit;
    }

    /** In a line: {@code leakage current at mains frequency 4.2 mA, limit 3.5 mA}. */
    public String text() {
        return quantity + " " + Figures.withUnit(value, range.dimension(), 3) + ", limit "
                + Figures.withUnit(limit, range.dimension(), 3);
    }
}
