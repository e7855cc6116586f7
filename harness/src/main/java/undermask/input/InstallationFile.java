package undermask.input;

import java.util.Optional;
import undermask.installation.CablePart;
import undermask.installation.Capacitor;
import undermask.installation.FilterPart;
import undermask.installation.Installation;
import undermask.installation.Link;
import undermask.installation.MainsLead;
import undermask.installation.MotorPart;
import undermask.installation.Supply;

/** Reads the quantity file of an installation. */
final class InstallationFile {
    private static final String NO_FILTER = "none";

    // what holds when a file does not say; common practice where nothing else is said
    private static final double SUPPLY_HZ = 50;
    /** A round conductor beside others, H/m. */
    private static final double LINE_INDUCTANCE = 0.7e-6;
    /** The PE conductor returns over a wider loop, H/m. */
    private static final double EARTH_INDUCTANCE = 0.8e-6;

    private static final double FILTER_EARTH_LEAD = 0.1;
    /** An electrolytic bank: 20 to 200 mohm. */
    private static final double LINK_ESR = 0.1;
    /** An electrolytic bank: 15 to 60 nH. */
    private static final double LINK_ESL = 40e-9;

    private static final double NO_LINK_TO_EARTH = 0;
    /** A ceramic or film Y capacitor. */
    private static final double EARTH_ESR = 0.1;
    /** A ceramic or film Y capacitor: 5 to 15 nH. */
    private static final double EARTH_ESL = 10e-9;

    private InstallationFile() {}

    /**
     * Reads an installation and the parts that it names.
     *
     * @param name of the installation
     * @return empty when anything is wrong, which the problems say
     */
    static Optional<Installation> read(SourceText source, String name, Parts parts, Problems problems) {
        return QuantityTable.read(source, "an installation", problems).flatMap(rows -> {
            Optional<Installation> installation = installation(rows, name, parts);
            rows.rejectUnknown();
            return installation;
        });
    }

    private static Optional<Installation> installation(QuantityTable rows, String name, Parts parts) {
        Optional<Supply> supply = rows.record(
                "supply phases",
                () -> new Supply(
                        rows.count("supply phases", 1, 3),
                        rows.number(Supply.VOLTAGE),
                        rows.number(Supply.FREQUENCY, SUPPLY_HZ)));
        Optional<MainsLead> mainsLead = rows.record(
                MainsLead.LENGTH.quantity(),
                () -> new MainsLead(
                        rows.number(MainsLead.LENGTH),
                        rows.number(MainsLead.LINE_INDUCTANCE, LINE_INDUCTANCE),
                        rows.number(MainsLead.EARTH_INDUCTANCE, EARTH_INDUCTANCE)));
        Optional<Cell> filterName =
                rows.word("mains filter", "must name a filter, or " + NO_FILTER + " where there is none");
        boolean filtered =
                filterName.filter(cell -> !cell.text().equals(NO_FILTER)).isPresent();
        Optional<FilterPart> filter = filtered ? filterName.flatMap(parts.filters()::named) : Optional.empty();
        Optional<Link> link = link(rows);
        Optional<CablePart> lead = rows.word("motor lead", "must name a cable").flatMap(parts.cables()::named);
        Optional<MotorPart> motor = rows.word("motor", "must name a motor").flatMap(parts.motors()::named);
        return rows.record("mains filter", () -> {
            if (filterName.isEmpty() || filtered) {
                rows.built(filter);
            }
            return new Installation(
                    name,
                    rows.built(supply),
                    rows.built(mainsLead),
                    filter,
                    rows.number(Installation.FILTER_EARTH_LEAD, FILTER_EARTH_LEAD),
                    rows.built(link),
                    rows.number(Installation.HEATSINK),
                    rows.built(lead),
                    rows.number(Installation.MOTOR_LEAD_LENGTH),
                    rows.built(motor),
                    rows.optional(Installation.FRAME_BOND));
        });
    }

    private static Optional<Link> link(QuantityTable rows) {
        return rows.record(Link.CAPACITANCE.quantity(), () -> {
            double capacitance = rows.number(Link.CAPACITANCE);
            double esr = rows.number(Link.ESR, LINK_ESR);
            double esl = rows.number(Link.ESL, LINK_ESL);
            double toEarth = rows.number(Link.EARTH_CAPACITANCE, NO_LINK_TO_EARTH);
            double earthEsr = rows.number(Link.EARTH_ESR, EARTH_ESR);
            double earthEsl = rows.number(Link.EARTH_ESL, EARTH_ESL);
            return new Link(new Capacitor(capacitance, esr, esl), new Capacitor(toEarth, earthEsr, earthEsl));
        });
    }
}
