package hemline.workflow;

import hemline.sweep.Progress;
import java.io.IOException;
import java.nio.file.Path;
import java.util.List;

/** Opens loops for a skin in two steps, so that the sweeps can be looked at while they are analysed. */
public interface SessionOpener {
    /**
     * Reads what the paths hold. The session is not analysed, unless the paths name something that already is.
     *
     * @throws IOException if nothing could be read; its message says what is wrong and how to mend it
     * @throws java.util.concurrent.CancellationException if cancelled
     */
    LoopSession open(List<Path> paths, Progress progress) throws IOException;

    /**
     * Screens, detects, links and measures.
     *
     * @param read a session of this opener
     * @return a session of the same sweeps with its tracks and meetings
     * @throws java.util.concurrent.CancellationException if cancelled
     */
    LoopSession analyse(LoopSession read, Progress progress);
}
