/**
 * Tables or cases measured against a truth or against each other.
 *
 * <p>May use: boundary, sweep and their base.
 */
package hemline.scoring;
