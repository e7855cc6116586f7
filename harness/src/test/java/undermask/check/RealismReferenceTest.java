package undermask.check;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import undermask.input.ProfileFolder;
import undermask.input.Refused;
import undermask.receiver.Detector;
import undermask.receiver.Trace;

class RealismReferenceTest {
    @TempDir
    private Path folder;

    // Source: common practice. What unfiltered drives of this size read in test laboratories near the lower end of
    // band B, and what a fitted filter takes off there.
    @ParameterizedTest(name = "{0}, {1} m of {2}, {4}")
    @CsvSource({
        "motor-4kw,  5,  shielded-4x2.5, 16, space-vector",
        "motor-4kw,  50, shielded-4x2.5, 16, sine-triangle",
        "motor-7.5kw, 20, shielded-4x4,  16, space-vector",
        "motor-15kw, 5,  shielded-4x6,   42, space-vector",
        "motor-15kw, 50, shielded-4x6,   42, space-vector",
    })
    void unfilteredDrivesReadWhatTheyReadInTheLaboratory(
            String motor, double length, String lead, String filterRating, String modulation)
            throws IOException, Refused {
        double unfiltered = highest(motor, length, lead, "none", modulation);
        double filtered = highest(motor, length, lead, "filter-3ph-" + filterRating + "a", modulation);
        assertThat(unfiltered).isBetween(105.0, 130.0);
        assertThat(unfiltered - filtered).isGreaterThanOrEqualTo(30.0);
    }

    /** The highest quasi-peak level from 150 to 500 kHz, dBµV. */
    private double highest(String motor, double length, String lead, String filter, String modulation)
            throws IOException, Refused {
        Files.createDirectories(folder.resolve("installations"));
        Files.writeString(
                folder.resolve("installations/plant.csv"),
                String.join(
                        "\n",
                        "quantity,value,unit,note",
                        "supply phases,3,,",
                        "supply voltage,400,V,",
                        "supply frequency,50,Hz,",
                        "mains lead length,2,m,",
                        "mains filter," + filter + ",,",
                        "link capacitance,500,uF,",
                        "heatsink capacitance,120,pF,",
                        "motor lead," + lead + ",,",
                        "motor lead length," + length + ",m,",
                        "motor," + motor + ",,",
                        ""));
        Files.writeString(
                folder.resolve("drive.csv"),
                String.join(
                        "\n",
                        "quantity,value,unit,note",
                        "installation,plant,,",
                        "mask,iec61800-3-c2,,",
                        "carrier frequency,4,kHz,",
                        "modulation," + modulation + ",,",
                        "dead time,2,us,",
                        "dv/dt rising,4,kV/us,",
                        "dv/dt falling,4,kV/us,",
                        "base voltage,340,V,",
                        "base frequency,50,Hz,",
                        "output frequency,50,Hz,",
                        "load current,8,A,",
                        "displacement power factor,0.8,,",
                        ""));
        Trace trace = Check.of(new ProfileFolder(folder).read(List.of("drive")).get(0))
                .envelope();
        double highest = Double.NEGATIVE_INFINITY;
        for (int step = 0; step < trace.size(); step++) {
            if (trace.frequency(step) >= 150e3 && trace.frequency(step) <= 500e3) {
                highest = Math.max(highest, trace.levelDbuv(Detector.QUASI_PEAK, step));
            }
        }
        return highest;
    }
}
