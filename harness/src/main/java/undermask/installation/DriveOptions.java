package undermask.installation;

import java.util.Objects;
import java.util.Optional;
import undermask.unit.Dimension;
import undermask.unit.Range;

/**
 * What can be fitted to or taken out of a drive.
 *
 * @param linkEarthed whether the link's capacitors to PE are connected; taken out for IT supplies
 * @param lineReactor inductance in each line at the rectifier, H; 0 for none
 * @param linkChoke inductance between rectifier and link, H; 0 for none
 * @param output what is fitted between drive and motor lead
 */
public record DriveOptions(boolean linkEarthed, double lineReactor, double linkChoke, Optional<OutputFilter> output) {
    public static final Range LINE_REACTOR = new Range("line reactor inductance", Dimension.INDUCTANCE, 0, 0.1);
    public static final Range LINK_CHOKE = new Range("link choke inductance", Dimension.INDUCTANCE, 0, 0.1);

    /** As delivered. */
    public static final DriveOptions PLAIN = new DriveOptions(true, 0, 0, Optional.empty());

    /** Builds options. */
    public DriveOptions {
        LINE_REACTOR.check(lineReactor);
        LINK_CHOKE.check(linkChoke);
        Objects.requireNonNull(output);
    }
}
