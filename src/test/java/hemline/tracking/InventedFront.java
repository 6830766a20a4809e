package hemline.tracking;

import hemline.geometry.Point;
import java.util.ArrayList;
import java.util.List;

/** A front known exactly: where it is and how fast each part of it moves at any time. */
public interface InventedFront {
    /** A place on the front, its unit normal toward motion and the speed along it, m s⁻¹. */
    record Place(Point at, Point normal, double speedMs) {
    }

    /** Places about 1 km apart along the front at a time, s from the loop's start. */
    List<Place> at(double timeS);

    /** Part of a circle that grows at a constant rate about a centre carried by a wind. Bearings clockwise. */
    static InventedFront ring(Point centre, Point driftMs, double radiusKm, double growthMs, double fromDeg,
                              double toDeg) {
        return ring(centre, driftMs, t -> radiusKm + growthMs * t / 1000, t -> growthMs, fromDeg, toDeg);
    }

    /** Part of a circle of any radius in time, km, and its rate, m s⁻¹. */
    static InventedFront ring(Point centre, Point driftMs, java.util.function.DoubleUnaryOperator radiusKm,
                              java.util.function.DoubleUnaryOperator rateMs, double fromDeg, double toDeg) {
        return timeS -> {
            double radius = radiusKm.applyAsDouble(timeS);
            Point middle = centre.plus(driftMs.times(timeS / 1000));
            double span = Math.toRadians(toDeg - fromDeg) * radius;
            int steps = Math.max(2, (int) Math.round(span));
            List<Place> places = new ArrayList<>();
            for (int i = 0; i <= steps; i++) {
                Point outward = Point.towards(fromDeg + (toDeg - fromDeg) * i / steps);
                places.add(new Place(middle.plus(outward.times(radius)), outward,
                        rateMs.applyAsDouble(timeS) + outward.dot(driftMs)));
            }
            return places;
        };
    }

    /** A straight front through a place, carried toward a bearing. */
    static InventedFront straight(Point middle, double bearingDeg, double speedMs, double lengthKm) {
        Point toward = Point.towards(bearingDeg);
        Point along = Point.towards(bearingDeg + 90);
        return timeS -> {
            List<Place> places = new ArrayList<>();
            int steps = (int) Math.round(lengthKm);
            for (int i = 0; i <= steps; i++) {
                places.add(new Place(middle.plus(toward.times(speedMs * timeS / 1000))
                        .plus(along.times(i - lengthKm / 2)), toward, speedMs));
            }
            return places;
        };
    }

    /** The same front only where a condition holds of place and time. */
    default InventedFront where(java.util.function.BiPredicate<Point, Double> visible) {
        return timeS -> at(timeS).stream().filter(p -> visible.test(p.at(), timeS)).toList();
    }
}
