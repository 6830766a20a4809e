package hemline.boundary;

import hemline.geometry.Point;
import java.util.List;

/**
 * A growing arc fitted to all sweeps of a track at once: a centre that drifts and a radius that changes.
 *
 * @param centre          at {@code referenceMs}, km east and north of the radar
 * @param centreSdKm      standard deviation of the centre along its worse axis, km
 * @param referenceMs     time of {@code centre}, ms since 1970-01-01T00:00Z
 * @param driftEastMs     motion of the centre toward the east, m s⁻¹
 * @param driftNorthMs    motion of the centre toward the north, m s⁻¹
 * @param driftSdMs       standard deviation of either drift component, m s⁻¹
 * @param radii           the radius at each sweep that saw the arc, by rising time
 * @param expansion       mean rate of growth of the radius
 * @param coverageDeg     angle about the centre that was seen, all sweeps together, degrees
 * @param rmsKm           root mean square distance of the vertices from the fitted arcs, km
 */
public record ArcHistory(Point centre, double centreSdKm, long referenceMs, double driftEastMs, double driftNorthMs,
                         double driftSdMs, List<RadiusAt> radii, Speed expansion, double coverageDeg, double rmsKm) {
    public ArcHistory {
        radii = List.copyOf(radii);
        if (radii.isEmpty()) {
            throw new IllegalArgumentException("an arc history needs a radius");
        }
    }

    /** The centre at a time, km east and north of the radar. */
    public Point centreAt(long timeMs) {
        double seconds = (timeMs - referenceMs) / 1000.0;
        return centre.plus(new Point(driftEastMs, driftNorthMs).times(seconds / 1000));
    }

    /**
     * The fitted radius at one sweep.
     *
     * @param sweep    index of the sweep in the loop
     * @param timeMs   mean time of the vertices, ms since 1970-01-01T00:00Z
     * @param radiusKm km
     * @param sdKm     standard deviation, km
     */
    public record RadiusAt(int sweep, long timeMs, double radiusKm, double sdKm) {
    }
}
