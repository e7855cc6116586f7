package undermask.report;

import java.util.List;
import undermask.mask.LimitSegment;
import undermask.mask.Mask;
import undermask.receiver.Detector;
import undermask.unit.Dimension;
import undermask.unit.Figures;

/** The known masks for a console of 80 columns. */
public final class MaskList {
    private MaskList() {}

    /** A block per mask: name and range, title, source, receiver and network. */
    public static String of(List<Mask> masks) {
        StringBuilder text = new StringBuilder();
        for (Mask mask : masks) {
            text.append(mask.name()).append("  ").append(range(mask)).append('\n');
            paragraph(text, mask.title());
            paragraph(text, mask.source());
            paragraph(
                    text,
                    "receiver " + mask.receiver().words() + ", network "
                            + mask.network().words() + ", limits "
                            + String.join(
                                    " and ",
                                    mask.detectors().stream()
                                            .map(Detector::words)
                                            .toList()));
            text.append('\n');
        }
        return text.toString();
    }

    private static String range(Mask mask) {
        double low =
                mask.segments().stream().mapToDouble(LimitSegment::fromHz).min().orElseThrow();
        double high =
                mask.segments().stream().mapToDouble(LimitSegment::toHz).max().orElseThrow();
        return Figures.withUnit(low, Dimension.FREQUENCY, 4) + " to " + Figures.withUnit(high, Dimension.FREQUENCY, 4);
    }

    private static void paragraph(StringBuilder text, String words) {
        Paragraph.append(text, words, "  ", "  ");
    }
}
