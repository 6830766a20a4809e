package hemline.viewer.render;

/** Compass bearings fast enough for every pixel of a view. */
final class FastAngle {
    private FastAngle() {
    }

    /**
     * Compass bearing of a displacement, degrees in [0, 360), within 0.0007° of the exact one. Minimax polynomial of
     * the arctangent on [0, 1] after Abramowitz and Stegun (1964), Handbook of Mathematical Functions, eq. 4.4.49.
     */
    static double bearingDeg(double east, double north) {
        double ax = Math.abs(east);
        double ay = Math.abs(north);
        double larger = Math.max(ax, ay);
        if (larger == 0) {
            return 0;
        }
        double t = Math.min(ax, ay) / larger;
        double s = t * t;
        double angle = t * (0.9998660 + s * (-0.3302995 + s * (0.1801410 + s * (-0.0851330 + s * 0.0208351))));
        double degrees = angle * (180 / Math.PI);
        if (ax > ay) {
            degrees = 90 - degrees;
        }
        if (north < 0) {
            degrees = 180 - degrees;
        }
        if (east < 0) {
            degrees = 360 - degrees;
        }
        return degrees >= 360 ? 0 : degrees;
    }
}
