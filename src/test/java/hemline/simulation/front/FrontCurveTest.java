package hemline.simulation.front;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import hemline.geometry.Point;
import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;

class FrontCurveTest {
    private static final List<Lobe> RING_LOBES = List.of(new Lobe(2, 0.06, 1), new Lobe(9, 0.01, 2));
    private static final List<Lobe> BOW_LOBES = List.of(new Lobe(40, 1.5, 0.3), new Lobe(9, 0.2, 2));

    private static FrontCurve ring(double exponent) {
        return new RingCurve(new Point(12, -7), new Point(2, 1), new GrowthLaw(0, 8, 14, exponent), RING_LOBES);
    }

    private static FrontCurve bow() {
        return new BowCurve(new BowCurve.Motion(new Point(-20, 5), 70, 16, 0.0003, 0), 60, 12, 2, BOW_LOBES);
    }

    @Property(tries = 200)
    void everyPointOfACurveLiesOnItsOwnZeroDistance(@ForAll @DoubleRange(min = 0, max = 1) double share,
                                                    @ForAll @DoubleRange(min = 0, max = 4000) double timeS) {
        for (FrontCurve curve : List.of(ring(1), ring(0.5), ring(2.0 / 3), bow())) {
            double station = curve.firstStation() + share * (curve.lastStation() - curve.firstStation());
            Foot foot = new Foot();
            Point place = curve.at(station, timeS).place();
            curve.still(timeS).locate(place.xKm(), place.yKm(), foot);
            assertThat(foot.aheadKm).isCloseTo(0, within(1e-3));
        }
    }

    /** The definition of normal speed: a place moved along the normal at that speed for a short time is on the curve. */
    @Property(tries = 200)
    void normalSpeedIsTheRateAtWhichTheCurvePassesAlongItsNormal(@ForAll @DoubleRange(min = 0, max = 1) double share,
                                                                 @ForAll @DoubleRange(min = 10, max = 4000) double timeS) {
        double shortS = 2;
        for (FrontCurve curve : List.of(ring(1), ring(0.5), ring(2.0 / 3), bow())) {
            double station = curve.firstStation() + share * (curve.lastStation() - curve.firstStation());
            CurvePoint point = curve.at(station, timeS);
            Point moved = point.place().plus(point.normal().times(point.normalMs() * shortS / 1000));
            Foot foot = new Foot();
            curve.still(timeS + shortS).locate(moved.xKm(), moved.yKm(), foot);
            assertThat(1000 * foot.aheadKm / shortS).isCloseTo(0, within(0.1));
        }
    }

    /** Hoult (1972), Annu. Rev. Fluid Mech. 4:341-368: a fixed volume spreads as t^½; long after the onset the slope in
     * logarithms must come near it. */
    @Property(tries = 20)
    void aPowerLawRingGrowsWithItsPowerOfTime(@ForAll @DoubleRange(min = 0.4, max = 1) double exponent) {
        GrowthLaw law = new GrowthLaw(0, 5, 15, exponent);
        double slope = Math.log(law.radiusKm(2e6) / law.radiusKm(1e6)) / Math.log(2);
        assertThat(slope).isCloseTo(exponent, within(1e-3));
        assertThat(law.growthMs(500)).isCloseTo(1000 * (law.radiusKm(501) - law.radiusKm(499)) / 2, within(1e-3));
    }
}
