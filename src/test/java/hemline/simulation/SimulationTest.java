package hemline.simulation;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import hemline.boundary.truth.Truth;
import hemline.boundary.truth.Truth.TruthLine;
import hemline.geometry.Point;
import hemline.numerics.Workers;
import hemline.sweep.Progress;
import java.util.List;
import org.apache.commons.math3.stat.descriptive.SummaryStatistics;
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

    /** Truth checked against itself by geometry alone: lines of neighbouring sweeps lie apart by speed times time. */
    @Test
    void truthSpeedsAreTheDisplacementOfTruthLinesOverTheTimeBetween() {
        SummaryStatistics errorMs = new SummaryStatistics();
        for (Truth.TruthBoundary boundary : COLLIDING.truth().boundaries()) {
            for (TruthLine line : boundary.lines()) {
                for (Truth.TruthVertex vertex : line.vertices()) {
                    addDisplacementErrors(boundary, line.sweep() + 1, vertex, errorMs);
                }
            }
        }
        assertThat(errorMs.getN()).isGreaterThan(2000);
        assertThat(errorMs.getMean()).isCloseTo(0, within(0.1));
        // Lobes bend the normals within the ten minutes between sweeps.
        assertThat(errorMs.getStandardDeviation()).isLessThan(0.6);
    }

    private static void addDisplacementErrors(Truth.TruthBoundary boundary, int sweep, Truth.TruthVertex vertex,
                                              SummaryStatistics errorMs) {
        Point from = new Point(vertex.xKm(), vertex.yKm());
        Point normal = Point.towards(vertex.normalBearingDeg());
        for (TruthLine line : boundary.lines()) {
            if (line.sweep() != sweep) {
                continue;
            }
            List<Point> places = line.vertices().stream().map(v -> new Point(v.xKm(), v.yKm())).toList();
            for (int i = 1; i < places.size(); i++) {
                double left = normal.cross(places.get(i - 1).minus(from));
                double right = normal.cross(places.get(i).minus(from));
                double share = left / (left - right);
                Point crossing = places.get(i - 1).plus(places.get(i).minus(places.get(i - 1)).times(share));
                double movedKm = crossing.minus(from).dot(normal);
                if (left * right < 0 && movedKm > 0 && movedKm < 20) {
                    double seconds = (line.vertices().get(i).timeMs() - vertex.timeMs()) / 1000.0;
                    errorMs.addValue(1000 * movedKm / seconds - vertex.speedMs());
                }
            }
        }
    }

    @Test
    void unknownNamesAreRefusedWithTheNamesThereAre() {
        assertThatThrownBy(() -> Simulation.of("no such scene", "sennick", 1))
                .isInstanceOf(IllegalArgumentException.class).hasMessageContaining("colliding-rings");
        assertThatThrownBy(() -> Simulation.of("colliding-rings", "no such radar", 1))
                .isInstanceOf(IllegalArgumentException.class).hasMessageContaining("sennick");
    }
}
