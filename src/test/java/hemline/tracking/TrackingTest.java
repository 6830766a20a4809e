package hemline.tracking;

import static org.assertj.core.api.Assertions.assertThat;

import hemline.boundary.Track;
import hemline.geometry.Point;
import hemline.sweep.Progress;
import java.util.List;
import org.junit.jupiter.api.Test;

class TrackingTest {
    private static List<Track> link(InventedLoop loop) {
        return Tracking.link(loop.found(), loop.frames(), TrackingSettings.defaults(), Progress.NONE);
    }

    @Test
    void aStraightFrontAmongFalseLinesIsOneTrack() {
        List<Track> tracks = link(new InventedLoop(1, InventedFront.straight(new Point(-30, 0), 90, 12, 60)));
        assertThat(tracks).hasSize(1);
        assertThat(tracks.get(0).sweepCount()).isEqualTo(12);
    }

    @Test
    void aRingIsOneTrack() {
        List<Track> tracks = link(new InventedLoop(2,
                InventedFront.ring(new Point(10, -20), new Point(2, 1), 10, 9, 0, 359)));
        assertThat(tracks).hasSize(1);
    }

    @Test
    void frontsMeetingHeadOnKeepTheirIdentities() {
        List<Track> tracks = link(new InventedLoop(3,
                InventedFront.straight(new Point(-30, 0), 90, 10, 60),
                InventedFront.straight(new Point(30, 0), 270, 10, 60)));
        assertThat(tracks).hasSize(2);
    }

    @Test
    void identityOutlastsMissedSweepsAndIrregularIntervals() {
        List<Track> tracks = link(new InventedLoop(4,
                InventedFront.straight(new Point(-30, 0), 60, 11, 50))
                .at(0, 280, 610, 880, 1500, 1810, 2100, 2390, 2990, 3300).missing(5, 6));
        assertThat(tracks).hasSize(1);
        assertThat(tracks.get(0).sweepCount()).isGreaterThanOrEqualTo(8);
    }

    @Test
    void falseLinesAloneGiveNoTrack() {
        for (int seed = 0; seed < 10; seed++) {
            assertThat(link(new InventedLoop(seed).falseLines(6))).isEmpty();
        }
    }

    @Test
    void withoutHintsOfMotionTheSameTracksAreFound() {
        List<Track> tracks = link(new InventedLoop(5,
                InventedFront.ring(new Point(-40, 10), new Point(0, 0), 15, 10, 0, 180),
                InventedFront.straight(new Point(60, 0), 270, 8, 70)).hints(false));
        assertThat(tracks).hasSize(2);
    }
}
