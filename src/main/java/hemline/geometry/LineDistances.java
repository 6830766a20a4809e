package hemline.geometry;

import java.util.List;
import org.locationtech.jts.algorithm.distance.DiscreteFrechetDistance;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LineString;

/** How far lines lie from each other, km. */
public final class LineDistances {
    private LineDistances() {
    }

    /** Directed Hausdorff distance of point sets: the largest distance of a point of {@code from} to {@code to}. */
    public static double directedHausdorffKm(List<Point> from, List<Point> to) {
        if (from.isEmpty() || to.isEmpty()) {
            throw new IllegalArgumentException("distances need points: " + from.size() + " and " + to.size());
        }
        double largest = 0;
        for (Point point : from) {
            double nearest = Double.POSITIVE_INFINITY;
            for (Point other : to) {
                nearest = Math.min(nearest, point.distanceKm(other));
            }
            largest = Math.max(largest, nearest);
        }
        return largest;
    }

    /** Mean distance of a line from another, the first sampled every 0.5 km. */
    public static double meanKm(Polyline from, Polyline to) {
        List<Point> samples = from.resampled(0.5).points();
        return samples.stream().mapToDouble(p -> to.nearest(p).distanceKm()).average().orElseThrow();
    }

    /** Discrete Fréchet distance (Eiter and Mannila 1994) of lines sampled every 0.5 km, in their given direction. */
    public static double frechetKm(Polyline a, Polyline b) {
        return DiscreteFrechetDistance.distance(lineString(a.resampled(0.5)), lineString(b.resampled(0.5)));
    }

    private static LineString lineString(Polyline line) {
        return new GeometryFactory().createLineString(line.points().stream()
                .map(p -> new Coordinate(p.xKm(), p.yKm())).toArray(Coordinate[]::new));
    }
}
