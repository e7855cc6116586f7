package undermask.network;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.stream.DoubleStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import undermask.installation.Installation;

class InstallationNetworkReferenceTest {
    /** rms level of the carrier's multiple at 152 kHz of a bridge on 560 V, low modulation: 4/(πm)·V/2, m = 38. */
    private static final double SOURCE_AT_152_KHZ_DBUV = 136.4;

    /** Levels of the mains terminals from 152 to 500 kHz every 4 kHz. */
    private static double[] levelsDbuv(Installation installation) {
        CircuitSolver solver = InstallationNetwork.of(installation, MainsNetwork.CISPR_9_KHZ)
                .circuit()
                .solver();
        return DoubleStream.iterate(152e3, f -> f < 500e3, f -> f + 4e3)
                .map(f -> {
                    double transfer = solver.tune(f)
                            .excite(InstallationCircuit.COMMON_MODE_SOURCE)
                            .voltage(MainsNetwork.terminal("L1"))
                            .modulus();
                    return SOURCE_AT_152_KHZ_DBUV + 20 * Math.log10(152e3 / f * transfer);
                })
                .toArray();
    }

    // Source: published and practical levels of unfiltered drives of 3 to 20 kW, 105 to 130 dBµV (common practice)
    @ParameterizedTest
    @ValueSource(doubles = {5, 15, 50})
    void unfilteredLevel(double leadLength) {
        double[] levels = levelsDbuv(Installations.unfiltered4kw(leadLength));
        assertThat(DoubleStream.of(levels).max().orElseThrow()).isBetween(105.0, 130.0);
    }

    // Source: common practice
    @ParameterizedTest
    @ValueSource(doubles = {5, 15, 50})
    void filterTakesThirtyDecibels(double leadLength) {
        double[] bare = levelsDbuv(Installations.unfiltered4kw(leadLength));
        double[] filtered = levelsDbuv(Installations.filtered4kw(leadLength));
        for (int i = 0; i < bare.length; i++) {
            assertThat(filtered[i]).isLessThan(bare[i] - 30);
        }
    }
}
