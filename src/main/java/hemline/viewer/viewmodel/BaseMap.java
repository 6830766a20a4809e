package hemline.viewer.viewmodel;

import hemline.geodesy.GeoPoint;
import hemline.geodesy.LocalPlane;
import hemline.geometry.Point;
import java.io.BufferedInputStream;
import java.io.EOFException;
import java.io.IOException;
import java.io.InputStream;
import java.util.ArrayList;
import java.util.List;
import java.util.zip.GZIPInputStream;

/**
 * Coasts and borders round a radar. Coasts and countries are those of Natural Earth at 1:10 million, borders of the
 * United States' states those of the U.S. Census Bureau, both in the public domain, thinned to 0.002 degrees; the
 * file's form and how it is made are in {@code docs/base-lines}.
 */
public final class BaseMap {
    /** To be shown wherever the base map is published. */
    public static final String ATTRIBUTION = "Made with Natural Earth; state borders: U.S. Census Bureau";
    private static final String RESOURCE = "/hemline/viewer/base-lines.bin.gz";
    private static final int MOST_POINTS = 1_000_000;
    private static final double UNIT_DEG = 1e-4;
    private static final double LONGEST_STEP_DEG = 0.25;
    private static final double KM_PER_DEG = 111.2;

    private BaseMap() {
    }

    /**
     * The lines within about {@code reachKm} of a radar.
     *
     * @throws IOException if the program's own file is damaged
     */
    public static List<MapLine> near(GeoPoint radar, double reachKm) throws IOException {
        LocalPlane plane = new LocalPlane(radar);
        List<MapLine> lines = new ArrayList<>();
        try (InputStream packed = BaseMap.class.getResourceAsStream(RESOURCE);
             InputStream in = new BufferedInputStream(new GZIPInputStream(packed), 1 << 16)) {
            for (int kind = in.read(); kind > 0; kind = in.read()) {
                int points = number(in);
                if (kind > MapLine.Kind.OWN.ordinal() || points < 2 || points > MOST_POINTS) {
                    throw new IOException(RESOURCE + " is damaged: line of kind " + kind + " with " + points
                            + " points");
                }
                double[] longitude = new double[points];
                double[] latitude = new double[points];
                int x = 0;
                int y = 0;
                for (int i = 0; i < points; i++) {
                    x += number(in);
                    y += number(in);
                    longitude[i] = UNIT_DEG * x;
                    latitude[i] = UNIT_DEG * y;
                }
                take(lines, MapLine.Kind.values()[kind - 1], plane, latitude, longitude, reachKm);
            }
        }
        return lines;
    }

    /**
     * Adds the stretches of a line that lie near the radar, each with one point beyond at either end. Between its
     * points a line is straight in longitude and latitude (RFC 7946, section 3.1.1), so a long step is divided.
     */
    static void take(List<MapLine> into, MapLine.Kind kind, LocalPlane plane, double[] latitudes, double[] longitudes,
                     double reachKm) {
        int[] parts = new int[latitudes.length];
        int points = 1;
        for (int i = 1; i < latitudes.length; i++) {
            double step = Math.max(Math.abs(latitudes[i] - latitudes[i - 1]),
                    Math.abs(longitudes[i] - longitudes[i - 1]));
            parts[i] = (int) Math.max(1, Math.ceil(step / LONGEST_STEP_DEG));
            points += parts[i];
        }
        double[] latitude = new double[points];
        double[] longitude = new double[points];
        latitude[0] = latitudes[0];
        longitude[0] = longitudes[0];
        int filled = 1;
        for (int i = 1; i < latitudes.length; i++) {
            for (int part = 1; part <= parts[i]; part++) {
                double share = (double) part / parts[i];
                latitude[filled] = latitudes[i - 1] + share * (latitudes[i] - latitudes[i - 1]);
                longitude[filled++] = longitudes[i - 1] + share * (longitudes[i] - longitudes[i - 1]);
            }
        }
        takeNear(into, kind, plane, latitude, longitude, reachKm);
    }

    private static void takeNear(List<MapLine> into, MapLine.Kind kind, LocalPlane plane, double[] latitude,
                                 double[] longitude, double reachKm) {
        int start = -1;
        for (int i = 0; i <= latitude.length; i++) {
            boolean near = i < latitude.length && isNear(plane.centre(), latitude[i], longitude[i], reachKm);
            if (near && start < 0) {
                start = Math.max(0, i - 1);
            } else if (!near && start >= 0) {
                int end = Math.min(latitude.length - 1, i);
                if (end > start) {
                    into.add(projected(kind, plane, latitude, longitude, start, end));
                }
                start = -1;
            }
        }
    }

    private static boolean isNear(GeoPoint radar, double latitude, double longitude, double reachKm) {
        double north = (latitude - radar.latitudeDeg()) * KM_PER_DEG;
        double turn = Math.abs(longitude - radar.longitudeDeg()) % 360;
        double east = Math.min(turn, 360 - turn) * KM_PER_DEG * Math.cos(Math.toRadians(radar.latitudeDeg()));
        return Math.abs(north) < reachKm && Math.abs(east) < reachKm;
    }

    private static MapLine projected(MapLine.Kind kind, LocalPlane plane, double[] latitude, double[] longitude,
                                     int from, int to) {
        double[] x = new double[to - from + 1];
        double[] y = new double[to - from + 1];
        for (int i = 0; i < x.length; i++) {
            double turned = (longitude[from + i] + 540) % 360 - 180;
            Point at = plane.toPlane(new GeoPoint(Math.max(-90, Math.min(90, latitude[from + i])), turned));
            x[i] = at.xKm();
            y[i] = at.yKm();
        }
        return new MapLine(kind, x, y);
    }

    /** A variable-length integer, seven bits a byte, lowest first, negative numbers folded between the positive. */
    private static int number(InputStream in) throws IOException {
        int value = 0;
        for (int shift = 0; shift < 32; shift += 7) {
            int next = in.read();
            if (next < 0) {
                throw new EOFException(RESOURCE + " ends within a line");
            }
            value |= (next & 127) << shift;
            if (next < 128) {
                return value >>> 1 ^ -(value & 1);
            }
        }
        throw new IOException(RESOURCE + " holds a number of more than 32 bits");
    }
}
