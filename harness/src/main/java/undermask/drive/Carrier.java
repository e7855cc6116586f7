package undermask.drive;

import java.util.Objects;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import undermask.unit.Dimension;
import undermask.unit.Figures;
import undermask.unit.Range;

/**
 * The triangle that the references are compared with.
 *
 * @param frequency fixed frequency in Hz; empty when the carrier follows the output
 * @param multiple carrier periods per output period of a synchronous carrier; empty when the carrier is fixed
 * @param reduced the lower carrier that the drive falls back to, if it does
 */
public record Carrier(
        OptionalDouble frequency,
        OptionalInt multiple,
        Optional<ReducedCarrier> reduced,
        CarrierSampling sampling,
        Spread spread) {
    public static final Range FREQUENCY = new Range("carrier frequency", Dimension.FREQUENCY, 500, 40e3);
    public static final Range MULTIPLE = new Range("carrier multiple", Dimension.NUMBER, 3, 2000);

    /** Builds a carrier, fixed or synchronous. */
    public Carrier {
        Objects.requireNonNull(reduced);
        Objects.requireNonNull(sampling);
        Objects.requireNonNull(spread);
        if (frequency.isPresent() == multiple.isPresent()) {
            throw new IllegalArgumentException(
                    "either " + FREQUENCY.quantity() + " or " + MULTIPLE.quantity() + " must be given, not both");
        }
        frequency.ifPresent(FREQUENCY::check);
        multiple.ifPresent(MULTIPLE::check);
        if (multiple.isPresent() && (reduced.isPresent() || !spread.none())) {
            throw new IllegalArgumentException(
                    "a carrier that is a multiple of the output is neither reduced nor spread");
        }
        reduced.ifPresent(lower -> refuse(
                lower.hz() >= frequency.getAsDouble(),
                ReducedCarrier.FREQUENCY.quantity() + " must lie below the carrier frequency"));
        double lowest = reduced.map(ReducedCarrier::hz).orElse(frequency.orElse(Double.POSITIVE_INFINITY));
        refuse(
                spread.deviationHz() >= lowest,
                Spread.DEVIATION.quantity() + " " + Figures.withUnit(spread.deviationHz(), Dimension.FREQUENCY, 4)
                        + " must lie below the carrier frequency");
    }

    private static void refuse(boolean wrong, String reason) {
        if (wrong) {
            throw new IllegalArgumentException(reason);
        }
    }

    /** A fixed carrier that is neither reduced nor spread. */
    public static Carrier fixed(double hz, CarrierSampling sampling) {
        return new Carrier(OptionalDouble.of(hz), OptionalInt.empty(), Optional.empty(), sampling, Spread.NONE);
    }

    /** The set frequency at a point in Hz, before any spread. */
    public double hzAt(OperatingPoint point) {
        if (multiple.isPresent()) {
            return multiple.getAsInt() * point.outputHz();
        }
        return reduced.filter(lower -> lower.appliesTo(point))
                .map(ReducedCarrier::hz)
                .orElse(frequency.getAsDouble());
    }

    /** Whether carrier and output keep step. */
    public boolean synchronous() {
        return multiple.isPresent();
    }
}
