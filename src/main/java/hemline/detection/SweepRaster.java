package hemline.detection;

/**
 * One sweep on the plane, {@code [row][column]} as flat floats.
 *
 * @param grid      the pixels
 * @param dbz       reflectivity, dBZ; below detection at the noise floor; 0 where the weight is 0
 * @param weight    how far a pixel was measured, 0 to 1
 * @param undetect  share of the measured gates that held no echo, 0 to 1
 */
record SweepRaster(PlaneGrid grid, float[] dbz, float[] weight, float[] undetect) {
}
