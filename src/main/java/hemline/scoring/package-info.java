/**
 * Found tracks and meetings measured against a truth, or one analyst's against another's.
 *
 * <p>May use: boundary, sweep and their base; Jackson and Commons CSV to read and write files.
 * Open {@link hemline.scoring.Scoring} first: it says what counts as right, neither and false.
 * The intervals are percentile bootstraps over scenes (Efron and Tibshirani 1993).
 */
package hemline.scoring;
