package hemline.scoring;

import static hemline.scoring.Cases.boundary;
import static hemline.scoring.Cases.line;
import static hemline.scoring.Cases.piece;
import static hemline.scoring.Cases.track;
import static hemline.scoring.Cases.truth;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import hemline.boundary.Speed;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

class ScoresTest {
    private static Score found(int toX, double speedMs) {
        return Cases.score(truth(1, boundary("A", line(0, 0, 20, 0))),
                track("T1", piece(0, 0, toX, 0, 0, new Speed(speedMs, 1))));
    }

    @Test
    void lengthsAreAddedBeforeSharesAreTaken() {
        Score long40 = Cases.score(truth(1, boundary("A", line(0, 0, 40, 0))), track("T1", piece(0, 0, 40, 0)));
        Score pooled = Scores.pool(List.of(found(8, 10), long40));
        assertThat(pooled.value(Measure.RECALL)).isCloseTo((10 + 40) / 60.0, within(1e-9));
        assertThat(pooled.sceneNames()).hasSize(2);
    }

    @Test
    void errorsArePooledByLength() {
        Score pooled = Scores.pool(List.of(found(20, 12), found(8, 9)));
        // 20 km off by 2, 8 km off by -1.
        assertThat(pooled.value(Measure.SPEED_BIAS)).isCloseTo((2 * 20 - 8) / 28.0, within(1e-9));
        assertThat(pooled.value(Measure.SPEED_MEDIAN)).isCloseTo(2, within(1e-9));
        assertThat(pooled.value(Measure.SPEED_WITHIN_1)).isCloseTo(8 / 28.0, within(1e-9));
    }

    @Test
    void intervalsHoldTheValueAndAreTheSameEachTime() {
        List<Score> scores = new ArrayList<>();
        for (int i = 0; i < 12; i++) {
            scores.add(found(4 + i, 8 + i % 4));
        }
        Score pooled = Scores.pool(scores);
        for (Measure measure : List.of(Measure.RECALL, Measure.SPEED_RMSE)) {
            Interval interval = pooled.interval(measure);
            assertThat(interval.low()).isLessThan(pooled.value(measure));
            assertThat(interval.high()).isGreaterThan(pooled.value(measure));
            assertThat(Scores.pool(scores).interval(measure)).isEqualTo(interval);
        }
        // A mean of 12 shares 6/20..17/20 has a standard error of about 3.45 / 20 / sqrt(12) = 0.05.
        Interval recall = pooled.interval(Measure.RECALL);
        assertThat(recall.high() - recall.low()).isCloseTo(4 * 0.0498, within(0.04));
    }

    @Test
    void oneSceneHasNoInterval() {
        assertThat(Scores.pool(List.of(found(8, 10))).interval(Measure.RECALL)).isEqualTo(Interval.UNKNOWN);
    }

    @Test
    void scenesOfOneKindArePooledTogether() {
        assertThat(Scores.byScene(List.of(found(8, 10), found(20, 10)))).containsOnlyKeys("case");
    }

    @Test
    void nothingOrUnlikeSettingsCannotBePooled() {
        assertThatThrownBy(() -> Scores.pool(List.of())).hasMessageContaining("at least one");
        Score other = Scoring.score(truth(1), List.of(), List.of(), Cases.SETTINGS.withToleranceKm(3));
        assertThatThrownBy(() -> Scores.pool(List.of(found(8, 10), other))).hasMessageContaining("share their settings");
    }
}
