package hemline.boundary;

import hemline.geometry.Point;

/**
 * A vertex of a boundary as found in one sweep, before linking.
 *
 * @param position        km east and north of the radar
 * @param timeMs          time of the ray that saw it, ms since 1970-01-01T00:00Z
 * @param reflectivityDbz on the line, dBZ
 * @param normal          unit normal of the line, signed toward where it seems to move (east, north)
 * @param motionMs        speed along the normal suggested by the neighbouring sweeps, m s⁻¹; NaN when none is
 * @param evidence        local strength, in standard deviations of the background
 * @param lineDb          reflectivity on the line over the brighter of its sides, dB
 * @param stepDb          reflectivity ahead less that behind, dB
 */
public record ObservedVertex(Point position, long timeMs, double reflectivityDbz, Point normal, double motionMs,
                             double evidence, double lineDb, double stepDb) {
}
