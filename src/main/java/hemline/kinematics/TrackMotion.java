package hemline.kinematics;

import hemline.boundary.Speed;
import hemline.geometry.Point;
import hemline.numerics.Robust;

/** The speed and bearing of a track as a whole, from those of its vertices. */
final class TrackMotion {
    private static final double LINE_LIKE = 0.3;

    private TrackMotion() {
    }

    /**
     * Median normal speed; bearing of the mean motion, NaN for a ring, whose parts move apart.
     *
     * @param motion of every vertex
     */
    static VertexMotion of(VertexMotion[] motion, TrackPoints points) {
        double[] speeds = new double[motion.length];
        Point sum = new Point(0, 0);
        double sdSum = 0;
        int known = 0;
        for (int i = 0; i < motion.length; i++) {
            speeds[i] = motion[i].speed().speedMs();
            if (motion[i].speed().isKnown()) {
                sum = sum.plus(Point.towards(motion[i].bearingDeg()));
                sdSum += motion[i].speed().sdMs();
                known++;
            }
        }
        if (known == 0) {
            return new VertexMotion(Double.NaN, Speed.UNKNOWN);
        }
        Point mean = sum.times(1.0 / known);
        double bearing = mean.lengthKm() < LINE_LIKE ? Double.NaN : mean.bearingDeg();
        // A speed shares its error with those within about 6 km and 2 sweeps.
        double independent = Math.max(1, known / (12.0 * 3));
        double spread = Robust.spread(speeds);
        double sd = Math.sqrt((square(sdSum / known) + square(spread)) / independent);
        return new VertexMotion(bearing, new Speed(Robust.median(speeds), sd));
    }

    private static double square(double value) {
        return value * value;
    }
}
