package hemline.simulation.files;

import hemline.simulation.radar.Packing;
import hemline.sweep.Sweep;
import java.io.IOException;
import java.nio.file.Path;

/** Writes one sweep as one file, replacing what was there. */
public interface SweepWriter {
    /**
     * @param reflectivity how the values of the reflectivity are to be stored; they must have been rounded with it
     * @param velocity     the same for the velocity, where there is one
     */
    void write(Path file, Sweep sweep, Packing reflectivity, Packing velocity) throws IOException;
}
