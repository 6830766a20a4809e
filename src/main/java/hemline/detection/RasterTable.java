package hemline.detection;

/**
 * Where each pixel of a grid lies in polar space: the same for all sweeps on the grid, so it is made once. Azimuths are
 * kept in steps of 1/20°, ranges as fractions of the range bins.
 */
final class RasterTable {
    /** Steps of azimuth in a turn. */
    static final int AZIMUTH_STEPS = 7200;

    final PlaneGrid grid;
    final int bins;
    final short[] azimuthStep;
    /** Range in bins, 0 at the centre of the first; beyond the last bin where the pixel is too far. */
    final float[] bin;

    RasterTable(PlaneGrid grid) {
        this.grid = grid;
        bins = grid.width() / 2;
        azimuthStep = new short[grid.size()];
        bin = new float[grid.size()];
        int width = grid.width();
        for (int y = 0; y < width; y++) {
            double north = grid.km(y);
            for (int x = 0; x < width; x++) {
                double east = grid.km(x);
                double turn = Math.toDegrees(Math.atan2(east, north));
                turn = turn < 0 ? turn + 360 : turn;
                azimuthStep[y * width + x] = (short) Math.min(AZIMUTH_STEPS - 1, (int) (turn * AZIMUTH_STEPS / 360));
                bin[y * width + x] = (float) Math.max(0, Math.hypot(east, north) / grid.spacingKm() - 0.5);
            }
        }
    }
}
