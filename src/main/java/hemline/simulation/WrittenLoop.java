package hemline.simulation;

import hemline.boundary.truth.Truth;
import java.nio.file.Path;
import java.util.List;

/**
 * An invented loop as written.
 *
 * @param sweeps its files in order of time
 * @param truth  the file of its truth
 * @param what   the truth
 */
public record WrittenLoop(List<Path> sweeps, Path truth, Truth what) {
    public WrittenLoop {
        sweeps = List.copyOf(sweeps);
    }
}
