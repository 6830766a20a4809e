package hemline.export;

import hemline.sweep.SweepFrame;
import java.util.List;

/**
 * The time from the earliest to the latest ray, ms since 1970-01-01T00:00Z.
 *
 * @param firstMs of the earliest
 * @param lastMs  of the latest
 */
record FrameSpan(long firstMs, long lastMs) {

    static FrameSpan of(SweepFrame frame) {
        return new FrameSpan(frame.rays().firstMs(), frame.rays().lastMs());
    }

    static FrameSpan of(List<SweepFrame> frames) {
        long first = Long.MAX_VALUE;
        long last = Long.MIN_VALUE;
        for (SweepFrame frame : frames) {
            FrameSpan span = of(frame);
            first = Math.min(first, span.firstMs);
            last = Math.max(last, span.lastMs);
        }
        return new FrameSpan(first, last);
    }
}
