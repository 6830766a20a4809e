package hemline.viewer.viewmodel;

import java.util.ArrayList;
import java.util.List;

/**
 * Time along a screen axis at true spacing.
 *
 * @param fromMs time at {@code fromPx}, ms since 1970-01-01T00:00Z
 * @param toMs   time at {@code toPx}; after {@code fromMs}
 */
public record TimeScale(long fromMs, long toMs, double fromPx, double toPx) {
    private static final long[] STEPS_MS = {10_000, 30_000, 60_000, 120_000, 300_000, 600_000, 900_000, 1_800_000,
        3_600_000, 7_200_000, 10_800_000, 21_600_000, 43_200_000, 86_400_000};

    public TimeScale {
        if (toMs <= fromMs) {
            throw new IllegalArgumentException("a time axis must end after its start, got " + fromMs + ".." + toMs);
        }
    }

    public double x(double timeMs) {
        return fromPx + (timeMs - fromMs) * (toPx - fromPx) / (toMs - fromMs);
    }

    public double timeMs(double px) {
        return fromMs + (px - fromPx) * (toMs - fromMs) / (toPx - fromPx);
    }

    /** Round times at least {@code leastPx} apart within the axis. */
    public List<Long> ticks(double leastPx) {
        double leastMs = leastPx * (toMs - fromMs) / Math.max(1, toPx - fromPx);
        long step = STEPS_MS[STEPS_MS.length - 1];
        for (int i = STEPS_MS.length - 1; i >= 0 && STEPS_MS[i] >= leastMs; i--) {
            step = STEPS_MS[i];
        }
        while (step < leastMs) {
            step *= 2;
        }
        List<Long> ticks = new ArrayList<>();
        for (long t = Math.floorDiv(fromMs + step - 1, step) * step; t <= toMs; t += step) {
            ticks.add(t);
        }
        return ticks;
    }
}
