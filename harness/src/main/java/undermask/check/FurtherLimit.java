package undermask.check;

import java.util.ArrayList;
import java.util.List;
import java.util.function.ToDoubleFunction;
import undermask.cost.MotorHeat;
import undermask.cost.MotorTerminals;
import undermask.drive.Edges;
import undermask.drive.OperatingPoint;
import undermask.pwm.Bridge;
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
    /** The limits that a profile's policy sets, each held against the worst of its points. */
    static List<FurtherLimit> of(Profile profile, List<PointResult> points) {
        List<FurtherLimit> limits = new ArrayList<>();
        Place installation = profile.place("installation");
        profile.policy()
                .leakageLimit()
                .ifPresent(limit -> limits.add(new FurtherLimit(
                        "leakage current at mains frequency",
                        profile.installation().leakageCurrent(),
                        limit,
                        Policy.LEAKAGE_LIMIT,
                        installation)));
        profile.policy()
                .windingLimit()
                .ifPresent(limit -> limits.add(new FurtherLimit(
                        "winding temperature",
                        worst(
                                points,
                                bridge -> MotorHeat.of(profile.installation(), bridge)
                                        .windingCelsius()),
                        limit,
                        Policy.WINDING_LIMIT,
                        profile.place(OperatingPoint.CURRENT.quantity()))));
        profile.policy()
                .motorPeakLimit()
                .ifPresent(limit -> limits.add(new FurtherLimit(
                        "peak voltage at the motor",
                        worst(
                                points,
                                bridge -> MotorTerminals.of(profile.installation(), bridge)
                                        .peak()),
                        limit,
                        Policy.MOTOR_PEAK_LIMIT,
                        profile.place(Edges.SLEW_RISING.quantity()))));
        return limits;
    }

    private static double worst(List<PointResult> points, ToDoubleFunction<Bridge> value) {
        return points.stream()
                .mapToDouble(point -> value.applyAsDouble(point.bridge()))
                .max()
                .orElseThrow();
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
