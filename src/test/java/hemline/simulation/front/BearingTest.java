package hemline.simulation.front;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import hemline.geometry.Point;
import org.junit.jupiter.api.Test;

class BearingTest {
    @Test
    void agreesWithTheArcTangentOfTheLanguageAllRound() {
        for (double degrees = 0; degrees < 360; degrees += 0.37) {
            Point place = Point.towards(degrees).times(3 + degrees / 7);
            assertThat(Math.toDegrees(Bearing.of(place.xKm(), place.yKm()))).isCloseTo(place.bearingDeg(), within(2e-6));
        }
        assertThat(Bearing.of(0, 0)).isZero();
        assertThat(Bearing.of(0, -1)).isEqualTo(Math.PI);
    }
}
