package hemline.kinematics;

import static org.assertj.core.api.Assertions.assertThat;

import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.geometry.Point;
import hemline.sweep.Progress;
import hemline.tracking.InventedFront;
import hemline.tracking.InventedLoop;
import hemline.tracking.Tracking;
import hemline.tracking.TrackingSettings;
import java.util.List;
import org.assertj.core.data.Offset;
import org.junit.jupiter.api.Test;

class KinematicsTest {
    private static List<Track> measure(InventedLoop loop) {
        List<Track> tracks = Tracking.link(loop.found(), loop.frames(), TrackingSettings.defaults(), Progress.NONE);
        return Kinematics.measure(tracks, loop.frames(), KinematicsSettings.defaults());
    }

    @Test
    void aStraightFrontHasItsSpeedAndBearing() {
        List<Track> tracks = measure(new InventedLoop(1, InventedFront.straight(new Point(-30, 0), 60, 12, 60)));
        assertThat(tracks).hasSize(1);
        assertThat(tracks.get(0).speed().speedMs()).isCloseTo(12, Offset.offset(0.4));
        assertThat(tracks.get(0).bearingDeg()).isCloseTo(60, Offset.offset(4.0));
        assertThat(tracks.get(0).arc()).isEmpty();
        assertThat(tracks.get(0).arcRefusal()).isNotBlank();
    }

    @Test
    void aGrowingRingHasItsExpansion() {
        List<Track> tracks = measure(new InventedLoop(2,
                InventedFront.ring(new Point(10, -20), new Point(2, 1), 10, 9, 0, 359)));
        assertThat(tracks.get(0).arc()).isPresent();
        assertThat(tracks.get(0).arc().get().expansion().speedMs()).isCloseTo(9, Offset.offset(0.4));
    }

    @Test
    void speedsAreNearTruthAndTheirDeviationsHonest() {
        int within = 0;
        int known = 0;
        double squares = 0;
        for (int seed = 0; seed < 6; seed++) {
            InventedLoop loop = new InventedLoop(100 + seed,
                    InventedFront.straight(new Point(-30, 5 * seed), 60 + 30 * seed, 4 + 3 * seed, 60));
            for (Track track : measure(loop)) {
                for (TrackPiece piece : track.pieces()) {
                    for (TrackVertex vertex : piece.vertices()) {
                        if (vertex.speed().isKnown()) {
                            double turn = Math.toRadians(vertex.normalBearingDeg() - 60 - 30 * seed);
                            double error = vertex.speed().speedMs() * Math.cos(turn) - 4 - 3 * seed;
                            squares += error * error;
                            within += Math.abs(error) <= 2 * vertex.speed().sdMs() ? 1 : 0;
                            known++;
                        }
                    }
                }
            }
        }
        double rmse = Math.sqrt(squares / known);
        
        assertThat(rmse).isLessThan(0.9);
        assertThat((double) within / known).isBetween(0.9, 1.0);
    }
}
