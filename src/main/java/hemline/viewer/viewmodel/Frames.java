package hemline.viewer.viewmodel;

import hemline.sweep.SweepFrame;
import java.util.List;

/** Finds sweeps by time. */
public final class Frames {
    private Frames() {
    }

    /** Index of the sweep whose mean time is nearest; the earlier on a tie. */
    public static int nearest(List<SweepFrame> frames, double timeMs) {
        int best = 0;
        for (int i = 1; i < frames.size(); i++) {
            if (Math.abs(frames.get(i).meanTimeMs() - timeMs) < Math.abs(frames.get(best).meanTimeMs() - timeMs)) {
                best = i;
            }
        }
        return best;
    }
}
