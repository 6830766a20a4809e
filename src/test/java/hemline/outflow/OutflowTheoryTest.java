package hemline.outflow;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import hemline.numerics.Estimate;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.junit.jupiter.api.Test;

class OutflowTheoryTest {
    private static final TheoryInput FIVE_KELVIN = TheoryInput.none().withDeficitK(Estimate.relative(5, 0.3));

    /** c = 0.77 √(9.80665 · 5/300 · 1000) = 9.844 m/s, uncertain by √(0.2² + (0.3² + 0.4²)/4) = 32 %. */
    @Test
    void depthAndDeficitGiveTheSpeedWithItsFullUncertainty() {
        TheoryResult told = OutflowTheory.assess(FIVE_KELVIN.withDepthM(Estimate.relative(1000, 0.4)));
        Estimate speed = told.get("theory_relative_speed_ms");
        assertThat(speed.value()).isCloseTo(9.844, within(1e-3));
        assertThat(speed.relativeSd()).isCloseTo(0.3202, within(1e-4));
        assertThat(told.get("hydrostatic_rise_hpa").value()).isCloseTo(1.15 * 9.80665 / 60 * 10, within(1e-3));
        assertThat(told.comparison()).isEmpty();
        assertThat(told.zScore()).isNaN();
    }

    @Test
    void observedAndTheoreticalSpeedAreComparedInStandardDeviations() {
        TheoryResult told = OutflowTheory.assess(FIVE_KELVIN.withDepthM(Estimate.relative(1000, 0.4))
                .withSpeedMs(new Estimate(8.6, 0.5)).withWindAlongMs(new Estimate(-2, 0)));
        // Over the ground 9.844 - 0.62 * 2 = 8.604 m/s, +- hypot(3.152, 0.16) = 3.156.
        assertThat(told.get("theory_speed_ms").value()).isCloseTo(8.604, within(1e-3));
        assertThat(told.get("theory_speed_ms").sd()).isCloseTo(3.156, within(2e-3));
        assertThat(told.zScore()).isCloseTo((8.6 - 8.604) / Math.hypot(3.156, 0.5), within(1e-3));
        assertThat(told.comparison()).contains("observed 8.6 +- 0.5 m/s, theory 8.6 +- 3.2 m/s").contains("they agree");
        assertThat(told.get("froude_number").value()).isCloseTo((8.6 + 1.24) / Math.sqrt(163.444), within(1e-4));
        TheoryResult far = OutflowTheory.assess(FIVE_KELVIN.withDepthM(Estimate.relative(1000, 0.1))
                .withSpeedMs(new Estimate(25, 0.5)));
        assertThat(far.zScore()).isGreaterThan(2);
        assertThat(far.comparison()).contains("differ by more than the uncertainty");
        assertThat(far.cautions()).anyMatch(c -> c.contains("wind ahead not given"));
    }

    @Test
    void whatIsMissingIsFoundFromWhatIsGiven() {
        TheoryResult depth = OutflowTheory.assess(FIVE_KELVIN.withSpeedMs(new Estimate(9.844, 0)));
        assertThat(depth.get("depth_from_speed_m").value()).isCloseTo(1000, within(0.1));
        assertThat(depth.get("depth_from_speed_m").relativeSd()).isCloseTo(Math.hypot(0.4, 0.3), within(1e-3));
        assertThat(depth.needs()).anyMatch(n -> n.contains("depth of the cold air"));
        TheoryResult deficit = OutflowTheory.assess(TheoryInput.none().withSpeedMs(new Estimate(9.844, 0))
                .withDepthM(new Estimate(1000, 0)));
        assertThat(deficit.get("deficit_from_speed_k").value()).isCloseTo(5, within(1e-3));
        TheoryResult pressure = OutflowTheory.assess(FIVE_KELVIN.withRiseHpa(new Estimate(1.8796, 0)));
        assertThat(pressure.get("depth_from_pressure_m").value()).isCloseTo(1000, within(0.5));
        assertThat(pressure.get("theory_relative_speed_ms").value()).isCloseTo(9.844, within(2e-3));
        assertThat(pressure.needs()).noneMatch(n -> n.contains("for a speed by theory"));
    }

    @Test
    void theAirOnBothSidesGivesTheDeficitWithTheWeightOfItsRain() {
        AirState ahead = AirState.of(30, 20, 1000);
        AirState behind = AirState.of(24, 19, 1001);
        double dry = OutflowTheory.assess(TheoryInput.none().withAir(ahead, behind)).get("deficit_k").value();
        double rain = OutflowTheory.assess(TheoryInput.none().withAir(ahead, behind.withCondensate(3))).get("deficit_k")
                .value();
        // 3 g/kg of rain weigh as much as 3e-3 of 300 K.
        assertThat(rain - dry).isCloseTo(0.9, within(0.03));
        assertThat(dry).isBetween(6.0, 7.0);
    }

    @Test
    void warmerAirBehindIsNoDensityCurrent() {
        TheoryResult told = OutflowTheory.assess(TheoryInput.none().withAir(AirState.of(20, 10, 1000),
                AirState.of(22, 10, 1000)).withDepthM(new Estimate(1000, 100)).withSpeedMs(new Estimate(5, 1)));
        assertThat(told.get("deficit_k").isKnown()).isFalse();
        assertThat(told.get("theory_relative_speed_ms").isKnown()).isFalse();
        assertThat(told.cautions()).anyMatch(c -> c.contains("not denser"));
    }

    @Test
    void aWindThatCarriesTheBoundaryLeavesNoDensityCurrent() {
        TheoryResult told = OutflowTheory.assess(FIVE_KELVIN.withSpeedMs(new Estimate(5, 1))
                .withWindAlongMs(new Estimate(15, 2)));
        assertThat(told.cautions()).anyMatch(c -> c.contains("wind ahead alone"));
        assertThat(told.get("depth_from_speed_m").isKnown()).isFalse();
    }

    @Test
    void impossibleDepthsAreCautionedAgainst() {
        assertThat(OutflowTheory.assess(FIVE_KELVIN.withSpeedMs(new Estimate(30, 1))).cautions())
                .anyMatch(c -> c.contains("outside 300 to 3000 m"));
    }

    @Test
    void finiteDepthLawsNeedTheAirDepth() {
        TheoryInput input = FIVE_KELVIN.withDepthM(Estimate.relative(1000, 0.4));
        assertThat(OutflowTheory.assess(input.withLaw(FrontLaw.BENJAMIN, 4000)).get("k").value())
                .isCloseTo(1.0247, within(1e-4));
        assertThatThrownBy(() -> input.withLaw(FrontLaw.BENJAMIN, Double.NaN))
                .isInstanceOf(IllegalArgumentException.class).hasMessageContaining("needs the depth of the air");
        assertThatThrownBy(() -> input.withLaw(FrontLaw.HUPPERT_SIMPSON, 500))
                .hasMessageContaining("at most the air depth, 500.0 m, got 1000.0");
    }

    @Test
    void valuesOutOfBoundsAreRefusedWithBoundAndValue() {
        assertThatThrownBy(() -> AirState.of(30, 35, 1000)).hasMessageContaining("30.0 C, got 35.0");
        assertThatThrownBy(() -> AirState.of(300, 20, 1000)).hasMessageContaining("-90.0..60.0, got 300.0");
        assertThatThrownBy(() -> TheoryInput.none().withDepthM(new Estimate(-5, 1))).hasMessageContaining("got -5.0");
        assertThatThrownBy(() -> new Estimate(1, Double.NaN)).hasMessageContaining("needs its uncertainty");
        assertThatThrownBy(() -> FrontLaw.BENJAMIN.froude(1.2)).hasMessageContaining("0..1, got 1.2");
        assertThatThrownBy(() -> SpreadingLaw.PLANE_BOX.constant(2)).hasMessageContaining("0..2, got 2.0");
        assertThatThrownBy(() -> StandardAtmosphere.pressureHpa(20_000)).hasMessageContaining("got 20000.0");
    }

    @Test
    void theTextIsAlignedAndEndsWithTheComparison() {
        String text = TheoryText.of(OutflowTheory.assess(FIVE_KELVIN.withDepthM(Estimate.relative(1000, 0.4))
                .withSpeedMs(new Estimate(8.6, 0.5))));
        assertThat(text.lines()).anyMatch(l -> l.matches("speed by theory relative to the air ahead +9\\.8 \\+- 3\\.2 +"
                + "m s-1 +from k, deficit, depth"));
        assertThat(text).contains("observed 8.6 +- 0.5 m/s").contains("caution: ");
    }

    /** Common practice, no source: deeper pools and larger deficits run faster. */
    @Property(tries = 100)
    void deeperAndDenserRunsFaster(@ForAll @DoubleRange(min = 0.5, max = 12) double deficit,
            @ForAll @DoubleRange(min = 200, max = 3000) double depth) {
        assertThat(speed(deficit, depth * 1.05)).isGreaterThan(speed(deficit, depth));
        assertThat(speed(deficit * 1.05, depth)).isGreaterThan(speed(deficit, depth));
    }

    private static double speed(double deficitK, double depthM) {
        return OutflowTheory.assess(TheoryInput.none().withDeficitK(new Estimate(deficitK, 0))
                .withDepthM(new Estimate(depthM, 0))).get("theory_relative_speed_ms").value();
    }

    /** Depth, deficit and speed are three ways round one relation. */
    @Property(tries = 100)
    void theInverseProblemsCloseUp(@ForAll @DoubleRange(min = 0.5, max = 12) double deficit,
            @ForAll @DoubleRange(min = 200, max = 3000) double depth) {
        Estimate k = new Estimate(0.77, 0.1);
        Estimate gravity = DensityCurrent.reducedGravity(new Estimate(deficit, 0.1), 300);
        Estimate speed = DensityCurrent.speedMs(k, gravity, new Estimate(depth, 10));
        assertThat(DensityCurrent.depthFromSpeedM(speed, k, gravity).value()).isCloseTo(depth, within(1e-6 * depth));
        assertThat(DensityCurrent.deficitFromSpeedK(speed, k, new Estimate(depth, 10), 300).value())
                .isCloseTo(deficit, within(1e-9));
        Estimate rho = new Estimate(1.1, 0);
        Estimate rise = DensityCurrent.hydrostaticRiseHpa(rho, gravity, new Estimate(depth, 0));
        assertThat(DensityCurrent.speedFromPressureMs(k, rise, rho).value()).isCloseTo(speed.value(), within(1e-9));
    }

    /** Spreading slows as the laws say: d ln R / d ln t is the exponent. */
    @Test
    void spreadingFollowsItsExponent() {
        for (SpreadingLaw law : SpreadingLaw.values()) {
            double early = law.distanceM(0.77, 0.16, 1e12, 1000);
            double late = law.distanceM(0.77, 0.16, 1e12, 2000);
            assertThat(Math.log(late / early) / Math.log(2)).isCloseTo(law.exponent(), within(1e-12));
            double step = law.distanceM(0.77, 0.16, 1e12, 1000.001) - early;
            assertThat(law.speedMs(0.77, 0.16, 1e12, 1000)).isCloseTo(step / 0.001, within(1e-3));
        }
    }

    /** The box model's front condition holds: dR/dt = k √(g' h) with h = V/(π R²). */
    @Test
    void theAxisymmetricBoxKeepsItsFrontCondition() {
        double k = 0.77;
        double gravity = 0.16;
        double volume = 3e11;
        double r = SpreadingLaw.AXISYMMETRIC_BOX.distanceM(k, gravity, volume, 1800);
        assertThat(SpreadingLaw.AXISYMMETRIC_BOX.speedMs(k, gravity, volume, 1800))
                .isCloseTo(k * Math.sqrt(gravity * volume / (Math.PI * r * r)), within(1e-9));
        double x = SpreadingLaw.PLANE_BOX.distanceM(k, gravity, 1e7, 1800);
        assertThat(SpreadingLaw.PLANE_BOX.speedMs(k, gravity, 1e7, 1800))
                .isCloseTo(k * Math.sqrt(gravity * 1e7 / x), within(1e-9));
    }
}
