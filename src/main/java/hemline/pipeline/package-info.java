/**
 * Joins the stages: all settings, and the result of one run.
 *
 * <p>May use: the stages, boundary, sweep and their base.
 * Open {@link hemline.pipeline.Analysis} first.
 */
package hemline.pipeline;
