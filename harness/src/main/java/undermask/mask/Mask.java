package undermask.mask;

import java.util.List;
import java.util.Objects;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.stream.Collectors;
import undermask.network.MainsNetwork;
import undermask.receiver.Detector;
import undermask.receiver.ReceiverStandard;

/**
 * A limit mask: limit lines per detector with the receiver and the mains network that they are meant for.
 *
 * @param name as profiles name it
 * @param title what it applies to
 * @param source standard, edition and place, and how sure the figures are
 * @param receiver whose bandwidths count
 * @param network mains network that the levels refer to
 * @param segments without gap and overlap per detector, in rising order
 */
public record Mask(
        String name,
        String title,
        String source,
        ReceiverStandard receiver,
        MainsNetwork network,
        List<LimitSegment> segments) {
    /** Builds a mask of at least one segment. */
    public Mask {
        Objects.requireNonNull(name);
        Objects.requireNonNull(title);
        Objects.requireNonNull(source);
        Objects.requireNonNull(receiver);
        Objects.requireNonNull(network);
        segments = List.copyOf(segments);
        if (segments.isEmpty()) {
            throw new IllegalArgumentException("mask " + name + " limits nothing");
        }
    }

    /** The detectors that this mask limits, in the order peak, quasi-peak, average. */
    public List<Detector> detectors() {
        Set<Detector> limited = segments.stream().map(LimitSegment::detector).collect(Collectors.toSet());
        return List.of(Detector.values()).stream().filter(limited::contains).toList();
    }

    /**
     * The limit in dBµV, the lower one where two segments meet; empty where the mask sets none.
     *
     * @param frequency in Hz
     */
    public OptionalDouble limitDbuv(Detector detector, double frequency) {
        return segments.stream()
                .filter(segment -> segment.detector() == detector && segment.covers(frequency))
                .mapToDouble(segment -> segment.limitDbuv(frequency))
                .min();
    }
}
