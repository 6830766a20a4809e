package hemline.workflow;

import java.nio.file.Path;
import java.util.List;
import java.util.Objects;

/**
 * What the viewer is to show.
 *
 * @param paths  files and folders of sweeps; empty to start with an empty window
 * @param opener opens them, and whatever the user opens later
 */
public record ViewerRequest(List<Path> paths, SessionOpener opener) {
    public ViewerRequest {
        paths = List.copyOf(paths);
        Objects.requireNonNull(opener);
    }
}
