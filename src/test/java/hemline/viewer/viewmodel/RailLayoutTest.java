package hemline.viewer.viewmodel;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import hemline.viewer.FakeLoop;
import java.util.List;
import org.junit.jupiter.api.Test;

class RailLayoutTest {
    private final FakeLoop loop = FakeLoop.small(true);
    private final RailLayout rail = RailLayout.of(loop, 900, 110);

    @Test
    void aMissedSweepLeavesAHole() {
        List<Double> x = rail.sweepX();
        double step = x.get(1) - x.get(0);
        assertThat(x.get(FakeLoop.HOLE_AFTER + 1) - x.get(FakeLoop.HOLE_AFTER)).isCloseTo(2 * step, within(1e-6));
    }

    @Test
    void everyTrackHasABarFromItsFirstToItsLastRay() {
        assertThat(rail.bars()).hasSize(3);
        rail.bars().forEach(bar -> {
            assertThat(bar.fromX()).isCloseTo(rail.scale().x(bar.track().firstMs()), within(1e-6));
            assertThat(bar.toX()).isCloseTo(rail.scale().x(bar.track().lastMs()), within(1e-6));
            assertThat(bar.y() + bar.height()).isLessThanOrEqualTo(110);
        });
    }

    @Test
    void barsDoNotOverlap() {
        for (RailLayout.Bar a : rail.bars()) {
            for (RailLayout.Bar b : rail.bars()) {
                boolean apart = a == b || a.toX() < b.fromX() || b.toX() < a.fromX() || a.y() + a.height() <= b.y()
                        || b.y() + b.height() <= a.y();
                assertThat(apart).isTrue();
            }
        }
    }

    @Test
    void scrubbingFindsTheNearestSweep() {
        assertThat(rail.sweepAt(-50)).isZero();
        assertThat(rail.sweepAt(rail.sweepX().get(4) + 3)).isEqualTo(4);
        assertThat(rail.sweepAt(5000)).isEqualTo(11);
    }

    @Test
    void barsAndMarksCanBeHit() {
        RailLayout.Bar bar = rail.bars().get(1);
        assertThat(rail.trackAt(bar.fromX() + 10, bar.y() + 2)).contains(bar.track());
        assertThat(rail.trackAt(bar.fromX() + 10, 5)).isEmpty();
        RailLayout.Mark mark = rail.meetings().get(0);
        assertThat(rail.meetingAt(mark.x() + 4, mark.y() - 4)).contains(mark.meeting());
    }

    @Test
    void anExpectedMeetingSoonAfterTheLoopIsOnTheRail() {
        assertThat(rail.meetings()).extracting(m -> m.meeting().id()).containsExactly("M1", "M2");
        assertThat(rail.meetings().get(1).x()).isGreaterThan(rail.sweepX().get(11));
    }

    @Test
    void aSingleSweepStillHasAnAxis() {
        RailLayout one = RailLayout.of(new FakeLoop(1, 36, 40, false), 500, 100);
        assertThat(one.sweepX()).hasSize(1);
        assertThat(one.sweepX().get(0)).isFinite();
    }

    @Test
    void ticksAreRoundTimesFarEnoughApart() {
        List<Long> ticks = rail.scale().ticks(64);
        assertThat(ticks).isNotEmpty().allSatisfy(t -> assertThat(t % 300_000).isZero());
        assertThat(rail.scale().x(ticks.get(1)) - rail.scale().x(ticks.get(0))).isGreaterThanOrEqualTo(64);
    }
}
