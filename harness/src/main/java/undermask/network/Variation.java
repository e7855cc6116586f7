package undermask.network;

import undermask.installation.Parasitic;

/** By which factor each value of an installation differs from what is written. */
@FunctionalInterface
public interface Variation {
    /** All values as written. */
    Variation NONE = parasitic -> 1;

    /** The factor of a value, above 0. */
    double factor(Parasitic parasitic);
}
