package hemline.screening;

import java.util.Arrays;

/** A quantile of what lies around each cell of a polar map, from histograms of tiles some kilometres wide. */
final class Surroundings {
    private static final int LEVELS = 256;

    private Surroundings() {
    }

    /**
     * @param map   {@code [360][bins]} dBZ, NaN where unknown
     * @param halfWidthKm half width of the neighbourhood, km
     * @param share the quantile, 0 to 1
     * @return {@code [360][bins]} dBZ; NaN where nothing around is known
     */
    static float[] quantile(float[] map, int bins, double binKm, double halfWidthKm, double share) {
        int rows = PolarMap.AZIMUTHS;
        float[] result = new float[map.length];
        int tileBins = Math.max(1, (int) Math.round(halfWidthKm / binKm / 2));
        for (int from = 0; from < bins; from += tileBins) {
            int to = Math.min(bins, from + tileBins);
            double rangeKm = Math.max(1, (from + to) / 2.0 * binKm);
            int halfRows = (int) Math.max(1, Math.min(rows / 2 - 1, Math.toDegrees(halfWidthKm / rangeKm)));
            int low = Math.max(0, from - tileBins / 2 - tileBins);
            int high = Math.min(bins, to + tileBins / 2 + tileBins);
            slide(map, bins, low, high, halfRows, share, result, from, to);
        }
        return result;
    }

    private static void slide(float[] map, int bins, int low, int high, int halfRows, double share, float[] result,
                              int from, int to) {
        int rows = PolarMap.AZIMUTHS;
        int[] counts = new int[LEVELS];
        int total = 0;
        for (int a = -halfRows; a <= halfRows; a++) {
            total += add(map, Math.floorMod(a, rows) * bins, low, high, counts, 1);
        }
        for (int a = 0; a < rows; a++) {
            float value = Float.NaN;
            if (total > 0) {
                int wanted = (int) (share * (total - 1));
                int level = 0;
                for (int seen = counts[0]; seen <= wanted; seen += counts[level]) {
                    level++;
                }
                value = level / 2f - 40;
            }
            Arrays.fill(result, a * bins + from, a * bins + to, value);
            total -= add(map, Math.floorMod(a - halfRows, rows) * bins, low, high, counts, -1);
            total += add(map, Math.floorMod(a + halfRows + 1, rows) * bins, low, high, counts, 1);
        }
    }

    private static int add(float[] map, int row, int low, int high, int[] counts, int sign) {
        int n = 0;
        for (int b = low; b < high; b++) {
            float value = map[row + b];
            if (!Float.isNaN(value)) {
                counts[Math.max(0, Math.min(LEVELS - 1, Math.round(2 * (value + 40))))] += sign;
                n++;
            }
        }
        return n;
    }
}
