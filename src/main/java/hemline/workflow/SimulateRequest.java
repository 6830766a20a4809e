package hemline.workflow;

import java.nio.file.Path;
import java.util.List;

/**
 * A loop to invent.
 *
 * @param folder  where to write it
 * @param scene   kind of scene
 * @param radar   invented radar
 * @param seed    the same seed gives the same bytes
 * @param formats formats of the files in turn; empty for all of them in turn
 * @param threads number of threads, at least 1
 */
public record SimulateRequest(Path folder, String scene, String radar, long seed, List<String> formats, int threads) {
    public SimulateRequest {
        formats = List.copyOf(formats);
        if (threads < 1) {
            throw new IllegalArgumentException("at least one thread is needed, got " + threads);
        }
    }
}
