/**
 * Invented sweeps with known truth, written in the open formats.
 *
 * <p>May use: boundary, sweep and their base.
 */
package hemline.simulation;
