package undermask.unit;

/** Decibels and levels. A level in dBµV is 20·log10(V_rms / 1 µV). */
public final class Decibels {
    private static final double MICROVOLT = 1e-6;

    private Decibels() {}

    /** 20·log10 of a ratio of amplitudes; negative infinity for 0. */
    public static double ofRatio(double ratio) {
        return 20 * Math.log10(ratio);
    }

    /** The ratio of amplitudes of so many decibels. */
    public static double toRatio(double decibels) {
        return Math.pow(10, decibels / 20);
    }

    /** The level in dBµV of a voltage in V rms; negative infinity for 0. */
    public static double dbuv(double voltsRms) {
        return ofRatio(voltsRms / MICROVOLT);
    }

    /** The voltage in V rms of a level in dBµV. */
    public static double voltsRms(double levelDbuv) {
        return toRatio(levelDbuv) * MICROVOLT;
    }
}
