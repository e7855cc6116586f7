package undermask.check;

import java.util.Comparator;
import java.util.List;
import java.util.stream.Stream;
import undermask.installation.Parasitic;
import undermask.network.InstallationNetwork;
import undermask.network.PortResponse;
import undermask.network.Variation;

/**
 * What rules at a frequency, and what would move it.
 *
 * @param frequencyHz where
 * @param commonModeLeadDb by how much the common mode alone exceeds the link current alone, dB
 * @param elements the values that move the reading most, strongest first
 */
public record Leverage(double frequencyHz, double commonModeLeadDb, List<Element> elements) {
    private static final double MORE = 1.2;
    private static final int KEPT = 3;

    /**
     * A value of the installation.
     *
     * @param decibels change of the reading when the value grows by a fifth
     */
    public record Element(Parasitic parasitic, double decibels) {}

    /** Takes a copy. */
    public Leverage {
        elements = List.copyOf(elements);
    }

    static Leverage of(InstallationNetwork network, PortMix[] mixes, double frequency) {
        int worst = 0;
        for (int port = 1; port < mixes.length; port++) {
            worst = mixes[port].power() > mixes[worst].power() ? port : worst;
        }
        PortMix mix = mixes[worst];
        int port = worst;
        PortResponse nominal = network.response(Variation.NONE);
        double[] common = nominal.commonMode(port, frequency).clone();
        double[] link = nominal.linkCurrent(port, frequency).clone();
        List<Element> elements = Stream.of(Parasitic.values())
                .map(parasitic -> {
                    PortResponse moved = network.response(other -> other == parasitic ? MORE : 1);
                    double power = mix.power(
                            PortMix.ratio(moved.commonMode(port, frequency), common),
                            PortMix.ratio(moved.linkCurrent(port, frequency), link));
                    return new Element(parasitic, 10 * Math.log10(power / mix.power()));
                })
                .sorted(Comparator.comparingDouble((Element element) -> -Math.abs(element.decibels())))
                .limit(KEPT)
                .toList();
        return new Leverage(frequency, 10 * Math.log10(mix.commonMode() / mix.linkCurrent()), elements);
    }

    /** Whether the common mode rules there. */
    public boolean commonModeRules() {
        return commonModeLeadDb >= 0;
    }
}
