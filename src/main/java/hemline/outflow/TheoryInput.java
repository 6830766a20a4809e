package hemline.outflow;

import hemline.numerics.Estimate;
import java.util.Optional;

/**
 * What is known of one outflow boundary. Everything is optional; what is given decides what can be told.
 *
 * @param ahead        air ahead of the boundary
 * @param behind       air behind it
 * @param deficitK     θᵥ ahead less θᵨ behind, K, when given itself rather than by the two states
 * @param depthM       of the cold air, m
 * @param airDepthM    of the air it runs under, up to the lowest stable layer, m; NaN for deep
 * @param riseHpa      hydrostatic rise of surface pressure behind the boundary, hPa
 * @param speedMs      of the boundary over the ground along its normal, m s⁻¹
 * @param windAlongMs  wind ahead along the motion, m s⁻¹, negative for a head wind
 * @param law          which k
 * @param froude       k itself, when given rather than by the law
 */
public record TheoryInput(Optional<AirState> ahead, Optional<AirState> behind, Estimate deficitK, Estimate depthM,
                          double airDepthM, Estimate riseHpa, Estimate speedMs, Estimate windAlongMs, FrontLaw law,
                          Estimate froude) {
    /** Share of its value taken as the standard deviation of k; spans published means. Common practice, no source. */
    public static final double FROUDE_SHARE = 0.2;
    /** The same for a deficit at one place; it stands for a whole layer. Common practice, no source. */
    public static final double DEFICIT_SHARE = 0.3;
    /** The same for a depth. Common practice, no source. */
    public static final double DEPTH_SHARE = 0.4;
    /** The same for a pressure rise. Common practice, no source. */
    public static final double RISE_SHARE = 0.2;
    /** Standard deviation of a wind taken to hold for the layer ahead, m s⁻¹. Common practice, no source. */
    public static final double WIND_SD_MS = 2;

    public TheoryInput {
        positive("deficit, K", deficitK);
        positive("depth, m", depthM);
        positive("pressure rise, hPa", riseHpa);
        positive("speed, m/s", speedMs);
        positive("k", froude);
        if (airDepthM <= 0) {
            throw new IllegalArgumentException("air depth, m, must be above 0, got " + airDepthM);
        }
        if (law.needsAirDepth() && !froude.isKnown() && depthM.isKnown()) {
            if (Double.isNaN(airDepthM)) {
                throw new IllegalArgumentException("the law " + law.label() + " needs the depth of the air ahead");
            }
            if (depthM.value() > airDepthM) {
                throw new IllegalArgumentException("depth must be at most the air depth, " + airDepthM + " m, got "
                        + depthM.value());
            }
        }
    }

    private static void positive(String what, Estimate value) {
        if (value.value() <= 0) {
            throw new IllegalArgumentException(what + " must be above 0, got " + value.value());
        }
    }

    /** Nothing known, outflows as observed. */
    public static TheoryInput none() {
        return new TheoryInput(Optional.empty(), Optional.empty(), Estimate.UNKNOWN, Estimate.UNKNOWN, Double.NaN,
                Estimate.UNKNOWN, Estimate.UNKNOWN, Estimate.UNKNOWN, FrontLaw.OBSERVED, Estimate.UNKNOWN);
    }

    public TheoryInput withAir(AirState newAhead, AirState newBehind) {
        return new TheoryInput(Optional.of(newAhead), Optional.of(newBehind), deficitK, depthM, airDepthM, riseHpa,
                speedMs, windAlongMs, law, froude);
    }

    public TheoryInput withAhead(AirState newAhead) {
        return new TheoryInput(Optional.of(newAhead), behind, deficitK, depthM, airDepthM, riseHpa, speedMs, windAlongMs,
                law, froude);
    }

    public TheoryInput withDeficitK(Estimate newDeficit) {
        return new TheoryInput(ahead, behind, newDeficit, depthM, airDepthM, riseHpa, speedMs, windAlongMs, law, froude);
    }

    public TheoryInput withDepthM(Estimate newDepth) {
        return new TheoryInput(ahead, behind, deficitK, newDepth, airDepthM, riseHpa, speedMs, windAlongMs, law, froude);
    }

    public TheoryInput withRiseHpa(Estimate newRise) {
        return new TheoryInput(ahead, behind, deficitK, depthM, airDepthM, newRise, speedMs, windAlongMs, law, froude);
    }

    public TheoryInput withSpeedMs(Estimate newSpeed) {
        return new TheoryInput(ahead, behind, deficitK, depthM, airDepthM, riseHpa, newSpeed, windAlongMs, law, froude);
    }

    public TheoryInput withWindAlongMs(Estimate newWind) {
        return new TheoryInput(ahead, behind, deficitK, depthM, airDepthM, riseHpa, speedMs, newWind, law, froude);
    }

    public TheoryInput withLaw(FrontLaw newLaw, double newAirDepthM) {
        return new TheoryInput(ahead, behind, deficitK, depthM, newAirDepthM, riseHpa, speedMs, windAlongMs, newLaw,
                froude);
    }

    public TheoryInput withFroude(Estimate newFroude) {
        return new TheoryInput(ahead, behind, deficitK, depthM, airDepthM, riseHpa, speedMs, windAlongMs, law, newFroude);
    }
}
