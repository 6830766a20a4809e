/**
 * Density-current theory, thermodynamics and the passage of boundaries over stations.
 *
 * <p>May use: boundary, sweep and their base.
 */
package hemline.outflow;
