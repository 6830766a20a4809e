/**
 * Beam height and ground range, and the plane to and from latitude and longitude.
 *
 * <p>May use: geometry, numerics.
 * Open {@link hemline.geodesy.BeamGeometry} first.
 */
package hemline.geodesy;
