/**
 * What ground stations saw of boundaries: their observations, and the passages of boundaries over them.
 *
 * <p>May use: boundary, sweep and their base. Open {@link hemline.boundary.station.StationPassage} first.
 */
package hemline.boundary.station;
