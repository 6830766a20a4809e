package hemline.workflow;

import java.nio.file.Path;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * One run of the main job.
 *
 * @param paths    files and folders of sweeps
 * @param out      folder for the results
 * @param reading  how to read
 * @param settings JSON file with settings that differ from the defaults
 * @param ceilingM height ceiling that goes before any other setting of it, m above the radar
 * @param threads  number of threads, at least 1
 * @param pictures which pictures to draw
 * @param stations CSV file of station observations to look for passages in
 */
public record RunRequest(List<Path> paths, Path out, ReadChoices reading, Optional<Path> settings,
                         OptionalDouble ceilingM, int threads, Pictures pictures, Optional<Path> stations) {
    public RunRequest {
        paths = List.copyOf(paths);
        Objects.requireNonNull(out);
        Objects.requireNonNull(reading);
        Objects.requireNonNull(pictures);
        Objects.requireNonNull(stations);
        if (threads < 1) {
            throw new IllegalArgumentException("at least one thread is needed, got " + threads);
        }
    }

    /** Which pictures a run draws. */
    public enum Pictures {
        /** No picture. */
        NONE,
        /** One map of all boundaries. */
        OVERVIEW,
        /** The map, and each sweep with what was found in it. */
        ALL
    }
}
