package hemline.detection;

import hemline.numerics.Robust;
import hemline.sweep.RayGeometry;

/**
 * The two rays about each step of azimuth and the share of the second. In a gap wider than twice the usual spacing only
 * what a ray itself covers is taken from it; the rest was not measured.
 */
final class RayLookup {
    final int[] before = new int[RasterTable.AZIMUTH_STEPS];
    final int[] after = new int[RasterTable.AZIMUTH_STEPS];
    /** Weight of the ray before. */
    final float[] weightBefore = new float[RasterTable.AZIMUTH_STEPS];
    /** Weight of the ray after; both are 0 where nothing was measured. */
    final float[] weightAfter = new float[RasterTable.AZIMUTH_STEPS];

    RayLookup(RayGeometry rays, double beamWidthDeg) {
        int n = rays.rays();
        double spacing = usualSpacingDeg(rays, beamWidthDeg);
        int next = 0;
        for (int step = 0; step < RasterTable.AZIMUTH_STEPS; step++) {
            double azimuth = (step + 0.5) * 360 / RasterTable.AZIMUTH_STEPS;
            while (next < n && rays.azimuthDeg(next) <= azimuth) {
                next++;
            }
            int low = Math.floorMod(next - 1, n);
            int high = next % n;
            double fromLow = Math.floorMod(Math.round((azimuth - rays.azimuthDeg(low)) * 1e6), 360_000_000L) / 1e6;
            double toHigh = Math.floorMod(Math.round((rays.azimuthDeg(high) - azimuth) * 1e6), 360_000_000L) / 1e6;
            before[step] = low;
            after[step] = high;
            double gap = fromLow + toHigh;
            if (gap <= 2.2 * spacing) {
                weightAfter[step] = (float) (gap > 0 ? fromLow / gap : 0);
                weightBefore[step] = 1 - weightAfter[step];
            } else {
                weightBefore[step] = fromLow <= 0.6 * spacing ? 1 : 0;
                weightAfter[step] = weightBefore[step] == 0 && toHigh <= 0.6 * spacing ? 1 : 0;
            }
        }
    }

    /** The median angle between rays, but not above one and a half beam widths: decimated rays leave holes. */
    private static double usualSpacingDeg(RayGeometry rays, double beamWidthDeg) {
        if (rays.rays() < 2) {
            return beamWidthDeg;
        }
        double[] gaps = new double[rays.rays() - 1];
        for (int r = 0; r < gaps.length; r++) {
            gaps[r] = rays.azimuthDeg(r + 1) - rays.azimuthDeg(r);
        }
        return Math.min(Math.max(Robust.median(gaps), 0.1), 1.5 * Math.max(beamWidthDeg, 0.7));
    }
}
