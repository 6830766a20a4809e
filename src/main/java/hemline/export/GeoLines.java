package hemline.export;

import hemline.geodesy.GeoPoint;
import java.util.ArrayList;
import java.util.List;

/**
 * Lines on the ellipsoid cut where they cross the antimeridian, as RFC 7946 section 3.1.9 asks, and their bounding
 * box, whose west may lie east of its east there (section 5.2).
 */
final class GeoLines {
    private final List<List<double[]>> parts = new ArrayList<>();
    private double south = Double.POSITIVE_INFINITY;
    private double north = Double.NEGATIVE_INFINITY;
    /** Extent in longitudes unrolled around the first point, so that it does not jump at ±180. */
    private double west = Double.POSITIVE_INFINITY;
    private double east = Double.NEGATIVE_INFINITY;
    private double anchor = Double.NaN;

    /** Adds one line of at least two points. */
    void add(List<GeoPoint> line) {
        List<double[]> part = new ArrayList<>();
        GeoPoint before = null;
        for (GeoPoint point : line) {
            if (before != null && Math.abs(point.longitudeDeg() - before.longitudeDeg()) > 180) {
                double side = before.longitudeDeg() > 0 ? 180 : -180;
                double latitude = latitudeAtCut(before, point, side);
                append(part, side, latitude);
                flush(part);
                part = new ArrayList<>();
                append(part, -side, latitude);
            }
            append(part, point.longitudeDeg(), point.latitudeDeg());
            before = point;
        }
        flush(part);
    }

    private static double latitudeAtCut(GeoPoint from, GeoPoint to, double side) {
        double unrolled = to.longitudeDeg() + 2 * side;
        double share = (side - from.longitudeDeg()) / (unrolled - from.longitudeDeg());
        return from.latitudeDeg() + share * (to.latitudeDeg() - from.latitudeDeg());
    }

    private void append(List<double[]> part, double longitude, double latitude) {
        double[] place = {Numbers.rounded(longitude, 6), Numbers.rounded(latitude, 6)};
        if (!part.isEmpty() && java.util.Arrays.equals(part.get(part.size() - 1), place)) {
            return;
        }
        part.add(place);
        if (Double.isNaN(anchor)) {
            anchor = place[0];
        }
        double near = place[0] + 360 * Math.rint((anchor - place[0]) / 360);
        west = Math.min(west, near);
        east = Math.max(east, near);
        south = Math.min(south, place[1]);
        north = Math.max(north, place[1]);
    }

    private void flush(List<double[]> part) {
        if (part.size() > 1) {
            parts.add(part);
        }
    }

    /** Each part as {@code {longitude, latitude}} pairs, degrees rounded to 6 decimals. */
    List<List<double[]>> parts() {
        return parts;
    }

    boolean isEmpty() {
        return parts.isEmpty();
    }

    /** {@code {west, south, east, north}}, degrees. */
    double[] box() {
        return new double[] {rolled(west), south, rolled(east), north};
    }

    private static double rolled(double longitude) {
        double turned = longitude - 360 * Math.rint(longitude / 360);
        return Numbers.rounded(turned, 6);
    }
}
