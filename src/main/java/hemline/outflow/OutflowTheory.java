package hemline.outflow;

import hemline.numerics.Estimate;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/**
 * Tells all that density-current theory says about given observations: the speed they ask for, or the depth or density
 * deficit that is missing, pressures at the ground, and how the observed speed compares. Guidance: the k of outflows is
 * known to a fifth of its value, so theory rarely tells speeds apart by less than a third.
 */
public final class OutflowTheory {
    private static final double DEFAULT_THETA_K = 300;
    private static final Estimate DEFAULT_DENSITY = new Estimate(1.15, 0.06);
    private static final double DENSITY_SHARE = 0.02;
    private static final double LEAST_DEPTH_M = 300;
    private static final double GREATEST_DEPTH_M = 3000;
    private static final double GREATEST_DEFICIT_K = 15;

    private final TheoryInput input;
    private final List<Finding> findings = new ArrayList<>();
    private final List<String> needs = new ArrayList<>();
    private final List<String> cautions = new ArrayList<>();
    private final double thetaAheadK;
    private final Estimate density;

    private OutflowTheory(TheoryInput input) {
        this.input = input;
        thetaAheadK = input.ahead().map(AirState::densityPotentialTemperatureK).orElse(DEFAULT_THETA_K);
        density = input.ahead().map(a -> Estimate.relative(a.densityKgM3(), DENSITY_SHARE)).orElse(DEFAULT_DENSITY);
    }

    /** Everything that follows from the input; never fails on an input that could be built. */
    public static TheoryResult assess(TheoryInput input) {
        return new OutflowTheory(input).told();
    }

    private TheoryResult told() {
        if (input.ahead().isEmpty()) {
            cautions.add(String.format(Locale.ROOT, "air ahead not given: a potential temperature of %.0f K and a "
                    + "density of %.2f kg/m3 are taken", DEFAULT_THETA_K, density.value()));
        }
        Estimate deficit = deficit();
        Estimate relative = relativeSpeed();
        Estimate froude = froude();
        Estimate gravity = deficit.isKnown() ? DensityCurrent.reducedGravity(deficit, thetaAheadK) : Estimate.UNKNOWN;
        add("reduced_gravity_ms2", "reduced gravity", gravity, "m s-2", "deficit");
        Estimate depth = depth(gravity, froude, relative);
        Estimate theory = theorySpeed(froude, gravity);
        missingDeficit(froude, relative, deficit);
        if (relative.isKnown() && gravity.isKnown() && depth.isKnown() && input.depthM().isKnown()) {
            add("froude_number", "Froude number, observed speed over sqrt(g'h)",
                    DensityCurrent.froudeNumber(relative, gravity, depth), "", "speed, deficit, depth");
        }
        if (relative.isKnown() && input.riseHpa().isKnown() && !input.depthM().isKnown()) {
            add("froude_number", "Froude number, observed speed over sqrt(pressure rise / density)",
                    relative.over(input.riseHpa().times(100).over(density).power(0.5)), "", "speed, pressure rise");
        }
        pressures(gravity, depth, relative.isKnown() ? relative : theory);
        return compared(theory);
    }

    private Estimate deficit() {
        if (input.deficitK().isKnown()) {
            return checkedDeficit(input.deficitK());
        }
        if (input.ahead().isEmpty() || input.behind().isEmpty()) {
            needs.add("temperature ahead and behind, or the deficit itself, for the density deficit");
            return Estimate.UNKNOWN;
        }
        AirState behind = input.behind().get();
        add("theta_v_ahead_k", "virtual potential temperature ahead", new Estimate(thetaAheadK, 0.3), "K", "air ahead");
        add("theta_rho_behind_k", "density potential temperature behind",
                new Estimate(behind.densityPotentialTemperatureK(), 0.3), "K", "air behind, with its condensate");
        if (!input.ahead().get().hasHumidity() || !behind.hasHumidity()) {
            cautions.add("humidity not given on both sides: the air without it is taken as dry");
        }
        double kelvin = thetaAheadK - behind.densityPotentialTemperatureK();
        if (kelvin <= 0) {
            cautions.add(String.format(Locale.ROOT, "the air behind is not denser (deficit %.1f K): no density current",
                    kelvin));
            return Estimate.UNKNOWN;
        }
        return checkedDeficit(Estimate.relative(kelvin, TheoryInput.DEFICIT_SHARE));
    }

    private Estimate checkedDeficit(Estimate deficit) {
        add("deficit_k", "deficit of virtual potential temperature", deficit, "K", "air ahead and behind");
        if (deficit.value() > GREATEST_DEFICIT_K) {
            cautions.add("a deficit above 15 K is more than outflows are known to have");
        }
        return deficit;
    }

    private Estimate relativeSpeed() {
        if (!input.speedMs().isKnown()) {
            return Estimate.UNKNOWN;
        }
        if (!input.windAlongMs().isKnown()) {
            cautions.add("wind ahead not given: the speed over the ground is taken as relative to the air ahead");
            return input.speedMs();
        }
        Estimate relative = DensityCurrent.relativeSpeedMs(input.speedMs(), input.windAlongMs());
        add("relative_speed_ms", "observed speed relative to the air ahead", relative, "m s-1",
                "speed over the ground, wind ahead");
        if (relative.value() <= 0) {
            cautions.add("the wind ahead alone would carry the boundary: no speed is left for a density current");
            return Estimate.UNKNOWN;
        }
        return relative;
    }

    private Estimate froude() {
        if (input.froude().isKnown()) {
            return input.froude();
        }
        if (input.law().needsAirDepth() && !input.depthM().isKnown()) {
            needs.add("the depth of the cold air, for k after " + input.law().label());
            return Estimate.UNKNOWN;
        }
        double share = input.law().needsAirDepth() ? input.depthM().value() / input.airDepthM() : Double.NaN;
        Estimate froude = Estimate.relative(input.law().froude(share), TheoryInput.FROUDE_SHARE);
        add("k", "k in c = k sqrt(g'h)", froude, "", "law: " + input.law().label());
        return froude;
    }

    private Estimate depth(Estimate gravity, Estimate froude, Estimate relative) {
        if (input.riseHpa().isKnown() && gravity.isKnown()) {
            checkedDepth("depth_from_pressure_m", "depth from pressure rise and deficit",
                    DensityCurrent.depthFromPressureM(input.riseHpa(), density, gravity), "pressure rise, deficit");
        }
        if (relative.isKnown() && gravity.isKnown() && froude.isKnown()) {
            checkedDepth("depth_from_speed_m", "depth from speed and deficit",
                    DensityCurrent.depthFromSpeedM(relative, froude, gravity), "speed, deficit, k");
        }
        if (input.depthM().isKnown()) {
            return input.depthM();
        }
        needs.add("the depth of the cold air or the pressure rise, for a speed by theory");
        return get("depth_from_pressure_m").isKnown() ? get("depth_from_pressure_m") : get("depth_from_speed_m");
    }

    private void checkedDepth(String key, String words, Estimate depth, String from) {
        add(key, words, depth, "m", from);
        if (depth.value() < LEAST_DEPTH_M || depth.value() > GREATEST_DEPTH_M) {
            cautions.add(String.format(Locale.ROOT, "%s of %.0f m lies outside 300 to 3000 m: check the other values",
                    words, depth.value()));
        }
    }

    /** The pressure form wins where a rise is given: depth and deficit then share it and are not independent. */
    private Estimate theorySpeed(Estimate froude, Estimate gravity) {
        Estimate relative = Estimate.UNKNOWN;
        String from = "";
        if (froude.isKnown() && gravity.isKnown() && input.depthM().isKnown()) {
            relative = DensityCurrent.speedMs(froude, gravity, input.depthM());
            from = "k, deficit, depth";
        } else if (froude.isKnown() && input.riseHpa().isKnown()) {
            relative = DensityCurrent.speedFromPressureMs(froude, input.riseHpa(), density);
            from = "k, pressure rise";
            needs.remove("the depth of the cold air or the pressure rise, for a speed by theory");
        }
        if (!relative.isKnown()) {
            return relative;
        }
        add("theory_relative_speed_ms", "speed by theory relative to the air ahead", relative, "m s-1", from);
        if (input.windAlongMs().isKnown()) {
            Estimate ground = DensityCurrent.groundSpeedMs(relative, input.windAlongMs());
            add("theory_speed_ms", "speed by theory over the ground", ground, "m s-1", from + ", wind ahead");
        }
        return relative;
    }

    private void missingDeficit(Estimate froude, Estimate relative, Estimate deficit) {
        if (!deficit.isKnown() && relative.isKnown() && froude.isKnown() && input.depthM().isKnown()) {
            add("deficit_from_speed_k", "deficit from speed and depth",
                    DensityCurrent.deficitFromSpeedK(relative, froude, input.depthM(), thetaAheadK), "K",
                    "speed, depth, k");
        }
    }

    private void pressures(Estimate gravity, Estimate depth, Estimate relative) {
        if (gravity.isKnown() && input.depthM().isKnown()) {
            add("hydrostatic_rise_hpa", "hydrostatic rise of surface pressure, deficit uniform in depth",
                    DensityCurrent.hydrostaticRiseHpa(density, gravity, depth), "hPa", "deficit, depth");
        }
        if (relative.isKnown()) {
            add("stagnation_pressure_hpa", "stagnation pressure at the leading edge",
                    DensityCurrent.stagnationPressureHpa(density, relative), "hPa", "speed relative to the air ahead");
        }
    }

    private TheoryResult compared(Estimate theoryRelative) {
        Estimate ground = get("theory_speed_ms");
        Estimate theory = ground.isKnown() ? ground : theoryRelative;
        if (!theory.isKnown() || !input.speedMs().isKnown()) {
            return new TheoryResult(findings, "", Double.NaN, needs, cautions);
        }
        Estimate difference = input.speedMs().minus(theory);
        double z = difference.value() / difference.sd();
        add("difference_ms", "observed less theoretical speed", difference, "m s-1", "speed, theory");
        String verdict = Math.abs(z) <= 1 ? "they agree" : Math.abs(z) <= 2 ? "they are within the uncertainty"
                : "they differ by more than the uncertainty";
        String words = String.format(Locale.ROOT, "observed %.1f +- %.1f m/s, theory %.1f +- %.1f m/s: the difference of "
                + "%+.1f m/s is %+.1f standard deviations, %s", input.speedMs().value(), input.speedMs().sd(),
                theory.value(), theory.sd(), difference.value(), z, verdict);
        return new TheoryResult(findings, words, z, needs, cautions);
    }

    private void add(String key, String words, Estimate estimate, String unit, String from) {
        if (estimate.isKnown()) {
            findings.add(new Finding(key, words, estimate, unit, from));
        }
    }

    private Estimate get(String key) {
        return findings.stream().filter(finding -> finding.key().equals(key)).map(Finding::estimate).findFirst()
                .orElse(Estimate.UNKNOWN);
    }
}
