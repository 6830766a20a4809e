package hemline.screening;

import hemline.sweep.MaskReason;

/**
 * Isolated gates: far over the median of the 3 × 3 gates about them, or well over the noise floor with fewer than four
 * of the nine above it. A window of three gates leaves the thinnest line its echo.
 */
final class Speckle {
    private static final float OVER_MEDIAN_DB = 9;
    private static final float OVER_FLOOR_DB = 6;
    private static final int FEWEST = 4;

    private Speckle() {
    }

    static void mark(PolarGates polar, byte[] bits) {
        int rays = polar.rays;
        int gates = polar.gates;
        float[] dbz = polar.dbz;
        float[] nine = new float[9];
        boolean closed = polar.closesTheTurn();
        for (int r = 0; r < rays; r++) {
            int left = r > 0 ? r - 1 : closed ? rays - 1 : r;
            int right = r + 1 < rays ? r + 1 : closed ? 0 : r;
            for (int g = 1; g + 1 < gates; g++) {
                float value = dbz[r * gates + g];
                if (!(value > polar.floorDbz[g] + OVER_FLOOR_DB)) {
                    continue;
                }
                int n = 0;
                int echoes = 0;
                int higher = 0;
                for (int row : new int[] {left, r, right}) {
                    for (int k = row * gates + g - 1; k <= row * gates + g + 1; k++) {
                        float one = dbz[k];
                        if (!Float.isNaN(one)) {
                            nine[n++] = one;
                            echoes += one > polar.floorDbz[g] + 0.5f ? 1 : 0;
                            higher += one > value - OVER_MEDIAN_DB ? 1 : 0;
                        }
                    }
                }
                // value - 9 dB exceeds the median when fewer than half of the gates are above it
                if (2 * higher <= n || echoes < Math.min(FEWEST, n)) {
                    bits[r * gates + g] |= (byte) MaskReason.SPECKLE.bit();
                }
            }
        }
    }
}
