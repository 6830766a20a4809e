package hemline.simulation.radar;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.junit.jupiter.api.Test;

class PackingTest {

    @Property(tries = 300)
    void valuesComeBackWithinHalfAStep(@ForAll @DoubleRange(min = -31, max = 80) double dbz) {
        for (Packing packing : List.of(Packing.BYTE, Packing.SHORT)) {
            assertThat(packing.unpack(packing.pack(dbz))).isCloseTo(dbz, within(packing.scale() / 2 + 1e-9));
            assertThat(packing.pack(packing.unpack(packing.pack(dbz)))).isEqualTo(packing.pack(dbz));
        }
    }

    @Test
    void belowDetectionAndNotMeasuredStayApart() {
        for (Packing packing : List.of(Packing.BYTE, Packing.SHORT, Packing.BYTE.forVelocity(16))) {
            assertThat(packing.unpack(packing.pack(Double.NaN))).isNaN();
            assertThat(packing.unpack(packing.pack(Double.NEGATIVE_INFINITY))).isEqualTo(Double.NEGATIVE_INFINITY);
            assertThat(packing.unpack(packing.pack(-500))).isFinite();
        }
    }

    @Property(tries = 100)
    void aBytesVelocityReachesTheUnambiguousOne(@ForAll @DoubleRange(min = 5, max = 60) double nyquist) {
        Packing packing = Packing.BYTE.forVelocity(nyquist);
        assertThat(packing.unpack(packing.pack(nyquist))).isCloseTo(nyquist, within(packing.scale()));
        assertThat(packing.unpack(packing.pack(-nyquist))).isCloseTo(-nyquist, within(packing.scale()));
        assertThat(packing.unpack(packing.pack(0))).isCloseTo(0, within(1e-12));
    }
}
