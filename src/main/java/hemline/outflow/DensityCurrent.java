package hemline.outflow;

import hemline.numerics.Estimate;

/**
 * Speed, depth, density and pressure of a density current, each from the others, in SI units but hPa for pressure.
 *
 * <p>c = k √(g′h) with g′ = g (θᵥ ahead − θᵨ behind)/θᵥ ahead: von Kármán (1940), Benjamin (1968). With the hydrostatic
 * rise of surface pressure Δp = ρ g′ h this is c = k √(Δp/ρ). Uncertainties are carried to first order:
 * (s_c/c)² = (s_k/k)² + ((s_Δ/Δ)² + (s_h/h)²)/4.
 */
public final class DensityCurrent {
    /** Standard acceleration of free fall, m s⁻². */
    public static final double GRAVITY = 9.80665;
    /**
     * Share of a wind ahead that adds to the speed over the ground: about three fifths in the laboratory (Simpson and
     * Britter 1980, Q. J. R. Meteorol. Soc. 106:485; 0.62 from memory), about three quarters in simulations (Liu and
     * Moncrieff 1996); the standard deviation spans both.
     */
    public static final Estimate WIND_SHARE = new Estimate(0.62, 0.08);

    private DensityCurrent() {
    }

    /**
     * Reduced gravity g′, m s⁻².
     *
     * @param deficitK  θᵥ ahead less θᵨ behind, K
     * @param thetaAheadK θᵥ ahead, K
     */
    public static Estimate reducedGravity(Estimate deficitK, double thetaAheadK) {
        return deficitK.times(GRAVITY / thetaAheadK);
    }

    /** Speed relative to the air ahead, m s⁻¹, from k, g′ and depth, m. */
    public static Estimate speedMs(Estimate froude, Estimate reducedGravity, Estimate depthM) {
        return froude.times(reducedGravity.times(depthM).power(0.5));
    }

    /** Speed relative to the air ahead, m s⁻¹, from k and the hydrostatic pressure rise. */
    public static Estimate speedFromPressureMs(Estimate froude, Estimate riseHpa, Estimate densityKgM3) {
        return froude.times(riseHpa.times(100).over(densityKgM3).power(0.5));
    }

    /**
     * Speed over the ground, m s⁻¹.
     *
     * @param relative  to the air ahead
     * @param windAlong wind ahead along the direction of motion; a head wind is negative
     */
    public static Estimate groundSpeedMs(Estimate relative, Estimate windAlong) {
        return relative.plus(WIND_SHARE.times(windAlong));
    }

    /** Speed relative to the air ahead, m s⁻¹, from that over the ground: the inverse of the above. */
    public static Estimate relativeSpeedMs(Estimate ground, Estimate windAlong) {
        return ground.minus(WIND_SHARE.times(windAlong));
    }

    /** Depth, m, that the speed asks for: (c/k)²/g′. */
    public static Estimate depthFromSpeedM(Estimate speedMs, Estimate froude, Estimate reducedGravity) {
        return speedMs.over(froude).power(2).over(reducedGravity);
    }

    /** Depth, m, that a hydrostatic pressure rise asks for: Δp/(ρ g′). */
    public static Estimate depthFromPressureM(Estimate riseHpa, Estimate densityKgM3, Estimate reducedGravity) {
        return riseHpa.times(100).over(densityKgM3).over(reducedGravity);
    }

    /** Deficit of θᵥ, K, that speed and depth ask for: (c/k)² θᵥ/(g h). */
    public static Estimate deficitFromSpeedK(Estimate speedMs, Estimate froude, Estimate depthM, double thetaAheadK) {
        return speedMs.over(froude).power(2).over(depthM).times(thetaAheadK / GRAVITY);
    }

    /** Froude number c/√(g′h): the k that would fit. */
    public static Estimate froudeNumber(Estimate speedMs, Estimate reducedGravity, Estimate depthM) {
        return speedMs.over(reducedGravity.times(depthM).power(0.5));
    }

    /** Hydrostatic rise of surface pressure, hPa: ρ g′ h, for a deficit uniform in depth. */
    public static Estimate hydrostaticRiseHpa(Estimate densityKgM3, Estimate reducedGravity, Estimate depthM) {
        return densityKgM3.times(reducedGravity).times(depthM).times(0.01);
    }

    /** Stagnation pressure at the leading edge, hPa: ρU²/2 (Wakimoto 1982, Mon. Weather Rev. 110:1060). */
    public static Estimate stagnationPressureHpa(Estimate densityKgM3, Estimate speedMs) {
        return densityKgM3.times(speedMs.power(2)).times(0.005);
    }
}
