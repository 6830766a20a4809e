package hemline.simulation;

import hemline.simulation.files.FileFormat;
import java.util.List;

/**
 * What to invent and how to write it.
 *
 * @param scene   one of {@link Scenes#names()}
 * @param radar   one of {@link Radars#names()}
 * @param seed    random seed
 * @param formats the formats of the files in turn: the first for the first sweep, and so on, over and over
 */
public record SimulationRequest(String scene, String radar, long seed, List<FileFormat> formats) {
    public SimulationRequest {
        formats = List.copyOf(formats);
        if (formats.isEmpty()) {
            throw new IllegalArgumentException("at least one format is needed, got none");
        }
    }

    /** All three formats in turn. */
    public static SimulationRequest mixed(String scene, String radar, long seed) {
        return new SimulationRequest(scene, radar, seed, List.of(FileFormat.values()));
    }
}
