package hemline.screening;

import hemline.numerics.Robust;
import java.util.Arrays;
import java.util.List;

/**
 * Sectors behind obstacles: from some range on, all through the loop, much weaker than the directions beside them.
 *
 * <p>The deficit of an azimuth is the loop's mean reflectivity in blocks of 10 km, less the median of the azimuths
 * within 20° of it. An azimuth is blocked from the first block on from which at least three in four of the outer blocks
 * lack {@link #DEFICIT_DB}; it takes three such blocks.
 */
final class BlockedSectors {
    private static final double DEFICIT_DB = 5;
    private static final int BLOCK_BINS = 20;
    private static final int AROUND_DEG = 20;
    private static final int FEWEST_BLOCKS = 3;
    /** Beyond this range most directions show nothing and a deficit cannot be told, m. */
    private static final double TO_RANGE_M = 100_000;

    /** Slant range from which each degree is blocked, m; infinite where it is not. */
    private final double[] fromM;

    private BlockedSectors(double[] fromM) {
        this.fromM = fromM;
    }

    static BlockedSectors none() {
        double[] open = new double[PolarMap.AZIMUTHS];
        Arrays.fill(open, Double.POSITIVE_INFINITY);
        return new BlockedSectors(open);
    }

    static BlockedSectors learn(List<PolarMap> maps) {
        int bins = maps.stream().mapToInt(map -> map.bins).min().orElse(0);
        int blocks = (int) Math.min(bins, TO_RANGE_M / PolarMap.BIN_M) / BLOCK_BINS;
        double[][] mean = new double[PolarMap.AZIMUTHS][blocks];
        for (int a = 0; a < PolarMap.AZIMUTHS; a++) {
            for (int k = 0; k < blocks; k++) {
                mean[a][k] = blockMean(maps, a, k);
            }
        }
        boolean[][] lacks = new boolean[PolarMap.AZIMUTHS][blocks];
        double[] around = new double[2 * AROUND_DEG + 1];
        for (int k = 0; k < blocks; k++) {
            for (int a = 0; a < PolarMap.AZIMUTHS; a++) {
                for (int d = -AROUND_DEG; d <= AROUND_DEG; d++) {
                    around[d + AROUND_DEG] = mean[Math.floorMod(a + d, PolarMap.AZIMUTHS)][k];
                }
                lacks[a][k] = mean[a][k] < Robust.median(around) - DEFICIT_DB;
            }
        }
        BlockedSectors found = none();
        for (int a = 0; a < PolarMap.AZIMUTHS; a++) {
            found.fromM[a] = firstBlocked(lacks[a]) * BLOCK_BINS * PolarMap.BIN_M;
        }
        return found;
    }

    private static double blockMean(List<PolarMap> maps, int azimuth, int block) {
        double sum = 0;
        int n = 0;
        for (PolarMap map : maps) {
            for (int b = block * BLOCK_BINS; b < (block + 1) * BLOCK_BINS; b++) {
                byte value = map.halfDb(azimuth, b);
                if (value != PolarMap.NONE) {
                    sum += Math.min(value / 2.0, 30);
                    n++;
                }
            }
        }
        return n == 0 ? Double.NaN : sum / n;
    }

    private static double firstBlocked(boolean[] lacks) {
        double first = Double.POSITIVE_INFINITY;
        int blocked = 0;
        for (int k = lacks.length - 1; k >= 0; k--) {
            blocked += lacks[k] ? 1 : 0;
            if (lacks[k] && blocked >= 0.75 * (lacks.length - k) && lacks.length - k >= FEWEST_BLOCKS) {
                first = k;
            }
        }
        return first;
    }

    boolean at(double azimuthDeg, double slantRangeM) {
        return slantRangeM >= fromM[Math.min(PolarMap.AZIMUTHS - 1, (int) azimuthDeg)];
    }
}
