package hemline.numerics;

/**
 * Sums along parallel slanted lines of a square plane, by running sums: the cost does not grow with their length, and
 * every access is to whole rows in order. A line through pixel {@code (x, y)} passes {@code (x + rint(m(y′ − c)) −
 * rint(m(y − c)), y′)}, c the middle row, so that lines keep to themselves and a plane turned by 180° gives the same.
 */
public final class SlantedMean {
    private final int width;
    private final int[] shift;
    private final int most;
    private final float[] sums;

    /**
     * @param width pixels a side
     * @param slope pixels of x for a pixel of y, −1 to 1
     */
    public SlantedMean(int width, double slope) {
        if (!(Math.abs(slope) <= 1 + 1e-9)) {
            throw new IllegalArgumentException("the slope must be within -1..1, got " + slope);
        }
        this.width = width;
        shift = new int[width];
        int widest = 0;
        for (int y = 0; y < width; y++) {
            shift[y] = (int) Math.rint(slope * (y - (width - 1) / 2.0));
            widest = Math.max(widest, Math.abs(shift[y]));
        }
        most = widest;
        sums = new float[width + 2 * most];
    }

    /** Sums over {@code 2 half + 1} rows of the line through each pixel; outside counts as zero. */
    public void sum(float[] in, float[] out, int half) {
        java.util.Arrays.fill(sums, 0);
        for (int y = 0; y < Math.min(half, width); y++) {
            add(in, y);
        }
        for (int y = 0; y < width; y++) {
            if (y + half < width) {
                add(in, y + half);
            }
            if (y - half - 1 >= 0) {
                subtract(in, y - half - 1);
            }
            System.arraycopy(sums, most - shift[y], out, y * width, width);
        }
    }

    private void add(float[] in, int y) {
        int to = most - shift[y];
        int from = y * width;
        for (int x = 0; x < width; x++) {
            sums[to + x] += in[from + x];
        }
    }

    private void subtract(float[] in, int y) {
        int to = most - shift[y];
        int from = y * width;
        for (int x = 0; x < width; x++) {
            sums[to + x] -= in[from + x];
        }
    }
}
