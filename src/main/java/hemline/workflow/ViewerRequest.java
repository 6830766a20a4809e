package hemline.workflow;

import java.nio.file.Path;
import java.util.List;

/**
 * What the viewer is to show.
 *
 * @param paths files and folders of sweeps; empty to start with an empty window
 */
public record ViewerRequest(List<Path> paths) {
    public ViewerRequest {
        paths = List.copyOf(paths);
    }
}
