package hemline.viewer;

import hemline.sweep.Progress;
import hemline.workflow.LoopSession;
import hemline.workflow.SessionOpener;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;

/** Opens invented loops; a path called {@code broken} cannot be read. */
public final class FakeOpener implements SessionOpener {
    public final List<List<Path>> opened = new ArrayList<>();
    private final Function<Boolean, LoopSession> loop;

    /** @param loop makes the loop, analysed or not */
    public FakeOpener(Function<Boolean, LoopSession> loop) {
        this.loop = loop;
    }

    @Override
    public LoopSession open(List<Path> paths, Progress progress) throws IOException {
        opened.add(paths);
        if (paths.stream().anyMatch(p -> p.endsWith("broken"))) {
            throw new IOException("broken: ends within the first ray; fetch the file again");
        }
        progress.step("reading", 1, 1);
        return loop.apply(false);
    }

    @Override
    public LoopSession analyse(LoopSession read, Progress progress) {
        for (int i = 1; i <= 20; i++) {
            progress.check();
            progress.step("detecting", i, 20);
        }
        return loop.apply(true);
    }
}
