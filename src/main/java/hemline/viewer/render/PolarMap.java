package hemline.viewer.render;

import hemline.geometry.Point;
import hemline.viewer.viewmodel.ViewTransform;

/**
 * For every pixel of a view, which direction and ground range it looks at, in fine bins; made once a view and used
 * for every sweep. Row by row from the top; pixel centres count.
 */
final class PolarMap {
    /** Bins of azimuth round the compass: 0.01° each. */
    static final int AZIMUTH_BINS = 36_000;
    /** Length of a bin of ground range, m. */
    static final int RANGE_BIN_M = 10;
    /** Bins of range; the last one stands for everything further out, 655 km. */
    static final int RANGE_BINS = 65_536;

    private final int width;
    private final int height;
    private final double pixelsPerUnit;
    private final int[] bins;

    /** @param pixelsPerUnit device pixels a unit of the view, 1 on an ordinary screen */
    PolarMap(ViewTransform view, double pixelsPerUnit) {
        this.pixelsPerUnit = pixelsPerUnit;
        width = (int) Math.ceil(view.widthPx() * pixelsPerUnit);
        height = (int) Math.ceil(view.heightPx() * pixelsPerUnit);
        bins = new int[width * height];
        double kmPerPixel = 1 / (view.pxPerKm() * pixelsPerUnit);
        Point corner = view.toPlane(0, 0);
        for (int row = 0; row < height; row++) {
            double north = corner.yKm() - (row + 0.5) * kmPerPixel;
            int at = row * width;
            for (int column = 0; column < width; column++) {
                double east = corner.xKm() + (column + 0.5) * kmPerPixel;
                double rangeM = 1000 * Math.sqrt(east * east + north * north);
                int range = Math.min(RANGE_BINS - 1, (int) (rangeM / RANGE_BIN_M));
                int azimuth = (int) (FastAngle.bearingDeg(east, north) * (AZIMUTH_BINS / 360.0));
                bins[at + column] = azimuth << 16 | range;
            }
        }
    }

    int width() {
        return width;
    }

    double pixelsPerUnit() {
        return pixelsPerUnit;
    }

    int height() {
        return height;
    }

    /** Azimuth bin in the upper 16 bits, range bin in the lower. */
    int[] bins() {
        return bins;
    }
}
