package hemline.scoring;

import static hemline.scoring.Cases.SETTINGS;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import hemline.boundary.Meeting;
import hemline.boundary.Speed;
import hemline.boundary.truth.Truth;
import hemline.geometry.Point;
import hemline.scoring.ForecastScoring.Issued;
import java.util.List;
import org.junit.jupiter.api.Test;

class ForecastScoringTest {
    private static final long MEETS = Cases.START_MS + 30 * 60_000;

    private static Truth truth(boolean detectable) {
        return Cases.with(Cases.truth(12), List.of(), List.of(Cases.trueMeeting(0, 0, MEETS, detectable)));
    }

    private static Meeting foreseen(double x, long timeMs, double probability) {
        return new Meeting("M", "T1", "T2", timeMs, 120, new Point(x, 0), new Meeting.Ellipse(1, 1, 0), 30,
                new Speed(15, 2), Meeting.Status.EXPECTED, probability);
    }

    private static Issued issued(int minutesAhead, Meeting... meetings) {
        return new Issued(MEETS - minutesAhead * 60_000L, List.of(meetings));
    }

    @Test
    void hitsAreToldByLeadTimeWithTheirErrors() {
        ForecastScore score = ForecastScoring.score(truth(true), List.of(
                issued(20, foreseen(3, MEETS + 180_000, 0.9)), issued(10, foreseen(1, MEETS - 60_000, 0.8)),
                issued(30)), SETTINGS);
        ForecastScore.Lead ten = score.leads().get(0);
        ForecastScore.Lead twenty = score.leads().get(1);
        ForecastScore.Lead thirty = score.leads().get(2);
        assertThat(ten.minutes()).isEqualTo(10);
        assertThat(List.of(ten.opportunities(), ten.hits(), ten.falseAlarms())).containsExactly(1, 1, 0);
        assertThat(ten.placeMedianKm()).isCloseTo(1, within(1e-9));
        assertThat(ten.timeBiasMin()).isCloseTo(-1, within(1e-9));
        assertThat(twenty.timeMedianMin()).isCloseTo(3, within(1e-9));
        assertThat(twenty.withinTwoSd()).isEqualTo(1);
        assertThat(List.of(thirty.opportunities(), thirty.hits())).containsExactly(1, 0);
        assertThat(thirty.placeMedianKm()).isNaN();
    }

    @Test
    void whatDoesNotComeIsAFalseAlarmAndReliabilityCountsEveryProbability() {
        ForecastScore score = ForecastScoring.score(truth(true), List.of(
                issued(20, foreseen(50, MEETS, 0.7), foreseen(0, MEETS, 0.3))), SETTINGS);
        assertThat(score.leads().get(1).hits()).as("too unlikely to count as said").isZero();
        assertThat(score.leads().get(1).falseAlarms()).isEqualTo(1);
        ForecastScore.Reliability unlikely = score.reliability().get(1);
        assertThat(unlikely.forecasts()).isEqualTo(1);
        assertThat(unlikely.stated()).isCloseTo(0.3, within(1e-9));
        assertThat(unlikely.came()).isEqualTo(1);
        assertThat(score.reliability().get(3).came()).isZero();
        assertThat(score.brier()).isCloseTo((0.49 + 0.49) / 2, within(1e-9));
    }

    @Test
    void hiddenPastAndLaterMeetingsAreLeftOut() {
        ForecastScore hidden = ForecastScoring.score(truth(false), List.of(issued(20, foreseen(0, MEETS, 0.9))), SETTINGS);
        assertThat(hidden.leads()).allMatch(l -> l.opportunities() == 0 && l.hits() == 0 && l.falseAlarms() == 0);
        assertThat(hidden.reliability().get(4).came()).isEqualTo(1);
        long afterEnd = Cases.START_MS + 12 * Cases.STEP_MS + 60_000;
        ForecastScore other = ForecastScoring.score(truth(true), List.of(
                new Issued(afterEnd - 600_000, List.of(foreseen(0, afterEnd, 0.9), foreseen(0, MEETS, 0.9)))), SETTINGS);
        assertThat(other.brier()).isNaN();
        assertThat(other.leads()).allMatch(l -> l.falseAlarms() == 0);
    }
}
