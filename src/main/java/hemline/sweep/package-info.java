/**
 * The values of one radar sweep: site, rays with their own times, gates, reflectivity, velocity, masks with reasons. Below detection and not measured are kept apart.
 *
 * <p>May use: numerics, geometry, geodesy.
 * Open {@link hemline.sweep.Sweep} first.
 */
package hemline.sweep;
