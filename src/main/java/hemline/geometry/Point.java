package hemline.geometry;

/**
 * A place, or a displacement, on the radar's plane.
 *
 * @param xKm km east of the radar
 * @param yKm km north of the radar
 */
public record Point(double xKm, double yKm) {

    public Point plus(Point other) {
        return new Point(xKm + other.xKm, yKm + other.yKm);
    }

    public Point minus(Point other) {
        return new Point(xKm - other.xKm, yKm - other.yKm);
    }

    public Point times(double factor) {
        return new Point(factor * xKm, factor * yKm);
    }

    public double dot(Point other) {
        return xKm * other.xKm + yKm * other.yKm;
    }

    /** The component out of the plane of the cross product: positive where {@code other} lies to the left. */
    public double cross(Point other) {
        return xKm * other.yKm - yKm * other.xKm;
    }

    public double lengthKm() {
        return Math.hypot(xKm, yKm);
    }

    public double distanceKm(Point other) {
        return Math.hypot(xKm - other.xKm, yKm - other.yKm);
    }

    /** Compass bearing of this displacement, degrees clockwise from north in [0, 360); 0 for a zero displacement. */
    public double bearingDeg() {
        double bearing = Math.toDegrees(Math.atan2(xKm, yKm));
        return bearing < 0 ? bearing + 360 : bearing;
    }

    /** The unit displacement toward a compass bearing, degrees clockwise from north. */
    public static Point towards(double bearingDeg) {
        double radians = Math.toRadians(bearingDeg);
        return new Point(Math.sin(radians), Math.cos(radians));
    }
}
