package hemline.scoring;

import static hemline.scoring.Cases.SETTINGS;
import static hemline.scoring.Cases.boundary;
import static hemline.scoring.Cases.line;
import static hemline.scoring.Cases.piece;
import static hemline.scoring.Cases.score;
import static hemline.scoring.Cases.track;
import static hemline.scoring.Cases.truth;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import hemline.boundary.Speed;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.boundary.truth.Truth;
import hemline.boundary.truth.Truth.TruthArc;
import hemline.boundary.truth.Truth.TruthDecoy;
import hemline.boundary.truth.Truth.TruthLine;
import hemline.boundary.truth.Truth.TruthVertex;
import hemline.geometry.Point;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/** All expected values are worked out by hand from the geometry of the cases. */
class ScoringTest {
    private static final double EPS = 1e-9;

    @Test
    void aLineFoundWholeScoresFull() {
        Score score = score(truth(1, boundary("A", line(0, 0, 20, 0))), track("T1", piece(0, 0, 20, 0.5)));
        assertThat(score.value(Measure.RECALL)).isEqualTo(1);
        assertThat(score.value(Measure.RECALL_8_14)).isEqualTo(1);
        assertThat(score.value(Measure.RECALL_4_8)).isNaN();
        assertThat(score.value(Measure.PRECISION)).isEqualTo(1);
        assertThat(score.value(Measure.BOUNDARIES_FOUND)).isEqualTo(1);
        assertThat(score.value(Measure.POSITION_MEDIAN)).isCloseTo(0.5, within(EPS));
        assertThat(score.value(Measure.POSITION_90)).isCloseTo(0.5, within(EPS));
        assertThat(score.value(Measure.FOUND_PER_TRUE)).isCloseTo(1, within(EPS));
        assertThat(score.value(Measure.SPEED_BIAS)).isNaN();
        assertThat(score.value(Measure.SPEED_GIVEN)).isEqualTo(0);
    }

    @Test
    void theToleranceReachesPastTheEndOfAFoundLine() {
        // Truth 20 km, found 10 km on it: elements with a middle up to x = 12 are within 2 km of its end.
        Score score = score(truth(1, boundary("A", line(0, 0, 20, 0))), track("T1", piece(0, 0, 10, 0)));
        assertThat(score.value(Measure.RECALL)).isCloseTo(12.0 / 20, within(EPS));
        assertThat(score.value(Measure.PRECISION)).isEqualTo(1);
    }

    @Test
    void lengthRunningOnPastTheTruthIsRightUpToTheToleranceThenFalse() {
        Score score = score(truth(1, boundary("A", line(0, 0, 10, 0))), track("T1", piece(0, 0, 20, 0)));
        assertThat(score.value(Measure.RECALL)).isEqualTo(1);
        assertThat(score.value(Measure.PRECISION)).isCloseTo(12.0 / 20, within(EPS));
        assertThat(score.value(Measure.FALSE_KM_PER_SWEEP)).isCloseTo(8, within(EPS));
        // Length past the end is a matter of length, not of position.
        assertThat(score.value(Measure.POSITION_90)).isCloseTo(0, within(EPS));
    }

    @Test
    void aLineBeyondTheToleranceIsBothMissedAndFalse() {
        Score score = score(truth(1, boundary("A", line(0, 0, 20, 0))), track("T1", piece(0, 0, 20, 2.01)));
        assertThat(score.value(Measure.RECALL)).isEqualTo(0);
        assertThat(score.value(Measure.PRECISION)).isEqualTo(0);
        assertThat(score.value(Measure.BOUNDARIES_FOUND)).isEqualTo(0);
        assertThat(score(truth(1, boundary("A", line(0, 0, 20, 0))), track("T1", piece(0, 0, 20, 2)))
                .value(Measure.RECALL)).isEqualTo(1);
    }

    @Test
    void aCrossingLineIsFalseAndFindsNothing() {
        List<TrackVertex> vertices = new ArrayList<>();
        for (int y = -10; y <= 10; y++) {
            vertices.add(new TrackVertex(new Point(10, y), Cases.timeMs(0), 10, 500, Double.NaN, Speed.UNKNOWN, true));
        }
        TrackPiece across = new TrackPiece(0, hemline.boundary.BoundaryKind.THIN_LINE, hemline.boundary.Origin.AUTO,
                vertices);
        Score score = score(truth(1, boundary("A", line(0, 0, 20, 0))), track("T1", across));
        assertThat(score.value(Measure.RECALL)).isEqualTo(0);
        assertThat(score.value(Measure.PRECISION)).isEqualTo(0);
    }

    @Test
    void hiddenTruthNeitherHasToBeFoundNorMakesAFindFalse() {
        Truth truth = truth(1, boundary("A", line(0, 0, 10, 0), line(0, 30, 50, 0, 0.2, 10)));
        Score missed = score(truth, track("T1", piece(0, 0, 10, 0)));
        assertThat(missed.value(Measure.RECALL)).isEqualTo(1);
        Score found = score(truth, track("T1", piece(0, 30, 50, 0)));
        assertThat(found.value(Measure.RECALL)).isEqualTo(0);
        assertThat(found.value(Measure.PRECISION)).isNaN();
        assertThat(found.value(Measure.FALSE_KM_PER_SWEEP)).isEqualTo(0);
    }

    @Test
    void detectabilityFadesBetweenVertices() {
        TruthLine fading = new TruthLine(0, List.of(new TruthVertex(0, 0, Cases.timeMs(0), 1, 10, 0, 10),
                new TruthVertex(10, 0, Cases.timeMs(0), 0, 10, 0, 10)));
        SceneTally tally = score(truth(1, boundary("A", fading))).scenes().get(0);
        assertThat(tally.detectable().allKm()).isCloseTo(5, within(EPS));
    }

    @Test
    void recallIsToldByStrength() {
        Truth truth = truth(1, boundary("A", line(0, 0, 10, 0, 1, 5)), boundary("B", line(0, 0, 10, 20, 1, 9)),
                boundary("C", line(0, 0, 10, 40, 1, 15)), boundary("D", line(0, 0, 10, 60, 1, 3)));
        Score score = score(truth, track("T1", piece(0, 0, 10, 20)), track("T2", piece(0, 0, 3, 40)));
        assertThat(score.value(Measure.RECALL_BELOW_4)).isEqualTo(0);
        assertThat(score.value(Measure.RECALL_4_8)).isEqualTo(0);
        assertThat(score.value(Measure.RECALL_8_14)).isEqualTo(1);
        assertThat(score.value(Measure.RECALL_14_UP)).isCloseTo(0.5, within(EPS));
        assertThat(score.value(Measure.RECALL)).isCloseTo(15.0 / 40, within(EPS));
        assertThat(score.value(Measure.BOUNDARIES_FOUND)).isEqualTo(0.5);
    }

    @Test
    void speedsAreComparedAlongTheTrueNormal() {
        Truth truth = truth(2, boundary("A", line(0, 0, 20, 0), line(1, 0, 20, 3)));
        // 11 m/s toward 0 degrees, then 10 m/s toward 60 degrees: 5 m/s along the true normal.
        Track track = track("T1", piece(0, 0, 20, 0, 0, new Speed(11, 0.6)),
                piece(1, 0, 20, 3, 60, new Speed(10, 2.6)));
        Score score = score(truth, track);
        assertThat(score.value(Measure.SPEED_BIAS)).isCloseTo((1 - 5) / 2.0, within(EPS));
        assertThat(score.value(Measure.SPEED_RMSE)).isCloseTo(Math.sqrt((1 + 25) / 2.0), within(EPS));
        assertThat(score.value(Measure.SPEED_MEDIAN)).isCloseTo(1, within(EPS));
        assertThat(score.value(Measure.SPEED_WITHIN_1)).isEqualTo(0);
        assertThat(score.value(Measure.SPEED_WITHIN_2)).isCloseTo(1, within(EPS));
        assertThat(score.value(Measure.SPEED_GIVEN)).isEqualTo(1);
        assertThat(score.value(Measure.SPEED_RMSE_LONG)).as("seen in two sweeps only").isNaN();
    }

    @Test
    void aSpeedTowardTheWrongSideIsAnErrorOfBothSpeeds() {
        Score score = score(truth(1, boundary("A", line(0, 0, 20, 0))),
                track("T1", piece(0, 0, 20, 0, 180, new Speed(10, 1))));
        assertThat(score.value(Measure.SPEED_BIAS)).isCloseTo(-20, within(EPS));
    }

    @Test
    void identityIsPurityContinuityAndSwitches() {
        Truth truth = truth(4, boundary("A", line(0, 0, 10, 0), line(1, 0, 10, 3), line(2, 0, 10, 6),
                line(3, 0, 10, 9)), boundary("B", line(3, 0, 10, 40)));
        // T1 follows A for two sweeps and jumps to B in the last; T2 takes over A in sweep 2.
        Track first = track("T1", piece(0, 0, 10, 0), piece(1, 0, 10, 3), piece(3, 0, 10, 40));
        Track second = track("T2", piece(2, 0, 10, 6), piece(3, 0, 10, 9));
        Score score = score(truth, first, second);
        assertThat(score.value(Measure.RECALL)).isEqualTo(1);
        assertThat(score.value(Measure.PURITY)).isCloseTo((20 + 20) / 50.0, within(EPS));
        assertThat(score.value(Measure.CONTINUITY)).isCloseTo((20 + 10) / 50.0, within(EPS));
        assertThat(score.value(Measure.SWITCHES)).isEqualTo(1);
        assertThat(score.value(Measure.SWITCH_SHARE)).isCloseTo(1 / 3.0, within(EPS));
    }

    @Test
    void nearTwoBoundariesATrackKeepsToTheOneItFollows() {
        Truth truth = truth(2, boundary("A", line(0, 0, 20, 0), line(1, 0, 20, 3)),
                boundary("B", line(0, 0, 20, 30), line(1, 0, 20, 4.5)));
        // In sweep 1 the found line lies nearer to B, but it is A's track.
        Score score = score(truth, track("T1", piece(0, 0, 20, 0), piece(1, 0, 20, 4)));
        assertThat(score.value(Measure.PURITY)).isEqualTo(1);
        assertThat(score.value(Measure.POSITION_90)).isCloseTo(1, within(EPS));
    }

    @Test
    void expansionIsComparedOverTheSweepsFollowed() {
        Truth truth = truth(3, Cases.withArcs(boundary("A", line(0, 0, 10, 0), line(1, 0, 10, 3), line(2, 0, 10, 6)),
                new TruthArc(0, Cases.timeMs(0), 5, -20, 20, 12), new TruthArc(1, Cases.timeMs(1), 5, -20, 23, 8),
                new TruthArc(2, Cases.timeMs(2), 5, -20, 25, 2)));
        Track track = Cases.withExpansion(track("T1", piece(0, 0, 10, 0), piece(1, 0, 10, 3)), new Speed(11.5, 1));
        Score score = score(truth, track);
        assertThat(score.value(Measure.EXPANSION_BIAS)).isCloseTo(1.5, within(EPS));
        assertThat(score.value(Measure.EXPANSION_WITHIN_1)).isEqualTo(0);
        assertThat(score.value(Measure.EXPANSION_WITHIN_2)).isEqualTo(1);
        assertThat(score.value(Measure.EXPANSION_GIVEN)).isEqualTo(1);
        Score refused = score(truth, track("T1", piece(0, 0, 10, 0), piece(1, 0, 10, 3)));
        assertThat(refused.value(Measure.EXPANSION_BIAS)).isNaN();
        assertThat(refused.value(Measure.EXPANSION_GIVEN)).isEqualTo(0);
    }

    @Test
    void falseLengthIsPutDownToTheDecoyItLiesOn() {
        Truth truth = Cases.with(truth(2), List.of(new TruthDecoy("roost", List.of(line(0, 0, 20, 50))),
                new TruthDecoy("roll", List.of(line(1, 0, 20, -50)))), List.of());
        Score score = score(truth, track("T1", piece(0, 0, 20, 52), piece(0, 0, 10, 0)));
        assertThat(score.falseKmPerSweepByCause()).containsOnlyKeys("roost", "roll", "other");
        assertThat(score.falseKmPerSweepByCause().get("roost")).isCloseTo(10, within(EPS));
        assertThat(score.falseKmPerSweepByCause().get("roll")).isEqualTo(0);
        assertThat(score.falseKmPerSweepByCause().get("other")).isCloseTo(5, within(EPS));
        assertThat(score.value(Measure.FALSE_KM_PER_NULL_SWEEP)).isCloseTo(15, within(EPS));
        assertThat(score.value(Measure.RECALL)).isNaN();
    }

    @Test
    void linesBelongToTheSweepNearestInTimeWhateverTheirIndex() {
        Truth truth = truth(3, boundary("A", line(2, 0, 20, 0)));
        TrackPiece piece = piece(2, 0, 20, 0);
        TrackPiece renumbered = new TrackPiece(0, piece.kind(), piece.origin(), piece.vertices());
        assertThat(score(truth, track("T1", renumbered)).value(Measure.RECALL)).isEqualTo(1);
    }

    @Test
    void anotherLoopIsCautionedAgainst() {
        Truth truth = truth(1, boundary("A", line(0, 0, 20, 0)));
        assertThat(score(truth, track("T1", piece(5, 0, 20, 0))).cautions())
                .singleElement().asString().contains("1490 s from the nearest sweep");
        assertThat(score(truth, track("T1", piece(0, 0, 20, 0))).cautions()).isEmpty();
    }

    @Test
    void aTruthWithoutSweepsIsRefused() {
        assertThatThrownBy(() -> score(truth(0))).isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("at least one sweep");
        assertThatThrownBy(() -> score(truth(1, boundary("A", line(4, 0, 20, 0)))))
                .isInstanceOf(IllegalArgumentException.class).hasMessageContaining("sweep 4");
    }

    @Test
    void settingsOutOfBoundsAreRefused() {
        assertThatThrownBy(() -> SETTINGS.withToleranceKm(0)).hasMessageContaining("above 0, got 0.0");
        assertThatThrownBy(() -> SETTINGS.withMeetings(8, -1)).hasMessageContaining("above 0, got -1.0");
        assertThatThrownBy(() -> SETTINGS.withBootstrap(-1, 1)).hasMessageContaining("at least 0, got -1");
    }
}
