package hemline.viewer.render;

import static org.assertj.core.api.Assertions.assertThat;

import hemline.geometry.Point;
import hemline.sweep.RayGeometry;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.junit.jupiter.api.Test;

class FastAngleTest {
    /** Against the exact arctangent; a bin of the polar map is 0.01°. */
    @Property(tries = 2000)
    void isWithinAFractionOfABinOfTheExactBearing(@ForAll @DoubleRange(min = -300, max = 300) double x,
                                                  @ForAll @DoubleRange(min = -300, max = 300) double y) {
        double fast = FastAngle.bearingDeg(x, y);
        assertThat(fast).isGreaterThanOrEqualTo(0).isLessThan(360);
        if (x != 0 || y != 0) {
            assertThat(RayGeometry.gapDeg(fast, new Point(x, y).bearingDeg())).isLessThan(0.0008);
        }
    }

    @Test
    void theCompassPointsAreExact() {
        assertThat(FastAngle.bearingDeg(0, 1)).isZero();
        assertThat(FastAngle.bearingDeg(1, 0)).isEqualTo(90);
        assertThat(FastAngle.bearingDeg(0, -1)).isEqualTo(180);
        assertThat(FastAngle.bearingDeg(-1, 0)).isEqualTo(270);
        assertThat(FastAngle.bearingDeg(0, 0)).isZero();
        assertThat(FastAngle.bearingDeg(-1e-12, 1)).isLessThan(360);
    }
}
