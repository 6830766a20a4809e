package hemline.reader;

import java.util.Arrays;

/**
 * Direction and time of the rays of a sweep in the order of the file.
 *
 * @param azimuthDeg   centre azimuth, degrees; any turn; NaN where unknown
 * @param elevationDeg elevation, degrees
 * @param timeMs       ms since 1970-01-01T00:00Z
 */
record RayTable(double[] azimuthDeg, double[] elevationDeg, long[] timeMs) {
    int rays() {
        return azimuthDeg.length;
    }

    /** The median elevation, degrees; the mean of the two middle values of an even number, as is usual. */
    double medianElevationDeg() {
        double[] sorted = Arrays.stream(elevationDeg).filter(Double::isFinite).sorted().toArray();
        if (sorted.length == 0) {
            return Double.NaN;
        }
        int middle = sorted.length / 2;
        return sorted.length % 2 == 1 ? sorted[middle] : (sorted[middle - 1] + sorted[middle]) / 2;
    }

    long firstTimeMs() {
        return Arrays.stream(timeMs).min().orElseThrow();
    }

    long lastTimeMs() {
        return Arrays.stream(timeMs).max().orElseThrow();
    }
}
