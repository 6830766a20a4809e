package hemline.workflow;

import java.nio.file.Path;
import java.util.List;

/**
 * An invented loop as written.
 *
 * @param files      its sweeps in order of time
 * @param truth      the file of its truth
 * @param boundaries number of boundaries in the truth
 * @param meetings   number of meetings in the truth
 */
public record SimulateOutcome(List<Path> files, Path truth, int boundaries, int meetings) {
    public SimulateOutcome {
        files = List.copyOf(files);
    }
}
