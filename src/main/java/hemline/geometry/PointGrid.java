package hemline.geometry;

import java.util.function.IntConsumer;

/**
 * A range of points by square cell, so that those near a place are found without looking at all. The arrays are not
 * copied and must not change.
 */
public final class PointGrid {
    private static final int MOST_CELLS_ACROSS = 512;

    private final double[] x;
    private final double[] y;
    private final double cellKm;
    private final double lowX;
    private final double lowY;
    private final int across;
    private final int up;
    /** First place in {@code order} of each cell, row by row; one more entry closes the last. */
    private final int[] start;
    private final int[] order;

    /** Points {@code from} to {@code to} (excluded) of the arrays, km; all finite. */
    public PointGrid(double[] x, double[] y, int from, int to, double cellKm) {
        this.x = x;
        this.y = y;
        double minX = 0;
        double minY = 0;
        double maxX = 0;
        double maxY = 0;
        for (int i = from; i < to; i++) {
            minX = i == from ? x[i] : Math.min(minX, x[i]);
            maxX = i == from ? x[i] : Math.max(maxX, x[i]);
            minY = i == from ? y[i] : Math.min(minY, y[i]);
            maxY = i == from ? y[i] : Math.max(maxY, y[i]);
        }
        lowX = minX;
        lowY = minY;
        this.cellKm = Math.max(cellKm, Math.max(maxX - minX, maxY - minY) / MOST_CELLS_ACROSS);
        across = (int) ((maxX - minX) / this.cellKm) + 1;
        up = (int) ((maxY - minY) / this.cellKm) + 1;
        start = new int[across * up + 1];
        order = new int[to - from];
        for (int i = from; i < to; i++) {
            start[cell(i) + 1]++;
        }
        for (int c = 0; c < across * up; c++) {
            start[c + 1] += start[c];
        }
        int[] next = start.clone();
        for (int i = from; i < to; i++) {
            order[next[cell(i)]++] = i;
        }
    }

    private int cell(int i) {
        return (int) ((y[i] - lowY) / cellKm) * across + (int) ((x[i] - lowX) / cellKm);
    }

    /** Visits, in a fixed order, every point's index within a distance of a place. */
    public void within(double atX, double atY, double radiusKm, IntConsumer visit) {
        int firstX = (int) Math.max(0, Math.floor((atX - radiusKm - lowX) / cellKm));
        int lastX = (int) Math.min(across - 1, Math.floor((atX + radiusKm - lowX) / cellKm));
        int firstY = (int) Math.max(0, Math.floor((atY - radiusKm - lowY) / cellKm));
        int lastY = (int) Math.min(up - 1, Math.floor((atY + radiusKm - lowY) / cellKm));
        double square = radiusKm * radiusKm;
        for (int cy = firstY; cy <= lastY; cy++) {
            int to = firstX <= lastX ? start[cy * across + lastX + 1] : 0;
            for (int k = firstX <= lastX ? start[cy * across + firstX] : 0; k < to; k++) {
                int i = order[k];
                double dx = x[i] - atX;
                double dy = y[i] - atY;
                if (dx * dx + dy * dy <= square) {
                    visit.accept(i);
                }
            }
        }
    }
}
