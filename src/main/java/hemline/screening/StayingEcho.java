package hemline.screening;

import java.util.Arrays;
import java.util.List;

/**
 * Cells of the polar map whose echo stays: strong in the weakest quarter of the time, and well over what lies around.
 *
 * <p>The weakest quarter and not the median: with the median, rain that trails a front which passed early counts as
 * staying.
 */
final class StayingEcho {
    private static final double LEAST_DBZ = 8;
    /** Half width of the surroundings, km. */
    private static final double AROUND_KM = 9;
    private static final double AROUND_SHARE = 0.4;
    private static final double WIDE_KM = 4;

    private final int bins;
    private final boolean[] stays;

    private StayingEcho(int bins, boolean[] stays) {
        this.bins = bins;
        this.stays = stays;
    }

    static StayingEcho none() {
        return new StayingEcho(0, new boolean[0]);
    }

    static StayingEcho learn(List<PolarMap> maps, double overDb) {
        int bins = maps.stream().mapToInt(map -> map.bins).max().orElse(0);
        int cells = PolarMap.AZIMUTHS * bins;
        float[] low = new float[cells];
        float[] middle = new float[cells];
        byte[] series = new byte[maps.size()];
        for (int a = 0; a < PolarMap.AZIMUTHS; a++) {
            for (int b = 0; b < bins; b++) {
                int n = 0;
                for (PolarMap map : maps) {
                    byte value = map.halfDb(a, b);
                    if (value != PolarMap.NONE) {
                        series[n++] = value;
                    }
                }
                boolean enough = n >= Screening.FEWEST_FOR_STAYING;
                if (enough) {
                    Arrays.sort(series, 0, n);
                }
                low[a * bins + b] = enough ? series[(n - 1) / 4] / 2f : Float.NaN;
                middle[a * bins + b] = enough ? series[(n - 1) / 2] / 2f : Float.NaN;
            }
        }
        float[] around = Surroundings.quantile(middle, bins, PolarMap.BIN_M / 1000, AROUND_KM, AROUND_SHARE);
        boolean[] core = new boolean[cells];
        for (int i = 0; i < cells; i++) {
            core[i] = low[i] > LEAST_DBZ && low[i] > around[i] + overDb;
        }
        dropWide(core, bins);
        return new StayingEcho(bins, grown(core, bins));
    }

    /** Areas that a square of {@link #WIDE_KM} fits into are rain that stands still, not ground. */
    private static void dropWide(boolean[] core, int bins) {
        boolean[] inner = new boolean[core.length];
        int half = (int) Math.round(WIDE_KM * 500 / PolarMap.BIN_M);
        for (int b = half; b + half < bins; b++) {
            double rangeKm = (b + 0.5) * PolarMap.BIN_M / 1000;
            int halfRows = (int) Math.max(1, Math.round(Math.toDegrees(WIDE_KM / 2 / rangeKm)));
            for (int a = 0; a < PolarMap.AZIMUTHS && halfRows < PolarMap.AZIMUTHS / 8; a++) {
                inner[a * bins + b] = full(core, bins, a, b, halfRows, half);
            }
        }
        for (int a = 0; a < PolarMap.AZIMUTHS; a++) {
            for (int b = half; b + half < bins; b++) {
                if (inner[a * bins + b]) {
                    double rangeKm = (b + 0.5) * PolarMap.BIN_M / 1000;
                    int halfRows = (int) Math.max(1, Math.round(Math.toDegrees(WIDE_KM / rangeKm)));
                    for (int da = -halfRows; da <= halfRows; da++) {
                        int row = Math.floorMod(a + da, PolarMap.AZIMUTHS) * bins;
                        Arrays.fill(core, row + Math.max(0, b - 2 * half), row + Math.min(bins, b + 2 * half + 1), false);
                    }
                }
            }
        }
    }

    private static boolean full(boolean[] core, int bins, int azimuth, int bin, int halfRows, int halfBins) {
        for (int da = -halfRows; da <= halfRows; da++) {
            int row = Math.floorMod(azimuth + da, PolarMap.AZIMUTHS) * bins;
            for (int b = bin - halfBins; b <= bin + halfBins; b++) {
                if (!core[row + b]) {
                    return false;
                }
            }
        }
        return true;
    }

    /** One cell wider all round: the neighbours of clutter are half clutter. */
    private static boolean[] grown(boolean[] core, int bins) {
        boolean[] wide = new boolean[core.length];
        for (int a = 0; a < PolarMap.AZIMUTHS; a++) {
            for (int b = 0; b < bins; b++) {
                if (!core[a * bins + b]) {
                    continue;
                }
                for (int da = -1; da <= 1; da++) {
                    int row = Math.floorMod(a + da, PolarMap.AZIMUTHS) * bins;
                    for (int db = -1; db <= 1; db++) {
                        if (b + db >= 0 && b + db < bins) {
                            wide[row + b + db] = true;
                        }
                    }
                }
            }
        }
        return wide;
    }

    boolean at(double azimuthDeg, double slantRangeM) {
        int bin = (int) Math.floor(slantRangeM / PolarMap.BIN_M);
        return bin >= 0 && bin < bins && stays[Math.min(359, (int) azimuthDeg) * bins + bin];
    }
}
