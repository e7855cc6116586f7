package undermask.network;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.SplittableRandom;
import undermask.installation.Capacitor;
import undermask.installation.Installation;
import undermask.installation.Link;
import undermask.installation.MainsLead;
import undermask.installation.Supply;

/** Installations that tests share. */
final class Installations {
    private Installations() {}

    /** A drive of 4 kW on three-phase mains with 15 m of shielded lead and no filter. */
    static Installation unfiltered4kw(double leadLength) {
        return threePhase("unfiltered", Optional.empty(), leadLength);
    }

    /** The same with a filter of one stage. */
    static Installation filtered4kw(double leadLength) {
        return threePhase("filtered", Optional.of("filter-3ph-16a"), leadLength);
    }

    static Installation singlePhase(double leadLength) {
        return new Installation(
                "single-phase",
                new Supply(1, 230, 50),
                new MainsLead(1.5, 0.6e-6, 0.7e-6),
                Optional.of(Parts.filter("filter-1ph-10a")),
                0.1,
                new Link(new Capacitor(470e-6, 150e-3, 25e-9), new Capacitor(4.7e-9, 80e-3, 12e-9)),
                80e-12,
                Parts.cable("shielded-4x1.5"),
                leadLength,
                Parts.motor("motor-0.75kw"),
                OptionalDouble.of(1e-6));
    }

    private static Installation threePhase(String name, Optional<String> filter, double leadLength) {
        return new Installation(
                name,
                new Supply(3, 400, 50),
                new MainsLead(2, 0.6e-6, 0.7e-6),
                filter.map(Parts::filter),
                0.15,
                new Link(new Capacitor(470e-6, 80e-3, 25e-9), new Capacitor(4.7e-9, 60e-3, 12e-9)),
                150e-12,
                Parts.cable("shielded-4x2.5"),
                leadLength,
                Parts.motor("motor-4kw"),
                OptionalDouble.empty());
    }

    /** Any installation of built-in parts. */
    static Installation random(SplittableRandom random) {
        int phases = random.nextBoolean() ? 1 : 3;
        String[] filters = phases == 1
                ? new String[] {"filter-1ph-10a", "filter-1ph-16a", "filter-1ph-10a-low-leakage"}
                : new String[] {"filter-3ph-8a", "filter-3ph-16a", "filter-3ph-42a"};
        return new Installation(
                "random",
                new Supply(phases, phases == 1 ? 230 : 400, 50),
                new MainsLead(0.3 + 8 * random.nextDouble(), 0.6e-6, 0.7e-6),
                random.nextInt(3) == 0 ? Optional.empty() : Optional.of(Parts.filter(any(random, filters))),
                0.05 + random.nextDouble(),
                new Link(
                        new Capacitor(470e-6, 0.02 + 0.15 * random.nextDouble(), 40e-9 * random.nextDouble()),
                        new Capacitor(random.nextBoolean() ? 0 : 100e-9 * random.nextDouble(), 0.05, 12e-9)),
                1e-10 + 4e-10 * random.nextDouble(),
                Parts.cable(any(random, Parts.names("cables.csv").toArray(new String[0]))),
                1 + 60 * random.nextDouble(),
                Parts.motor(any(random, Parts.names("motors.csv").toArray(new String[0]))),
                random.nextBoolean() ? OptionalDouble.empty() : OptionalDouble.of(0.2e-6 + 5e-6 * random.nextDouble()));
    }

    private static String any(SplittableRandom random, String[] names) {
        return names[random.nextInt(names.length)];
    }
}
