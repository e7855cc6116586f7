package undermask;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;

/** A profile folder for tests of the whole program. */
public final class SmallPlant {
    private SmallPlant() {}

    /**
     * Writes a profile of a short window and its installation.
     *
     * @param filter name of the mains filter, or none
     * @param rows further rows of the profile
     */
    public static void write(Path profiles, String name, String filter, String rows) throws IOException {
        Files.createDirectories(profiles.resolve("installations"));
        Files.writeString(
                profiles.resolve("installations/plant-" + filter + ".csv"),
                String.join(
                        "\n",
                        "quantity,value,unit,note",
                        "supply phases,3,,",
                        "supply voltage,400,V,",
                        "supply frequency,50,Hz,",
                        "mains lead length,2,m,",
                        "mains filter," + filter + ",,",
                        "filter earth lead length,0.02,m,",
                        "link capacitance,500,uF,",
                        "heatsink capacitance,120,pF,",
                        "motor lead,shielded-4x2.5,,",
                        "motor lead length,10,m,",
                        "motor,motor-4kw,,",
                        ""));
        Files.writeString(
                profiles.resolve(name + ".csv"),
                String.join(
                        "\n",
                        "quantity,value,unit,note",
                        "installation,plant-" + filter + ",,",
                        "mask,iec61800-3-c2,,",
                        "carrier frequency,4,kHz,",
                        "modulation,space-vector,,",
                        "dead time,2,us,",
                        "dv/dt rising,2,kV/us,",
                        "dv/dt falling,2,kV/us,",
                        "base voltage,400,V,",
                        "base frequency,200,Hz,",
                        "output frequency,200,Hz,",
                        "load current,8,A,",
                        "displacement power factor,0.8,,",
                        rows + (rows.isEmpty() ? "" : "\n")));
    }
}
