/**
 * Moving curves with exact positions and normal speeds: rings, bows and straight lines.
 *
 * <p>May use: simulation.random, boundary, sweep and their base.
 * Open {@link hemline.simulation.front.FrontCurve} first.
 */
package hemline.simulation.front;
