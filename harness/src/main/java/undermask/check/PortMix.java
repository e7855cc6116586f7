package undermask.check;

import undermask.signal.Lines;

/**
 * What a receiver tuned to a frequency gets at one port from the two modes: their powers within its bandwidth and how
 * they add. Transfers change so little within a bandwidth that a factor on each mode gives the new power.
 *
 * @param commonMode power of the common mode's lines, V²
 * @param linkCurrent power of the link current's lines, V²
 * @param crossRe real part of the mean product of the first with the conjugate of the second
 * @param crossIm imaginary part
 */
record PortMix(double commonMode, double linkCurrent, double crossRe, double crossIm) {
    /** Bandwidths on each side beyond which a line counts for nothing: its weight is below 1e-5 there. */
    private static final double REACH = 1.5;

    /** Sums the lines around a frequency with the weights of a Gaussian response. */
    static PortMix of(Lines commonMode, Lines linkCurrent, double frequency, double bandwidth) {
        double spacing = commonMode.spacing();
        int first = Math.max(1, (int) Math.ceil((frequency - REACH * bandwidth) / spacing));
        int count = Math.max(1, (int) Math.floor((frequency + REACH * bandwidth) / spacing) - first + 1);
        double[] cRe = new double[count];
        double[] cIm = new double[count];
        double[] dRe = new double[count];
        double[] dIm = new double[count];
        commonMode.read(first, count, cRe, cIm);
        linkCurrent.read(first, count, dRe, dIm);
        double common = 0;
        double link = 0;
        double re = 0;
        double im = 0;
        for (int i = 0; i < count; i++) {
            double apart = ((first + i) * spacing - frequency) / (bandwidth / 2);
            double weight = Math.pow(2, -2 * apart * apart);
            common += weight * (cRe[i] * cRe[i] + cIm[i] * cIm[i]);
            link += weight * (dRe[i] * dRe[i] + dIm[i] * dIm[i]);
            re += weight * (cRe[i] * dRe[i] + cIm[i] * dIm[i]);
            im += weight * (cIm[i] * dRe[i] - cRe[i] * dIm[i]);
        }
        return new PortMix(common, link, re, im);
    }

    /** The power as it is, V². */
    double power() {
        return commonMode + linkCurrent + 2 * crossRe;
    }

    /**
     * The power with a complex factor on each mode.
     *
     * @param common real and imaginary part of the factor of the common mode
     * @param link likewise of the link current
     */
    double power(double[] common, double[] link) {
        // c·d* turns with the product of the first factor and the conjugate of the second
        double turnRe = common[0] * link[0] + common[1] * link[1];
        double turnIm = common[1] * link[0] - common[0] * link[1];
        return (common[0] * common[0] + common[1] * common[1]) * commonMode
                + (link[0] * link[0] + link[1] * link[1]) * linkCurrent
                + 2 * (turnRe * crossRe - turnIm * crossIm);
    }

    /** The ratio of two complex numbers. */
    static double[] ratio(double[] above, double[] below) {
        double square = below[0] * below[0] + below[1] * below[1];
        return square == 0
                ? new double[] {1, 0}
                : new double[] {
                    (above[0] * below[0] + above[1] * below[1]) / square,
                    (above[1] * below[0] - above[0] * below[1]) / square
                };
    }
}
