package undermask.input;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import undermask.drive.Carrier;
import undermask.drive.CarrierSampling;
import undermask.drive.DriveSettings;
import undermask.drive.EdgeForm;
import undermask.drive.Edges;
import undermask.drive.Modulation;
import undermask.drive.ModulationPlan;
import undermask.drive.Overmodulation;
import undermask.drive.ReducedCarrier;
import undermask.drive.Ringing;
import undermask.drive.ShortPulses;
import undermask.drive.Spread;
import undermask.drive.SpreadForm;
import undermask.drive.Switching;
import undermask.drive.VoltageCurve;
import undermask.unit.Range;

/** Reads what a drive keeps in its parameter memory from the rows of a profile. */
final class DriveRows {
    private static final String SPREAD = "carrier spread";
    private static final String UPPER = " rising";
    private static final String LOWER = " falling";

    // what holds when a profile does not say; common practice
    private static final double SPREAD_RATE = 100;
    /** A forced edge at rated current takes a third longer than at none. */
    private static final double TURN_ON_SLOWING = 0.3;
    /** Two switches with their diodes, some ten amperes. */
    private static final double OUTPUT_CAPACITANCE = 0.3e-9;

    private DriveRows() {}

    /**
     * Reads the settings.
     *
     * @param largestCurrent largest rms load current of the operating points, A
     */
    static Optional<DriveSettings> settings(QuantityTable rows, double largestCurrent) {
        Optional<VoltageCurve> curve = rows.record(
                VoltageCurve.BOOST.quantity(),
                () -> new VoltageCurve(
                        rows.number(VoltageCurve.BASE_VOLTAGE),
                        rows.number(VoltageCurve.BASE_FREQUENCY),
                        rows.number(VoltageCurve.BOOST, 0)));
        Optional<Carrier> carrier = carrier(rows);
        Optional<ModulationPlan> modulation = rows.record(
                ModulationPlan.SWITCH_OVER,
                () -> new ModulationPlan(
                        rows.choice("modulation", Modulation.class),
                        rows.choice("overmodulation", Overmodulation.class, Overmodulation.COMPENSATED),
                        Optional.ofNullable(rows.choice(ModulationPlan.SWITCH_OVER, Modulation.class, null)),
                        rows.optional(ModulationPlan.SWITCH_OVER_HZ),
                        rows.optional(ModulationPlan.SWITCH_OVER_VOLTAGE)));
        Optional<Switching> switching = rows.record(Switching.DEAD_TIME.quantity(), () -> {
            double upper = rows.number(Switching.UPPER_DELAY, 0);
            return new Switching(
                    rows.number(Switching.DEAD_TIME),
                    rows.yes("dead-time compensation", false),
                    rows.number(Switching.MINIMUM_PULSE, 0),
                    rows.choice("short pulses", ShortPulses.class, ShortPulses.DROP),
                    upper,
                    rows.number(Switching.LOWER_DELAY, upper));
        });
        Optional<Edges> edges = edges(rows, largestCurrent);
        return rows.record(
                Switching.DEAD_TIME.quantity(),
                () -> new DriveSettings(
                        rows.built(carrier),
                        rows.built(modulation),
                        rows.built(switching),
                        rows.built(edges),
                        rows.built(curve),
                        rows.optional(DriveSettings.LINK_VOLTAGE)));
    }

    private static Optional<Carrier> carrier(QuantityTable rows) {
        OptionalDouble multiple = rows.optional(Carrier.MULTIPLE);
        Optional<ReducedCarrier> reduced = Optional.empty();
        boolean reducing = rows.gives(ReducedCarrier.FREQUENCY.quantity())
                | rows.gives(ReducedCarrier.ABOVE_CURRENT.quantity())
                | rows.gives(ReducedCarrier.BELOW_HZ.quantity());
        if (reducing) {
            reduced = rows.record(
                    ReducedCarrier.FREQUENCY.quantity(),
                    () -> new ReducedCarrier(
                            rows.number(ReducedCarrier.FREQUENCY),
                            rows.optional(ReducedCarrier.ABOVE_CURRENT),
                            rows.optional(ReducedCarrier.BELOW_HZ)));
        }
        Optional<ReducedCarrier> fallBack = reduced;
        Optional<Spread> spread = spread(rows);
        String telling = rows.gives(Spread.DEVIATION.quantity())
                ? Spread.DEVIATION.quantity()
                : reducing ? ReducedCarrier.FREQUENCY.quantity() : Carrier.MULTIPLE.quantity();
        return rows.record(telling, () -> {
            OptionalDouble fixed = multiple.isPresent()
                    ? rows.optional(Carrier.FREQUENCY)
                    : OptionalDouble.of(rows.number(Carrier.FREQUENCY));
            if (reducing) {
                rows.built(fallBack);
            }
            return new Carrier(
                    fixed,
                    multiple.isPresent() ? whole(multiple.getAsDouble()) : OptionalInt.empty(),
                    fallBack,
                    // most drives sample at both peaks of the carrier
                    rows.choice("carrier sampling", CarrierSampling.class, CarrierSampling.TWICE),
                    rows.built(spread));
        });
    }

    private static OptionalInt whole(double multiple) {
        if (multiple != Math.rint(multiple)) {
            throw new IllegalArgumentException(Carrier.MULTIPLE.quantity() + " must be a whole number");
        }
        return OptionalInt.of((int) multiple);
    }

    private static Optional<Spread> spread(QuantityTable rows) {
        return rows.record(Spread.DEVIATION.quantity(), () -> {
            SpreadForm form = rows.choice(SPREAD, SpreadForm.class, SpreadForm.NONE);
            if (form == SpreadForm.NONE) {
                boolean idle = rows.gives(Spread.DEVIATION.quantity())
                        | rows.gives(Spread.RATE.quantity())
                        | rows.gives(Spread.SEED.quantity());
                if (idle) {
                    throw new IllegalArgumentException("a carrier whose spread is none has nothing to set about it");
                }
                return Spread.NONE;
            }
            return new Spread(form, rows.number(Spread.DEVIATION), rows.number(Spread.RATE, SPREAD_RATE), (long)
                    rows.number(Spread.SEED, 1));
        });
    }

    private static Optional<Edges> edges(QuantityTable rows, double largestCurrent) {
        Optional<Ringing> upper = ringing(rows, UPPER, Optional.empty());
        Optional<Ringing> lower = ringing(rows, LOWER, upper);
        return rows.record(Edges.SLEW_RISING.quantity(), () -> {
            double rising = rows.number(Edges.SLEW_RISING);
            double reference = Math.max(Edges.REFERENCE_CURRENT.low(), Math.sqrt(2) * largestCurrent);
            return new Edges(
                    rising,
                    rows.number(Edges.SLEW_FALLING, rising),
                    rows.choice("edge shape", EdgeForm.class, EdgeForm.EXPONENTIAL),
                    rows.number(Edges.TURN_ON_SLOWING, TURN_ON_SLOWING),
                    rows.number(Edges.REFERENCE_CURRENT, reference),
                    rows.number(Edges.OUTPUT_CAPACITANCE, OUTPUT_CAPACITANCE),
                    upper,
                    lower);
        });
    }

    /** Ringing of an edge, given by three rows; the falling edge's is that of the rising one where it is not given. */
    private static Optional<Ringing> ringing(QuantityTable rows, String edge, Optional<Ringing> otherwise) {
        Range frequency = Ringing.FREQUENCY.named(Ringing.FREQUENCY.quantity() + edge);
        Range damping = Ringing.DAMPING.named(Ringing.DAMPING.quantity() + edge);
        Range overshoot = Ringing.OVERSHOOT.named(Ringing.OVERSHOOT.quantity() + edge);
        boolean given =
                rows.gives(frequency.quantity()) | rows.gives(damping.quantity()) | rows.gives(overshoot.quantity());
        return given
                ? rows.record(
                        frequency.quantity(),
                        () -> new Ringing(rows.number(frequency), rows.number(damping), rows.number(overshoot)))
                : otherwise;
    }
}
