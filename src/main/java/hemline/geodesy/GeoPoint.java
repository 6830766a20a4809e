package hemline.geodesy;

/**
 * A place on the WGS 84 ellipsoid.
 *
 * @param latitudeDeg  degrees north, −90 to 90
 * @param longitudeDeg degrees east, −180 to 180
 */
public record GeoPoint(double latitudeDeg, double longitudeDeg) {
    public GeoPoint {
        if (!(Math.abs(latitudeDeg) <= 90)) {
            throw new IllegalArgumentException("latitude must lie within -90..90 degrees, got " + latitudeDeg);
        }
        if (!(Math.abs(longitudeDeg) <= 180)) {
            throw new IllegalArgumentException("longitude must lie within -180..180 degrees, got " + longitudeDeg);
        }
    }
}
