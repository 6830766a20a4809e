/**
 * Points, lines and arcs on the radar's plane, with their fits and distances.
 *
 * <p>May use: numerics.
 * Open {@link hemline.geometry.Polyline} first.
 */
package hemline.geometry;
