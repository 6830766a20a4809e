/**
 * The nouns after detection: observed boundaries, tracks, speeds with uncertainty, arcs, meetings, arrivals.
 *
 * <p>May use: sweep and its base.
 * Open {@link hemline.boundary.Track} first.
 */
package hemline.boundary;
