package hemline.export;

import hemline.geodesy.GeoPoint;
import hemline.geodesy.LocalPlane;
import hemline.geometry.Point;
import hemline.sweep.RadarSite;
import java.util.List;
import java.util.Optional;

/** Latitude and longitude of places on the plane, or not available where the radar's own place is unknown. */
final class Geolocation {
    private final Optional<LocalPlane> plane;

    Geolocation(RadarSite site) {
        plane = site.position().map(LocalPlane::new);
    }

    Optional<GeoPoint> of(Point place) {
        return plane.map(p -> p.toGeo(place));
    }

    /** A whole line; empty where the radar's place is unknown. */
    List<GeoPoint> line(List<Point> points) {
        return plane.map(p -> points.stream().map(p::toGeo).toList()).orElse(List.of());
    }

    boolean known() {
        return plane.isPresent();
    }
}
