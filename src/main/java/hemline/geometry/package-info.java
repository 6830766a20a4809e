/**
 * Points, lines and arcs on the radar's plane, with their fits and distances.
 *
 * <p>Lines: {@link hemline.geometry.Polyline}, {@link hemline.geometry.LineDistances}. One circle:
 * {@link hemline.geometry.CircleFits}. An arc through time: {@link hemline.geometry.GrowingArcFit}.
 *
 * <p>May use: numerics; JTS.
 * Open {@link hemline.geometry.Polyline} first.
 */
package hemline.geometry;
