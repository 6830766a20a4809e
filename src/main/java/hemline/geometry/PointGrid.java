package hemline.geometry;

import java.util.Arrays;
import java.util.HashMap;
import java.util.Map;
import java.util.function.IntConsumer;

/**
 * A range of points by square cell, so that those near a place are found without looking at all. The arrays are not
 * copied and must not change.
 */
public final class PointGrid {
    private final double cellKm;
    private final double[] x;
    private final double[] y;
    private final Map<Long, int[]> cells = new HashMap<>();

    /** Points {@code from} to {@code to} (excluded) of the arrays, km. */
    public PointGrid(double[] x, double[] y, int from, int to, double cellKm) {
        this.cellKm = cellKm;
        this.x = x;
        this.y = y;
        for (int i = from; i < to; i++) {
            int vertex = i;
            cells.merge(key(cell(x[i]), cell(y[i])), new int[] {vertex}, (old, one) -> {
                int[] more = Arrays.copyOf(old, old.length + 1);
                more[old.length] = one[0];
                return more;
            });
        }
    }

    private int cell(double km) {
        return (int) Math.floor(km / cellKm);
    }

    private static long key(int cx, int cy) {
        return ((long) cx << 32) ^ (cy & 0xffffffffL);
    }

    /** Visits, in a fixed order, every point's index within a distance of a place. */
    public void within(double atX, double atY, double radiusKm, IntConsumer visit) {
        int lowX = cell(atX - radiusKm);
        int highX = cell(atX + radiusKm);
        int lowY = cell(atY - radiusKm);
        int highY = cell(atY + radiusKm);
        for (int cx = lowX; cx <= highX; cx++) {
            for (int cy = lowY; cy <= highY; cy++) {
                int[] held = cells.get(key(cx, cy));
                if (held != null) {
                    for (int i : held) {
                        if (Math.hypot(x[i] - atX, y[i] - atY) <= radiusKm) {
                            visit.accept(i);
                        }
                    }
                }
            }
        }
    }
}
