package hemline.scoring;

import static hemline.scoring.Cases.SETTINGS;
import static hemline.scoring.Cases.meeting;
import static hemline.scoring.Cases.trueMeeting;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import hemline.boundary.Meeting;
import hemline.boundary.truth.Truth;
import java.util.List;
import org.junit.jupiter.api.Test;

class MeetingTallyTest {
    private static final long T0 = Cases.timeMs(3);

    private static Score score(List<Meeting> found, Truth.TruthMeeting... truth) {
        return Scoring.score(Cases.with(Cases.truth(6), List.of(), List.of(truth)), List.of(), found, SETTINGS);
    }

    @Test
    void aHitHasItsPlaceAndTimeError() {
        Score score = score(List.of(meeting("M1", 3, 4, T0 + 120_000, 61)), trueMeeting(0, 0, T0, true));
        assertThat(score.value(Measure.MEETING_HITS)).isEqualTo(1);
        assertThat(score.value(Measure.MEETING_FOUND_SHARE)).isEqualTo(1);
        assertThat(score.value(Measure.MEETING_FALSE_SHARE)).isEqualTo(0);
        assertThat(score.value(Measure.MEETING_PLACE)).isCloseTo(5, within(1e-9));
        assertThat(score.value(Measure.MEETING_TIME)).isCloseTo(2, within(1e-9));
        assertThat(score.value(Measure.MEETING_TIME_BIAS)).isCloseTo(2, within(1e-9));
        assertThat(score.value(Measure.MEETING_WITHIN_2)).isEqualTo(1);
    }

    @Test
    void tooFarInPlaceOrTimeIsAMissAndAFalseAlarm() {
        Score far = score(List.of(meeting("M1", 8.1, 0, T0, 60)), trueMeeting(0, 0, T0, true));
        assertThat(far.value(Measure.MEETING_MISSES)).isEqualTo(1);
        assertThat(far.value(Measure.MEETING_FALSE)).isEqualTo(1);
        Score late = score(List.of(meeting("M1", 0, 0, T0 + 601_000, 60)), trueMeeting(0, 0, T0, true));
        assertThat(late.value(Measure.MEETING_FOUND_SHARE)).isEqualTo(0);
        assertThat(late.value(Measure.MEETING_FALSE_SHARE)).isEqualTo(1);
    }

    @Test
    void eachTrueMeetingIsFoundOnceTheNearestFirst() {
        Score score = score(List.of(meeting("M1", 4, 0, T0, 60), meeting("M2", 1, 0, T0, 60)),
                trueMeeting(0, 0, T0, true));
        assertThat(score.value(Measure.MEETING_HITS)).isEqualTo(1);
        assertThat(score.value(Measure.MEETING_FALSE)).isEqualTo(1);
        assertThat(score.value(Measure.MEETING_PLACE)).isCloseTo(1, within(1e-9));
    }

    @Test
    void aHiddenMeetingIsNoMissAndFindingItNoFalseAlarm() {
        Score unseen = score(List.of(), trueMeeting(0, 0, T0, false));
        assertThat(unseen.value(Measure.MEETING_MISSES)).isEqualTo(0);
        assertThat(unseen.value(Measure.MEETING_FOUND_SHARE)).isNaN();
        Score found = score(List.of(meeting("M1", 1, 0, T0, 60)), trueMeeting(0, 0, T0, false));
        assertThat(found.value(Measure.MEETING_HITS)).isEqualTo(0);
        assertThat(found.value(Measure.MEETING_FALSE)).isEqualTo(0);
    }

    @Test
    void expectedMeetingsAreNotScored() {
        Meeting seen = meeting("M1", 0, 0, T0, 60);
        Meeting expected = new Meeting("M2", "T1", "T2", T0, 60, seen.place(), seen.ellipse(), 30, seen.closing(),
                Meeting.Status.EXPECTED, 0.7);
        assertThat(score(List.of(expected)).value(Measure.MEETING_FALSE)).isEqualTo(0);
    }
}
