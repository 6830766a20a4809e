package hemline.meeting;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import hemline.boundary.Arrival;
import hemline.boundary.Track;
import hemline.geometry.Point;
import hemline.kinematics.Kinematics;
import hemline.kinematics.KinematicsSettings;
import hemline.sweep.Progress;
import hemline.tracking.InventedFront;
import hemline.tracking.InventedLoop;
import hemline.tracking.Tracking;
import hemline.tracking.TrackingSettings;
import java.util.List;
import org.assertj.core.data.Offset;
import org.junit.jupiter.api.Test;

class ArrivalsTest {
    private static List<Arrival> forecast(InventedLoop loop, double horizonS, Site... sites) {
        List<Track> tracks = Tracking.link(loop.found(), loop.frames(), TrackingSettings.defaults(), Progress.NONE);
        tracks = Kinematics.measure(tracks, loop.frames(), KinematicsSettings.defaults());
        return Arrivals.forecast(tracks, loop.frames(), List.of(sites), horizonS);
    }

    @Test
    void aStraightFrontReachesASiteWhenItsPathIsDone() {
        // 12 m/s over 60 km from the start: 5000 s; the loop ends at 3300 s.
        InventedLoop loop = new InventedLoop(1, InventedFront.straight(new Point(-40, 0), 90, 12, 70));
        List<Arrival> arrivals = forecast(loop, 3600, new Site("ahead", new Point(20, 5)),
                new Site("behind", new Point(-30, 0)), new Site("aside", new Point(20, 80)));
        assertThat(arrivals).hasSize(3);
        Arrival ahead = arrivals.get(0);
        assertThat(ahead.reached()).isTrue();
        double errorS = InventedLoop.secondsAt(ahead.timeMs()) - 5000;
        assertThat(errorS).isCloseTo(0, Offset.offset(240.0));
        assertThat(Math.abs(errorS)).isLessThan(3 * ahead.timeSdS());
        assertThat(ahead.probability()).isGreaterThan(0.9);
        assertThat(ahead.speed().speedMs()).isCloseTo(12, Offset.offset(1.0));
        assertThat(ahead.bearingDeg()).isCloseTo(90, Offset.offset(10.0));
        assertThat(arrivals.get(1).reached()).isFalse();
        assertThat(arrivals.get(2).reached()).isFalse();
        assertThat(arrivals.get(2).probability()).isZero();
    }

    @Test
    void aSiteBeyondTheHorizonIsNotReachedButMayBe() {
        InventedLoop loop = new InventedLoop(2, InventedFront.straight(new Point(-40, 0), 90, 12, 70));
        Arrival late = forecast(loop, 1500, new Site("late", new Point(20, 0))).get(0);
        assertThat(late.reached()).isFalse();
        assertThat(late.probability()).isBetween(0.0, 0.5);
    }

    @Test
    void aGrowingRingReachesASiteOffItsLastLine() {
        // Radius 15 km + 10 m/s t reaches 60 km after 4500 s.
        InventedLoop loop = new InventedLoop(3, InventedFront.ring(new Point(0, 0), new Point(0, 0), 15, 10, 0, 359));
        Arrival arrival = forecast(loop, 3600, new Site("north-east", Point.towards(45).times(60))).get(0);
        assertThat(arrival.reached()).isTrue();
        assertThat(InventedLoop.secondsAt(arrival.timeMs())).isCloseTo(4500, Offset.offset(240.0));
        assertThat(arrival.bearingDeg()).isCloseTo(45, Offset.offset(12.0));
    }

    @Test
    void aFrontThatIsOverReachesNothing() {
        InventedLoop loop = new InventedLoop(4, InventedFront.straight(new Point(-40, 0), 90, 12, 70))
                .missing(8, 9, 10, 11);
        assertThat(forecast(loop, 3600, new Site("ahead", new Point(20, 0)))).isEmpty();
    }

    @Test
    void badArgumentsAreRefused() {
        assertThatThrownBy(() -> Arrivals.forecast(List.of(), List.of(), List.of(), 0))
                .isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new Site("nowhere", new Point(Double.NaN, 0)))
                .isInstanceOf(IllegalArgumentException.class);
    }
}
