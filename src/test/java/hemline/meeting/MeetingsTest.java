package hemline.meeting;

import static org.assertj.core.api.Assertions.assertThat;

import hemline.boundary.Meeting;
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

class MeetingsTest {
    private static List<Meeting> meetings(InventedLoop loop) {
        List<Track> tracks = Tracking.link(loop.found(), loop.frames(), TrackingSettings.defaults(), Progress.NONE);
        tracks = Kinematics.measure(tracks, loop.frames(), KinematicsSettings.defaults());
        return Meetings.find(tracks, loop.frames(), MeetingSettings.defaults());
    }

    @Test
    void ringsThatGrowIntoEachOtherMeetWhereAndWhenTheyDo() {
        // Gap 60 - 30 km at the start, closing at 20 m/s: contact after 1500 s, half way.
        List<Meeting> meetings = meetings(new InventedLoop(1,
                InventedFront.ring(new Point(-30, 10), new Point(0, 0), 15, 10, 0, 180),
                InventedFront.ring(new Point(30, 10), new Point(0, 0), 15, 10, 180, 360)).every(280, 12));
        assertThat(meetings).hasSize(1);
        Meeting meeting = meetings.get(0);
        assertThat(InventedLoop.secondsAt(meeting.timeMs())).isCloseTo(1500, Offset.offset(120.0));
        assertThat(meeting.place().distanceKm(new Point(0, 10))).isLessThan(8);
        assertThat(meeting.closing().speedMs()).isCloseTo(20, Offset.offset(2.0));
        assertThat(meeting.status()).isEqualTo(Meeting.Status.OBSERVED);
    }

    @Test
    void frontsThatMoveApartDoNotMeet() {
        assertThat(meetings(new InventedLoop(2,
                InventedFront.straight(new Point(-20, 0), 270, 10, 60),
                InventedFront.straight(new Point(20, 0), 90, 10, 60)))).isEmpty();
    }

    @Test
    void ringsThatWillMeetAfterTheLoopAreExpectedTo() {
        // Gap 70 km at the start, closing at 20 m/s: contact after 3500 s; the loop ends at 2240 s.
        InventedLoop loop = new InventedLoop(3,
                InventedFront.ring(new Point(-50, 10), new Point(0, 0), 15, 10, 0, 180),
                InventedFront.ring(new Point(50, 10), new Point(0, 0), 15, 10, 180, 360)).every(280, 9);
        List<Meeting> meetings = meetings(loop);
        assertThat(meetings).hasSize(1);
        Meeting meeting = meetings.get(0);
        assertThat(meeting.status()).isEqualTo(Meeting.Status.EXPECTED);
        double errorS = InventedLoop.secondsAt(meeting.timeMs()) - 3500;
        assertThat(Math.abs(errorS)).isLessThan(Math.min(300, 3 * meeting.timeSdS()));
        assertThat(meeting.place().distanceKm(new Point(0, 10))).isLessThan(10);
        assertThat(meeting.probability()).isGreaterThan(0.8);
        assertThat(meetings(loop)).isEqualTo(meetings);
    }
}
