package hemline.numerics;

/**
 * Exact Euclidean distance of every pixel from a set, in time linear in the pixels (Felzenszwalb and Huttenlocher 2012,
 * Distance transforms of sampled functions, Theory of Computing 8:415–428).
 */
public final class DistanceMap {
    /** Stands for infinity where nothing is set, squared pixels. */
    private static final float FAR = 1e12f;

    private DistanceMap() {
    }

    /** Distances in pixels, {@code [height][width]}; 1e6 everywhere when the set is empty. */
    public static float[] of(boolean[] set, int width, int height) {
        if (set.length != (long) width * height) {
            throw new IllegalArgumentException(width + " x " + height + " pixels do not match " + set.length);
        }
        float[] squared = new float[set.length];
        for (int y = 0; y < height; y++) {
            rowDistances(set, squared, y * width, width);
        }
        int[] parabola = new int[height];
        float[] from = new float[height + 1];
        float[] column = new float[height];
        float[] result = new float[height];
        for (int x = 0; x < width; x++) {
            for (int y = 0; y < height; y++) {
                column[y] = squared[y * width + x];
            }
            lowerEnvelope(column, result, parabola, from);
            for (int y = 0; y < height; y++) {
                squared[y * width + x] = (float) Math.sqrt(result[y]);
            }
        }
        return squared;
    }

    private static void rowDistances(boolean[] set, float[] squared, int row, int width) {
        int last = Integer.MIN_VALUE;
        for (int x = 0; x < width; x++) {
            last = set[row + x] ? x : last;
            squared[row + x] = last == Integer.MIN_VALUE ? FAR : (float) (x - last) * (x - last);
        }
        last = Integer.MIN_VALUE;
        for (int x = width - 1; x >= 0; x--) {
            last = set[row + x] ? x : last;
            if (last != Integer.MIN_VALUE) {
                squared[row + x] = Math.min(squared[row + x], (float) (last - x) * (last - x));
            }
        }
    }

    private static void lowerEnvelope(float[] column, float[] result, int[] parabola, float[] from) {
        int n = column.length;
        int k = 0;
        parabola[0] = 0;
        from[0] = Float.NEGATIVE_INFINITY;
        from[1] = Float.POSITIVE_INFINITY;
        for (int q = 1; q < n; q++) {
            float crossing = crossing(column, q, parabola[k]);
            while (crossing <= from[k]) {
                k--;
                crossing = crossing(column, q, parabola[k]);
            }
            k++;
            parabola[k] = q;
            from[k] = crossing;
            from[k + 1] = Float.POSITIVE_INFINITY;
        }
        k = 0;
        for (int q = 0; q < n; q++) {
            while (from[k + 1] < q) {
                k++;
            }
            float d = q - parabola[k];
            result[q] = d * d + column[parabola[k]];
        }
    }

    private static float crossing(float[] column, int q, int p) {
        return (float) (((double) column[q] + (double) q * q - column[p] - (double) p * p) / (2.0 * q - 2 * p));
    }
}
