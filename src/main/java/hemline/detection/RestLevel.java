package hemline.detection;

import java.util.Arrays;
import java.util.List;

/**
 * Evidence that stays in place: the median over the sweeps of each pixel's evidence in each direction. Hills, masts,
 * blocked sectors and lasting gradients have it; a moving line passes a place too fast to.
 */
final class RestLevel {
    private static final float SLACK = 0.5f;
    private static final int FEWEST = 4;

    private final PlaneGrid grid;
    /** {@code [signed normal][coarse pixel]} to be taken away, units of {@link SweepEvidence}; null when unknown. */
    private final byte[][] level;

    private RestLevel(PlaneGrid grid, byte[][] level) {
        this.grid = grid;
        this.level = level;
    }

    /** @param sweeps evidence before anything was taken away; fewer than four give a level of nothing */
    static RestLevel of(List<SweepEvidence> sweeps) {
        PlaneGrid largest = sweeps.stream().map(s -> s.grid)
                .max(java.util.Comparator.comparingInt(PlaneGrid::width)).orElseThrow();
        if (sweeps.size() < FEWEST) {
            return new RestLevel(largest, null);
        }
        byte[][] median = new byte[Orientations.SIGNED][];
        for (int d = 0; d < median.length; d++) {
            median[d] = median(sweeps, d, largest);
        }
        byte[][] level = new byte[Orientations.SIGNED][];
        for (int d = 0; d < level.length; d++) {
            level[d] = widened(median, d, largest.width());
        }
        return new RestLevel(largest, level);
    }

    private static byte[] median(List<SweepEvidence> sweeps, int d, PlaneGrid grid) {
        byte[] median = new byte[grid.size()];
        byte[] series = new byte[sweeps.size()];
        for (int y = 0; y < grid.width(); y++) {
            for (int x = 0; x < grid.width(); x++) {
                int n = 0;
                for (SweepEvidence sweep : sweeps) {
                    int inset = (grid.width() - sweep.grid.width()) / 2;
                    int sx = x - inset;
                    int sy = y - inset;
                    if (sx >= 0 && sy >= 0 && sx < sweep.grid.width() && sy < sweep.grid.width()) {
                        byte value = sweep.planes[d][sy * sweep.grid.width() + sx];
                        if (value != SweepEvidence.VOID) {
                            series[n++] = value;
                        }
                    }
                }
                if (n >= FEWEST) {
                    Arrays.sort(series, 0, n);
                    median[y * grid.width() + x] = series[(n - 1) / 2];
                }
            }
        }
        return median;
    }

    /** The highest of the neighbouring pixels and directions, less the slack, never below 0. */
    private static byte[] widened(byte[][] median, int d, int width) {
        byte[] wide = new byte[width * width];
        byte[] own = median[d];
        byte[] left = median[(d + Orientations.SIGNED - 1) % Orientations.SIGNED];
        byte[] right = median[(d + 1) % Orientations.SIGNED];
        byte[] most = new byte[wide.length];
        for (int i = 0; i < most.length; i++) {
            most[i] = (byte) Math.max(own[i], Math.max(left[i], right[i]));
        }
        int slack = Math.round(SLACK * SweepEvidence.UNITS);
        for (int y = 0; y < width; y++) {
            for (int x = 0; x < width; x++) {
                int highest = 0;
                for (int k = Math.max(0, y - 1); k <= Math.min(width - 1, y + 1); k++) {
                    for (int j = Math.max(0, x - 1); j <= Math.min(width - 1, x + 1); j++) {
                        highest = Math.max(highest, most[k * width + j]);
                    }
                }
                wide[y * width + x] = (byte) Math.max(0, highest - slack);
            }
        }
        return wide;
    }

    /** A sweep's evidence in one direction with what stays taken away, in the units of {@link SweepEvidence}. */
    byte[] less(SweepEvidence sweep, int d) {
        if (level == null) {
            return sweep.planes[d];
        }
        int width = sweep.grid.width();
        int inset = (grid.width() - width) / 2;
        byte[] result = sweep.planes[d].clone();
        for (int y = 0; y < width; y++) {
            int from = (y + inset) * grid.width() + inset;
            for (int x = 0; x < width; x++) {
                byte value = result[y * width + x];
                if (value != SweepEvidence.VOID) {
                    result[y * width + x] = (byte) Math.max(-2 * SweepEvidence.UNITS, value - level[d][from + x]);
                }
            }
        }
        return result;
    }
}
