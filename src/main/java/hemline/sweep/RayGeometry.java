package hemline.sweep;

/**
 * Direction and time of each ray of a sweep, in order of rising azimuth.
 * Arrays are copied in; {@code azimuthDeg[ray]} lies in [0, 360) and never falls.
 */
public final class RayGeometry {
    private final double[] azimuthDeg;
    private final double[] elevationDeg;
    private final long[] timeMs;

    /**
     * @param azimuthDeg   centre azimuth, degrees clockwise from north
     * @param elevationDeg elevation above the horizon, degrees
     * @param timeMs       time of the ray's centre, ms since 1970-01-01T00:00Z
     */
    public RayGeometry(double[] azimuthDeg, double[] elevationDeg, long[] timeMs) {
        if (azimuthDeg.length < 1 || elevationDeg.length != azimuthDeg.length || timeMs.length != azimuthDeg.length) {
            throw new IllegalArgumentException("azimuths, elevations and times must be as many: " + azimuthDeg.length
                    + ", " + elevationDeg.length + ", " + timeMs.length);
        }
        for (int i = 0; i < azimuthDeg.length; i++) {
            if (!(azimuthDeg[i] >= 0 && azimuthDeg[i] < 360) || i > 0 && azimuthDeg[i] < azimuthDeg[i - 1]) {
                throw new IllegalArgumentException("azimuths must rise within [0, 360), ray " + i + " has " + azimuthDeg[i]);
            }
            if (!(Math.abs(elevationDeg[i]) <= 90)) {
                throw new IllegalArgumentException("ray " + i + " has elevation " + elevationDeg[i] + " degrees");
            }
        }
        this.azimuthDeg = azimuthDeg.clone();
        this.elevationDeg = elevationDeg.clone();
        this.timeMs = timeMs.clone();
    }

    public int rays() {
        return azimuthDeg.length;
    }

    public double azimuthDeg(int ray) {
        return azimuthDeg[ray];
    }

    public double elevationDeg(int ray) {
        return elevationDeg[ray];
    }

    public long timeMs(int ray) {
        return timeMs[ray];
    }

    /** Time of the earliest ray, ms since 1970-01-01T00:00Z. */
    public long firstMs() {
        return java.util.Arrays.stream(timeMs).min().orElseThrow();
    }

    /** Time of the latest ray, ms since 1970-01-01T00:00Z. */
    public long lastMs() {
        return java.util.Arrays.stream(timeMs).max().orElseThrow();
    }

    /** The ray whose centre is nearest to an azimuth, degrees clockwise from north; the lower index on a tie. */
    public int nearestRay(double toAzimuthDeg) {
        double wanted = ((toAzimuthDeg % 360) + 360) % 360;
        int found = java.util.Arrays.binarySearch(azimuthDeg, wanted);
        if (found >= 0) {
            return found;
        }
        int after = -found - 1;
        int above = after % azimuthDeg.length;
        int below = (after + azimuthDeg.length - 1) % azimuthDeg.length;
        return gapDeg(azimuthDeg[above], wanted) < gapDeg(azimuthDeg[below], wanted) ? above : below;
    }

    /** Unsigned angle between two azimuths, degrees in [0, 180]. */
    public static double gapDeg(double a, double b) {
        double gap = Math.abs(a - b) % 360;
        return gap > 180 ? 360 - gap : gap;
    }
}
