/**
 * What is really there in an invented loop: the records that a simulation writes and a score reads.
 *
 * <p>May use: boundary, sweep and their base. Open {@link hemline.boundary.truth.Truth} first.
 */
package hemline.boundary.truth;
