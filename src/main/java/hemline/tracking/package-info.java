/**
 * Observed boundaries linked into tracks over the whole loop.
 *
 * <p>May use: boundary, sweep and their base.
 */
package hemline.tracking;
