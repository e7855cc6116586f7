package undermask.check;

import java.util.List;
import undermask.receiver.Detector;
import undermask.receiver.Reading;
import undermask.receiver.Receiver;

/**
 * What a receiver reads at one port on a grid of frequencies: of both modes together, and of each alone. A factor on each
 * mode then gives a new reading without the lines.
 *
 * <p>Squares of readings are taken to add, with what both have in common as the lines within the bandwidth show it; the
 * rest that the detector itself makes of two modes follows the product of their factors. With one mode, and with both
 * as they are, that is exact.
 */
final class PortReadings {
    private final List<Reading> both;
    private final List<Reading> commonMode;
    private final List<Reading> linkCurrent;
    private final PortMix[] mixes;

    private PortReadings(List<Reading> both, List<Reading> commonMode, List<Reading> linkCurrent, PortMix[] mixes) {
        this.both = both;
        this.commonMode = commonMode;
        this.linkCurrent = linkCurrent;
        this.mixes = mixes;
    }

    static PortReadings of(PortLines lines, int port, Receiver receiver, double[] frequencies) {
        PortMix[] mixes = new PortMix[frequencies.length];
        for (int i = 0; i < mixes.length; i++) {
            mixes[i] = lines.mix(port, frequencies[i], receiver.bandwidth(frequencies[i]));
        }
        return new PortReadings(
                receiver.at(frequencies, lines.both(port)),
                receiver.at(frequencies, lines.commonMode(port)),
                receiver.at(frequencies, lines.linkCurrent(port)),
                mixes);
    }

    /** Square of a reading as it is, V². */
    double square(Detector detector, int place) {
        return Math.pow(both.get(place).of(detector), 2);
    }

    /**
     * Square of a reading with a complex factor on each mode, V².
     *
     * @param factor real and imaginary part of the common mode's, then of the link current's
     */
    double square(Detector detector, int place, float[] factor) {
        double common = commonMode.get(place).of(detector);
        double link = linkCurrent.get(place).of(detector);
        double together = both.get(place).of(detector);
        double commonFactor = Math.hypot(factor[0], factor[1]);
        double linkFactor = Math.hypot(factor[2], factor[3]);
        PortMix mix = mixes[place];
        double scale = mix.commonMode() > 0 && mix.linkCurrent() > 0
                ? common * link / Math.sqrt(mix.commonMode() * mix.linkCurrent())
                : 0;
        double alike = 2 * scale * mix.crossRe();
        double turnRe = factor[0] * factor[2] + factor[1] * factor[3];
        double turnIm = factor[1] * factor[2] - factor[0] * factor[3];
        double turned = 2 * scale * (turnRe * mix.crossRe() - turnIm * mix.crossIm());
        double rest = together * together - common * common - link * link - alike;
        return Math.max(
                0,
                Math.pow(commonFactor * common, 2)
                        + Math.pow(linkFactor * link, 2)
                        + turned
                        + commonFactor * linkFactor * rest);
    }
}
