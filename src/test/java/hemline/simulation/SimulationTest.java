package hemline.simulation;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import hemline.boundary.truth.Truth;
import hemline.boundary.truth.Truth.TruthLine;
import hemline.geometry.Point;
import hemline.geometry.Polyline;
import hemline.numerics.Workers;
import hemline.sweep.Progress;
import java.util.List;
import org.junit.jupiter.api.Test;

class SimulationTest {
    private static final SimulatedLoop COLLIDING = Simulation.of("colliding-rings", "sennick", 3);

    @Test
    void theSameSceneRadarAndSeedGiveTheSameLoopOnOneAndOnFourThreads() {
        SimulatedLoop again = Simulation.of("colliding-rings", "sennick", 3);
        try (Workers workers = new Workers(4)) {
            again.prepare(workers, Progress.NONE);
        }
        for (int i = COLLIDING.size() - 1; i >= 0; i--) {
            assertThat(again.sweep(i).reflectivity().toArray()).isEqualTo(COLLIDING.sweep(i).reflectivity().toArray());
        }
        assertThat(again.truth()).isEqualTo(COLLIDING.truth());
    }

    @Test
    void anotherSeedGivesAnotherLoop() {
        SimulatedLoop other = Simulation.of("colliding-rings", "sennick", 4);
        assertThat(other.sweep(0).reflectivity().toArray())
                .isNotEqualTo(COLLIDING.sweep(0).reflectivity().toArray());
    }

    /** The truth lines of neighbouring sweeps lie apart by speed times time: truth checked against itself by geometry. */
    @Test
    void truthSpeedsAreTheDisplacementOfTruthLinesOverTheTimeBetween() {
        Truth truth = COLLIDING.truth();
        int checked = 0;
        for (Truth.TruthBoundary boundary : truth.boundaries()) {
            for (TruthLine line : boundary.lines()) {
                for (Truth.TruthVertex vertex : line.vertices()) {
                    checked += displacementAgrees(boundary, line.sweep(), vertex) ? 1 : 0;
                }
            }
        }
        assertThat(checked).isGreaterThan(2000);
    }

    private static boolean displacementAgrees(Truth.TruthBoundary boundary, int sweep, Truth.TruthVertex vertex) {
        Point from = new Point(vertex.xKm(), vertex.yKm());
        Point normal = Point.towards(vertex.normalBearingDeg());
        List<TruthLine> next = boundary.lines().stream().filter(l -> l.sweep() == sweep + 1).toList();
        for (TruthLine line : next) {
            Polyline curve = new Polyline(line.vertices().stream().map(v -> new Point(v.xKm(), v.yKm())).toList());
            for (Truth.TruthVertex later : line.vertices()) {
                double seconds = (later.timeMs() - vertex.timeMs()) / 1000.0;
                Point expected = from.plus(normal.times(vertex.speedMs() * seconds / 1000));
                Point at = new Point(later.xKm(), later.yKm());
                if (at.distanceKm(expected) < 1.0) {
                    // A moved place lies on the later line but for the bend of the lobes over ten minutes.
                    assertThat(curve.nearest(expected).distanceKm()).isCloseTo(0, within(0.6));
                    return true;
                }
            }
        }
        return false;
    }

    @Test
    void unknownNamesAreRefusedWithTheNamesThereAre() {
        assertThatThrownBy(() -> Simulation.of("no such scene", "sennick", 1))
                .isInstanceOf(IllegalArgumentException.class).hasMessageContaining("colliding-rings");
        assertThatThrownBy(() -> Simulation.of("colliding-rings", "no such radar", 1))
                .isInstanceOf(IllegalArgumentException.class).hasMessageContaining("sennick");
    }
}
