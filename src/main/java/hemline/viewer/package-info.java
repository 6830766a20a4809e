/**
 * The JavaFX viewer.
 *
 * <p>May use: workflow, casefile, boundary, sweep and their base.
 */
package hemline.viewer;
