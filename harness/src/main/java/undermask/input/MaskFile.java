package undermask.input;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import undermask.mask.LimitSegment;
import undermask.mask.Mask;
import undermask.network.MainsNetwork;
import undermask.receiver.Detector;
import undermask.receiver.ReceiverStandard;
import undermask.unit.Dimension;
import undermask.unit.Figures;
import undermask.unit.Place;
import undermask.unit.Range;
import undermask.unit.Worded;

/** Reads the limit table of a mask: one row per stretch of a limit line, frequencies in Hz, limits in dBµV. */
final class MaskFile {
    private static final CsvTable.Columns COLUMNS = new CsvTable.Columns(
            List.of("detector", "from_hz", "to_hz", "from_dbuv", "to_dbuv"), List.of("receiver", "network"), 5);
    private static final Range FROM = named("from_hz", LimitSegment.FREQUENCY);
    private static final Range TO = named("to_hz", LimitSegment.FREQUENCY);
    private static final Range FROM_LEVEL = named("from_dbuv", LimitSegment.LEVEL);
    private static final Range TO_LEVEL = named("to_dbuv", LimitSegment.LEVEL);

    private final Problems problems;
    private final Numbers numbers;
    private boolean right = true;

    private MaskFile(Problems problems) {
        this.problems = problems;
        this.numbers = new Numbers(problems);
    }

    /** A segment with the row that it came from. */
    private record Limit(LimitSegment segment, CsvTable.Row row) {
        int line() {
            return row.first().place().line();
        }
    }

    /**
     * Reads a mask.
     *
     * @param name as profiles name it
     * @param title what it applies to
     * @param origin standard, edition and place
     * @return empty when anything is wrong, which the problems say
     */
    static Optional<Mask> read(SourceText source, String name, String title, String origin, Problems problems) {
        return CsvTable.read(source, COLUMNS, problems)
                .flatMap(table -> new MaskFile(problems).mask(table, name, title, origin));
    }

    private Optional<Mask> mask(CsvTable table, String name, String title, String origin) {
        if (table.rows().isEmpty()) {
            problems.add(Place.of(table.file()), "the mask has a header but no limit below it");
            return Optional.empty();
        }
        List<Limit> limits = table.rows().stream()
                .map(this::limit)
                .flatMap(Optional::stream)
                .sorted(Comparator.comparing((Limit limit) -> limit.segment().detector())
                        .thenComparing(limit -> limit.segment().fromHz())
                        .thenComparing(Limit::line))
                .toList();
        Optional<ReceiverStandard> stated = agreed(table, "receiver", ReceiverStandard.values());
        Optional<MainsNetwork> statedNetwork = agreed(table, "network", MainsNetwork.values());
        boolean complete = right;
        findGapsAndOverlaps(limits, complete);
        if (!complete) {
            return Optional.empty();
        }
        double lowest = limits.stream()
                .mapToDouble(limit -> limit.segment().fromHz())
                .min()
                .orElseThrow();
        ReceiverStandard receiver = stated.orElse(ReceiverStandard.CISPR_16);
        MainsNetwork network = statedNetwork.orElseGet(() -> usualNetwork(receiver, lowest));
        limits.forEach(limit -> findUnreadable(limit, receiver, network));
        return right
                ? Optional.of(new Mask(
                        name,
                        title,
                        origin,
                        receiver,
                        network,
                        limits.stream().map(Limit::segment).toList()))
                : Optional.empty();
    }

    private Optional<Limit> limit(CsvTable.Row row) {
        if (!row.whole()) {
            right = false;
            return Optional.empty();
        }
        Optional<Detector> detector = oneOf(row.cell("detector"), "detector", Detector.values());
        OptionalDouble fromHz = numbers.plain(row.cell("from_hz"), FROM);
        OptionalDouble toHz = numbers.plain(row.cell("to_hz"), TO);
        OptionalDouble from = numbers.plain(row.cell("from_dbuv"), FROM_LEVEL);
        OptionalDouble to = numbers.plain(row.cell("to_dbuv"), TO_LEVEL);
        if (detector.isEmpty() || fromHz.isEmpty() || toHz.isEmpty() || from.isEmpty() || to.isEmpty()) {
            right = false;
            return Optional.empty();
        }
        try {
            return Optional.of(new Limit(
                    new LimitSegment(
                            detector.get(),
                            fromHz.getAsDouble(),
                            toHz.getAsDouble(),
                            from.getAsDouble(),
                            to.getAsDouble()),
                    row));
        } catch (IllegalArgumentException contradiction) {
            refuse(row.cell("to_hz"), contradiction.getMessage());
            return Optional.empty();
        }
    }

    private <T extends Worded> Optional<T> oneOf(Cell cell, String column, T[] all) {
        for (T one : all) {
            if (one.words().equals(cell.text())) {
                return Optional.of(one);
            }
        }
        List<String> words = List.of(all).stream().map(Worded::words).toList();
        refuse(cell, column + " must be " + String.join(" or ", words));
        return Optional.empty();
    }

    /** What the rows say in a column where all must say the same or nothing. */
    private <T extends Worded> Optional<T> agreed(CsvTable table, String column, T[] all) {
        Cell first = null;
        Optional<T> agreed = Optional.empty();
        for (CsvTable.Row row : table.rows()) {
            Cell cell = row.cell(column);
            if (!row.whole() || cell.empty()) {
                continue;
            }
            Optional<T> value = oneOf(cell, column, all);
            if (value.isEmpty()) {
                continue;
            }
            if (first == null) {
                first = cell;
                agreed = value;
            } else if (!value.equals(agreed)) {
                refuse(
                        cell,
                        "a mask has one " + column + " for all rows; line "
                                + first.place().line() + " says " + first.text());
            }
        }
        return agreed;
    }

    /**
     * Compares each limit with those below it of the same detector.
     *
     * @param complete whether every row was read: where one was not, a gap may be that row
     */
    private void findGapsAndOverlaps(List<Limit> limits, boolean complete) {
        Limit highest = null;
        for (Limit limit : limits) {
            LimitSegment segment = limit.segment();
            if (highest == null || highest.segment().detector() != segment.detector()) {
                highest = limit;
                continue;
            }
            double reached = highest.segment().toHz();
            if (segment.fromHz() < reached) {
                findBetween("overlap", limit, highest, segment.fromHz(), Math.min(reached, segment.toHz()));
            } else if (segment.fromHz() > reached && complete) {
                findBetween("gap", limit, highest, reached, segment.fromHz());
            }
            highest = segment.toHz() > reached ? limit : highest;
        }
    }

    private void findBetween(String what, Limit limit, Limit below, double fromHz, double toHz) {
        Cell start = limit.row().cell("from_hz");
        refuse(
                start,
                what + " from " + Figures.withUnit(fromHz, Dimension.FREQUENCY, 9) + " to "
                        + Figures.withUnit(toHz, Dimension.FREQUENCY, 9) + " between the "
                        + limit.segment().detector().words() + " limits of line " + below.line() + " and line "
                        + limit.line() + "; each must start where the one below it ends");
    }

    /** Where no network is stated: the one of the receiver's standard that reaches down to the mask's lowest frequency. */
    private static MainsNetwork usualNetwork(ReceiverStandard receiver, double lowest) {
        if (receiver == ReceiverStandard.MIL_STD_461) {
            return MainsNetwork.MIL_STD_461;
        }
        return lowest < 150e3 ? MainsNetwork.CISPR_9_KHZ : MainsNetwork.CISPR_150_KHZ;
    }

    private void findUnreadable(Limit limit, ReceiverStandard receiver, MainsNetwork network) {
        if (receiver == ReceiverStandard.MIL_STD_461) {
            if (limit.segment().detector() == Detector.QUASI_PEAK) {
                refuse(limit.row().cell("detector"), "receiver " + receiver.words() + " has no such detector");
            }
            refuseOutside(limit, "receiver " + receiver.words(), 10e3, 30e6);
        }
        switch (network) {
            case CISPR_9_KHZ -> refuseOutside(limit, "network " + network.words(), 9e3, 30e6);
            case CISPR_150_KHZ -> refuseOutside(limit, "network " + network.words(), 150e3, 30e6);
            case MIL_STD_461 -> refuseOutside(limit, "network " + network.words(), 10e3, 10e6);
        }
    }

    private void refuseOutside(Limit limit, String what, double low, double high) {
        Range specified = new Range(what, Dimension.FREQUENCY, low, high);
        if (!specified.contains(limit.segment().fromHz())) {
            refuse(limit.row().cell("from_hz"), what + " is specified for " + specified.text());
        }
        if (!specified.contains(limit.segment().toHz())) {
            refuse(limit.row().cell("to_hz"), what + " is specified for " + specified.text());
        }
    }

    private void refuse(Cell cell, String wanted) {
        right = false;
        problems.add(cell, wanted);
    }

    private static Range named(String column, Range range) {
        return new Range(column, range.dimension(), range.low(), range.high());
    }
}
