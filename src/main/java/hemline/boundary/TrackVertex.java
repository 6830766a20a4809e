package hemline.boundary;

import hemline.geometry.Point;

/**
 * A vertex of a tracked boundary in one sweep.
 *
 * @param position         km east and north of the radar
 * @param timeMs           time of the ray that saw it, ms since 1970-01-01T00:00Z
 * @param reflectivityDbz  on the line, dBZ; NaN when not measured there
 * @param beamHeightM      beam centre above mean sea level, m
 * @param normalBearingDeg compass bearing moved toward, degrees clockwise from north; NaN when unknown
 * @param speed            along that bearing
 * @param seen             true where this sweep shows it, false where it was filled in from the sweeps around it
 */
public record TrackVertex(Point position, long timeMs, double reflectivityDbz, double beamHeightM,
                          double normalBearingDeg, Speed speed, boolean seen) {

    public TrackVertex withMotion(double bearingDeg, Speed newSpeed) {
        return new TrackVertex(position, timeMs, reflectivityDbz, beamHeightM, bearingDeg, newSpeed, seen);
    }
}
