package hemline.casefile.edit;

import hemline.sweep.SweepFrame;
import java.util.List;

/** The sweeps of a case by their mean time. */
public final class Sweeps {
    /** Far below the shortest repeat time of a low sweep (about a minute), far above rounding of times, ms. */
    private static final long SAME_SWEEP_MS = 15_000;

    private final List<SweepFrame> frames;
    private final long[] meanMs;

    public Sweeps(List<SweepFrame> frames) {
        this.frames = List.copyOf(frames);
        meanMs = this.frames.stream().mapToLong(SweepFrame::meanTimeMs).toArray();
    }

    public List<SweepFrame> frames() {
        return frames;
    }

    public SweepFrame frame(int sweep) {
        return frames.get(sweep);
    }

    /** Mean time of a sweep, ms since 1970-01-01T00:00Z. */
    public long meanMs(int sweep) {
        return meanMs[sweep];
    }

    long lastMs() {
        return meanMs[meanMs.length - 1];
    }

    /** The sweep of that mean time; the earlier on a tie. */
    int at(long timeMs) throws CannotApplyException {
        int best = 0;
        for (int i = 1; i < meanMs.length; i++) {
            if (Math.abs(meanMs[i] - timeMs) < Math.abs(meanMs[best] - timeMs)) {
                best = i;
            }
        }
        if (Math.abs(meanMs[best] - timeMs) > SAME_SWEEP_MS) {
            throw new CannotApplyException("there is no sweep at " + Words.time(timeMs) + "; the nearest is at "
                    + Words.time(meanMs[best]));
        }
        return best;
    }
}
