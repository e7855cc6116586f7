package undermask.input;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import undermask.installation.CablePart;
import undermask.installation.Capacitor;
import undermask.installation.CorePart;
import undermask.installation.CorePlace;
import undermask.installation.DriveOptions;
import undermask.installation.FilterPart;
import undermask.installation.Installation;
import undermask.installation.LeadFitting;
import undermask.installation.Link;
import undermask.installation.MainsLead;
import undermask.installation.MotorCooling;
import undermask.installation.MotorPart;
import undermask.installation.MotorPlace;
import undermask.installation.OutputFilter;
import undermask.installation.OutputFilterKind;
import undermask.installation.OwnElement;
import undermask.installation.Parasitic;
import undermask.installation.RingCores;
import undermask.installation.ShieldTermination;
import undermask.installation.Supply;
import undermask.network.MainsNetwork;
import undermask.network.PortResponse;
import undermask.network.Variation;
import undermask.unit.Worded;

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

    private static final double PIGTAIL = 0.1;
    /** One core of three legs. */
    private static final double COMMON_MODE_SHARE = 0.05;

    /** Where an installation with elements of its own is solved once. */
    private static final double PROBE_HZ = 1e6;

    private static final String OWN_ELEMENTS = "own elements";

    private InstallationFile() {}

    /**
     * Reads an installation and the parts that it names.
     *
     * @param name of the installation
     * @return empty when anything is wrong, which the problems say
     */
    static Optional<Installation> read(SourceText source, String name, Shelf shelf, Problems problems) {
        return QuantityTable.read(source, "an installation", problems).flatMap(rows -> {
            Optional<Installation> installation = installation(rows, name, shelf);
            rows.rejectUnknown();
            shelf.knowInstallation(rows.asked());
            return installation;
        });
    }

    private static Optional<Installation> installation(QuantityTable rows, String name, Shelf shelf) {
        Parts parts = shelf.parts();
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
        Optional<LeadFitting> fitting = fitting(rows, parts);
        Optional<DriveOptions> options = options(rows);
        Map<Parasitic, Double> deviations = new EnumMap<>(Parasitic.class);
        for (Parasitic parasitic : Parasitic.values()) {
            if (rows.gives(parasitic.tolerance().quantity())) {
                rows.optional(parasitic.tolerance()).ifPresent(share -> deviations.put(parasitic, share));
            }
        }
        boolean own = rows.gives(OWN_ELEMENTS);
        Optional<List<OwnElement>> elements = own
                ? rows.word(OWN_ELEMENTS, "must name a file of the folder " + Shelf.ELEMENTS)
                        .flatMap(shelf::elements)
                : Optional.of(List.of());
        return rows.record(own ? OWN_ELEMENTS : "mains filter", () -> {
            if (filterName.isEmpty() || filtered) {
                rows.built(filter);
            }
            Installation installation = new Installation(
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
                    rows.optional(Installation.FRAME_BOND),
                    rows.built(fitting),
                    rows.built(options),
                    rows.built(elements),
                    deviations,
                    new MotorPlace(
                            rows.choice("motor cooling", MotorCooling.class, MotorCooling.SHAFT_FAN),
                            rows.number(MotorPlace.AMBIENT, MotorPlace.RATED.ambientCelsius())));
            if (own) {
                // a node that hangs in the air or a contradiction shows when it is solved
                new PortResponse(installation, MainsNetwork.CISPR_9_KHZ, 0, Variation.NONE).commonMode(0, PROBE_HZ);
            }
            return installation;
        });
    }

    private static Optional<LeadFitting> fitting(QuantityTable rows, Parts parts) {
        boolean cored = rows.gives("ring core");
        Optional<RingCores> cores = Optional.empty();
        if (cored) {
            Optional<CorePart> core = rows.word("ring core", "must name a core").flatMap(parts.cores()::named);
            cores = rows.record(
                    "ring core",
                    () -> new RingCores(
                            rows.built(core),
                            (int) rows.number(RingCores.NUMBER, 1),
                            (int) rows.number(RingCores.TURNS, 1),
                            rows.choice("ring core placement", CorePlace.class, CorePlace.AROUND_ALL)));
        }
        Optional<RingCores> fitted = cores;
        return rows.record("ring core", () -> {
            if (cored) {
                rows.built(fitted);
            }
            return new LeadFitting(
                    rows.choice("shield termination", ShieldTermination.class, ShieldTermination.ALL_ROUND),
                    rows.number(LeadFitting.PIGTAIL, PIGTAIL),
                    fitted,
                    (int) rows.number(LeadFitting.MOTORS, 1));
        });
    }

    private static Optional<DriveOptions> options(QuantityTable rows) {
        boolean filtered = rows.gives("output filter");
        Optional<OutputFilter> output = Optional.empty();
        if (filtered) {
            output = rows.record(
                    "output filter",
                    () -> new OutputFilter(
                            rows.choice("output filter", OutputFilterKind.class),
                            rows.number(OutputFilter.INDUCTANCE),
                            rows.number(OutputFilter.SHARE, COMMON_MODE_SHARE),
                            rows.number(OutputFilter.CAPACITANCE, 0),
                            rows.number(OutputFilter.RESISTANCE, 0)));
        }
        Optional<OutputFilter> fitted = output;
        return rows.record("output filter", () -> {
            if (filtered) {
                rows.built(fitted);
            }
            return new DriveOptions(
                    rows.choice("link to earth connection", LinkEarth.class, LinkEarth.FITTED) == LinkEarth.FITTED,
                    rows.number(DriveOptions.LINE_REACTOR, 0),
                    rows.number(DriveOptions.LINK_CHOKE, 0),
                    fitted);
        });
    }

    /** Whether the drive's capacitors to PE are connected. */
    private enum LinkEarth implements Worded {
        FITTED("fitted"),
        REMOVED("removed");

        private final String words;

        LinkEarth(String words) {
            this.words = words;
        }

        @Override
        public String words() {
            return words;
        }
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
