package hemline.detection;

import hemline.numerics.DistanceMap;

/**
 * Where rain is, and how far from it each pixel lies. Rain is what a disc fits into: one of 1.6 km above 19 dBZ or one
 * of 0.75 km above 29 dBZ; a thin line is narrower than the one and weaker than the other (thresholds: common practice,
 * no source).
 */
final class RainMap {
    private static final float WIDE_DBZ = 19;
    private static final double WIDE_KM = 1.6;
    private static final float STRONG_DBZ = 29;
    private static final double STRONG_KM = 0.75;

    private final PlaneGrid grid;
    private final float[] pixels;

    private RainMap(PlaneGrid grid, float[] pixels) {
        this.grid = grid;
        this.pixels = pixels;
    }

    static RainMap of(SweepRaster raster) {
        PlaneGrid grid = raster.grid();
        float[] wide = distanceFromOpening(raster, WIDE_DBZ, WIDE_KM / grid.spacingKm());
        float[] strong = distanceFromOpening(raster, STRONG_DBZ, STRONG_KM / grid.spacingKm());
        for (int i = 0; i < wide.length; i++) {
            wide[i] = Math.min(wide[i], strong[i]);
        }
        return new RainMap(grid, wide);
    }

    /** Distance in pixels from what is left of {@code dbz > limit} after opening by a disc. */
    private static float[] distanceFromOpening(SweepRaster raster, float limit, double radius) {
        int width = raster.grid().width();
        boolean[] outside = new boolean[raster.grid().size()];
        boolean any = false;
        for (int i = 0; i < outside.length; i++) {
            outside[i] = !(raster.weight()[i] > 0 && raster.dbz()[i] > limit);
            any |= !outside[i];
        }
        if (!any) {
            float[] far = new float[outside.length];
            java.util.Arrays.fill(far, 1e6f);
            return far;
        }
        float[] depth = DistanceMap.of(outside, width, width);
        boolean[] core = new boolean[outside.length];
        for (int i = 0; i < core.length; i++) {
            core[i] = depth[i] > radius;
        }
        float[] distance = DistanceMap.of(core, width, width);
        for (int i = 0; i < distance.length; i++) {
            distance[i] = (float) Math.max(0, distance[i] - radius);
        }
        return distance;
    }

    /** Distance from rain, km; 0 within it. */
    float distanceKm(int pixel) {
        return pixels[pixel] * (float) grid.spacingKm();
    }

    /** Distance from rain of a place, km; within the plane. */
    double distanceKm(double xKm, double yKm) {
        int column = clamp(Math.rint(grid.index(xKm)));
        int row = clamp(Math.rint(grid.index(yKm)));
        return distanceKm(row * grid.width() + column);
    }

    private int clamp(double index) {
        return (int) Math.max(0, Math.min(grid.width() - 1, index));
    }
}
