/**
 * Thin lines (ridges) and clear-air arcs (steps): screened sweeps to observed boundaries with their significance.
 *
 * <p>May use: boundary, sweep and their base.
 */
package hemline.detection;
