package hemline.kinematics;

import hemline.boundary.Speed;
import hemline.geometry.Point;

/**
 * Motion at one vertex.
 *
 * @param bearingDeg compass bearing of the normal, toward which it moves where the speed is known; NaN if unknown
 * @param speed      along it
 */
record VertexMotion(double bearingDeg, Speed speed) {

    /** A signed speed along a unit normal; the bearing is turned about for a negative one. */
    static VertexMotion along(double normalX, double normalY, double speedMs, double sdMs) {
        double sign = speedMs < 0 ? -1 : 1;
        return new VertexMotion(new Point(sign * normalX, sign * normalY).bearingDeg(),
                new Speed(Math.abs(speedMs), sdMs));
    }

    /** A line that is there with a direction but without a speed. */
    static VertexMotion unknown(double normalX, double normalY) {
        return new VertexMotion(new Point(normalX, normalY).bearingDeg(), Speed.UNKNOWN);
    }
}
