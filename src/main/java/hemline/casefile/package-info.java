/**
 * A case: sources, settings, result, an append-only log of hand edits, undo by replay, recovery.
 *
 * <p>May use: pipeline, boundary, sweep and their base.
 */
package hemline.casefile;
