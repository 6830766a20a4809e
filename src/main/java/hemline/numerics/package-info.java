/**
 * Filters, smoothers, assignment, least squares and robust statistics on plain arrays. No radar word occurs here.
 *
 * <p>May use: nothing of Hemline.
 * Open {@link hemline.numerics.Workers} first.
 */
package hemline.numerics;
