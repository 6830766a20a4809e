/**
 * What most needs a person's eye: a pure judgement of measured tracks, with reasons.
 *
 * <p>May use: casefile.edit, boundary, sweep and their base.
 * Open {@link hemline.casefile.review.ReviewQueue} first.
 */
package hemline.casefile.review;
