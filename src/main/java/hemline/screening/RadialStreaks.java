package hemline.screening;

import java.util.Arrays;

/**
 * Narrow radial streaks: interference, the sun, other transmitters. A ray's kilometre is streaky when it stands
 * 4 dB over both the sectors 2.5° to its left and right; a stretch is a streak when more than 65 % of 40 km is streaky,
 * a whole ray when more than 40 % of it beyond 20 km is. Wide rain stands over neither side and survives; so does a line
 * that happens to lie along the beam, for its reflectivity does not rise with range as that of constant power does (Peter,
 * Seltmann et al. 2013; Huuskonen and Holleman 2007).
 */
final class RadialStreaks {
    private static final float OVER_DB = 4;
    private static final double SIDE_DEG = 2.5;
    private static final double SIDE_HALF_DEG = 0.75;
    private static final double WINDOW_SHARE = 0.65;
    private static final double RAY_SHARE = 0.4;
    private static final int WINDOW_KM = 40;
    private static final int FROM_KM = 20;
    private static final int LEAST_POWER_KM = 5;
    private static final double LEAST_SLOPE_DB = 9;

    private final PolarGates polar;
    private final int cells;
    private final float[] km;

    private RadialStreaks(PolarGates polar) {
        this.polar = polar;
        this.cells = (int) Math.max(1, Math.ceil(polar.sweep.slantRangeM(polar.gates - 1) / 1000));
        this.km = new float[polar.rays * cells];
        kilometreMeans();
    }

    /** Whether each gate {@code [ray][gate]} lies in a streak. */
    static boolean[] find(PolarGates polar) {
        boolean[] streak = new boolean[polar.rays * polar.gates];
        if (polar.raySpacingDeg() > SIDE_DEG) {
            return streak;
        }
        RadialStreaks finder = new RadialStreaks(polar);
        boolean[] found = finder.streaks();
        for (int r = 0; r < polar.rays; r++) {
            for (int g = 0; g < polar.gates; g++) {
                int cell = finder.cellOf(g);
                if (cell >= 0 && found[r * finder.cells + cell]) {
                    streak[r * polar.gates + g] = true;
                }
            }
        }
        return streak;
    }

    private int cellOf(int gate) {
        double range = polar.sweep.slantRangeM(gate);
        return range < 0 ? -1 : Math.min(cells - 1, (int) (range / 1000));
    }

    private void kilometreMeans() {
        int[] count = new int[cells];
        for (int r = 0; r < polar.rays; r++) {
            Arrays.fill(count, 0);
            int row = r * cells;
            for (int g = 0; g < polar.gates; g++) {
                float value = polar.dbz[r * polar.gates + g];
                int cell = cellOf(g);
                if (cell >= 0 && !Float.isNaN(value)) {
                    km[row + cell] += value;
                    count[cell]++;
                }
            }
            for (int c = 0; c < cells; c++) {
                km[row + c] = count[c] > 0 ? km[row + c] / count[c] : Float.NaN;
            }
        }
    }

    private boolean[] streaks() {
        double spacing = polar.raySpacingDeg();
        int near = (int) Math.max(1, Math.round((SIDE_DEG - SIDE_HALF_DEG) / spacing));
        int far = (int) Math.max(near, Math.round((SIDE_DEG + SIDE_HALF_DEG) / spacing));
        boolean[] found = new boolean[polar.rays * cells];
        boolean[] over = new boolean[cells];
        for (int r = 0; r < polar.rays; r++) {
            for (int c = 0; c < cells; c++) {
                float side = Math.max(sideMean(r, c, -far, -near), sideMean(r, c, near, far));
                over[c] = km[r * cells + c] > side + OVER_DB;
            }
            markRay(over, r, found);
        }
        return widened(found);
    }

    /** Mean of the rays {@code from}…{@code to} from ray {@code r}; NaN when none of them was measured. */
    private float sideMean(int r, int cell, int from, int to) {
        float sum = 0;
        int n = 0;
        for (int d = from; d <= to; d++) {
            float value = km[Math.floorMod(r + d, polar.rays) * cells + cell];
            if (!Float.isNaN(value)) {
                sum += value;
                n++;
            }
        }
        return n == 0 ? Float.NaN : sum / n;
    }

    private void markRay(boolean[] over, int r, boolean[] found) {
        int beyond = 0;
        for (int c = FROM_KM; c < cells; c++) {
            beyond += over[c] ? 1 : 0;
        }
        boolean whole = cells - FROM_KM >= WINDOW_KM && beyond > RAY_SHARE * (cells - FROM_KM);
        if (whole && constantPower(over, r, 0, cells)) {
            Arrays.fill(found, r * cells, (r + 1) * cells, true);
            return;
        }
        int inWindow = 0;
        for (int c = 0; c < cells; c++) {
            inWindow += over[c] ? 1 : 0;
            inWindow -= c >= WINDOW_KM && over[c - WINDOW_KM] ? 1 : 0;
            if (c >= WINDOW_KM - 1 && inWindow > WINDOW_SHARE * WINDOW_KM
                    && constantPower(over, r, c - WINDOW_KM + 1, c + 1)) {
                for (int k = c - WINDOW_KM + 1; k <= c; k++) {
                    found[r * cells + k] |= over[k];
                }
            }
        }
    }

    /** Whether reflectivity rises along the streak as constant power would make it: 20 dB a decade of range. */
    private boolean constantPower(boolean[] over, int r, int from, int to) {
        double n = 0;
        double sx = 0;
        double sy = 0;
        double sxx = 0;
        double sxy = 0;
        for (int c = Math.max(from, LEAST_POWER_KM); c < to; c++) {
            if (over[c]) {
                double x = Math.log10(c + 0.5);
                double y = km[r * cells + c];
                n++;
                sx += x;
                sy += y;
                sxx += x * x;
                sxy += x * y;
            }
        }
        double spread = n * sxx - sx * sx;
        return n >= 5 && spread > 0 && (n * sxy - sx * sy) / spread > LEAST_SLOPE_DB;
    }

    private boolean[] widened(boolean[] found) {
        boolean[] wide = new boolean[found.length];
        for (int r = 0; r < polar.rays; r++) {
            int left = Math.floorMod(r - 1, polar.rays) * cells;
            int right = Math.floorMod(r + 1, polar.rays) * cells;
            for (int c = 0; c < cells; c++) {
                wide[r * cells + c] = found[r * cells + c] || found[left + c] || found[right + c];
            }
        }
        return wide;
    }
}
