/**
 * Normal speeds, expansion and isochrones of tracks.
 *
 * <p>May use: boundary, sweep and their base.
 */
package hemline.kinematics;
