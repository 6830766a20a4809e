package hemline.boundary.station;

import hemline.numerics.Estimate;

/**
 * The observed speed of a boundary against that of a density current.
 *
 * @param theoryMs  speed over the ground by theory, m s⁻¹, with its full uncertainty
 * @param froude    observed speed relative to the air ahead over √(g′h)
 * @param zScore    observed less theoretical speed over the standard deviation of the difference
 * @param depthFrom where the depth came from, in words
 * @param words     the comparison in words
 */
public record TheoryCheck(Estimate theoryMs, Estimate froude, double zScore, String depthFrom, String words) {
}
