/**
 * Joins the stages: all settings, and the result of one run.
 *
 * <p>May use: the stages, boundary, sweep and their base.
 */
package hemline.pipeline;
