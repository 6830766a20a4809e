package hemline.simulation.front;

import org.apache.commons.math3.util.FastMath;

/**
 * A radius that grows as a power of time: R(t) = R₀ (1 + (t − t₀)/τ)ᵖ with τ = p R₀/V₀.
 *
 * <p>p = 1 is a steady growth; p = 1/2 and 2/3 are the spreading of a fixed volume of dense fluid, axisymmetric and in a
 * channel (Hoult 1972, Annu. Rev. Fluid Mech. 4:341-368).
 *
 * @param onsetS   t₀, s after the scene's start; before it there is no curve
 * @param radiusKm R₀, km
 * @param speedMs  V₀, the growth at t₀, m s⁻¹
 * @param exponent p
 */
public record GrowthLaw(double onsetS, double radiusKm, double speedMs, double exponent) {
    public GrowthLaw {
        if (!(radiusKm > 0) || !(speedMs > 0) || !(exponent > 0 && exponent <= 1)) {
            throw new IllegalArgumentException("growth needs a radius and a speed above 0 and an exponent in (0, 1], got "
                    + radiusKm + " km, " + speedMs + " m/s, " + exponent);
        }
    }

    private double stretch(double timeS) {
        double tauS = exponent * radiusKm * 1000 / speedMs;
        return 1 + Math.max(0, timeS - onsetS) / tauS;
    }

    /** Radius, km; before the onset the radius at the onset. */
    public double radiusKm(double timeS) {
        return radiusKm * FastMath.pow(stretch(timeS), exponent);
    }

    /** Growth of the radius, m s⁻¹. */
    public double growthMs(double timeS) {
        return speedMs * FastMath.pow(stretch(timeS), exponent - 1);
    }
}
