package hemline.screening;

import hemline.sweep.MaskReason;

/**
 * Clutter by texture, for loops too short to know what stays: the mean squared difference between neighbouring gates
 * (TDBZ; Hubbert, Dixon and Ellis 2009, J. Atmos. Oceanic Technol. 26:1714) over 3 rays × 9 gates.
 */
final class RoughEcho {
    private static final float LEAST_DBZ = 8;
    /** Mean squared difference from which ground echo is common and weather is not (common practice), dB². */
    private static final float ROUGH_DB2 = 60;
    private static final int HALF_GATES = 4;

    private RoughEcho() {
    }

    static void mark(PolarGates polar, byte[] bits) {
        int gates = polar.gates;
        float[] squared = new float[gates];
        float[] sum = new float[gates];
        float[] count = new float[gates];
        boolean closed = polar.closesTheTurn();
        for (int r = 0; r < polar.rays; r++) {
            java.util.Arrays.fill(sum, 0);
            java.util.Arrays.fill(count, 0);
            for (int d = -1; d <= 1; d++) {
                int row = r + d;
                if (!closed && (row < 0 || row >= polar.rays)) {
                    continue;
                }
                row = Math.floorMod(row, polar.rays) * gates;
                for (int g = 1; g < gates; g++) {
                    float step = polar.dbz[row + g] - polar.dbz[row + g - 1];
                    squared[g] = step * step;
                }
                for (int g = 1; g < gates; g++) {
                    for (int k = Math.max(1, g - HALF_GATES); k <= Math.min(gates - 1, g + HALF_GATES); k++) {
                        if (!Float.isNaN(squared[k])) {
                            sum[g] += squared[k];
                            count[g]++;
                        }
                    }
                }
            }
            for (int g = 1; g < gates; g++) {
                if (polar.dbz[r * gates + g] > LEAST_DBZ && sum[g] > ROUGH_DB2 * count[g]) {
                    bits[r * gates + g] |= (byte) MaskReason.CLUTTER.bit();
                }
            }
        }
    }
}
