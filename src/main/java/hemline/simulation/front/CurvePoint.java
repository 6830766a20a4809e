package hemline.simulation.front;

import hemline.geometry.Point;

/**
 * A point of a moving curve.
 *
 * @param place    km east and north of the radar
 * @param normal   unit vector toward the side ahead
 * @param normalMs speed along {@code normal} of the curve, m s⁻¹
 */
public record CurvePoint(Point place, Point normal, double normalMs) {
}
