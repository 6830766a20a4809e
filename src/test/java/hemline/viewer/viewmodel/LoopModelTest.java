package hemline.viewer.viewmodel;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

class LoopModelTest {
    private final LoopModel loop = new LoopModel();

    @BeforeEach
    void openFive() {
        loop.open(5);
    }

    @Test
    void opensOnTheNewestSweep() {
        assertThat(loop.index()).isEqualTo(4);
        assertThat(loop.motionProperty().get()).isEqualTo(Motion.STILL);
    }

    @Test
    void steppingWrapsWithinTheRange() {
        loop.limit(1, 3);
        assertThat(loop.index()).isEqualTo(3);
        loop.step(1);
        assertThat(loop.index()).isEqualTo(1);
        loop.step(-1);
        assertThat(loop.index()).isEqualTo(3);
    }

    @Test
    void indexStaysWithinTheLoop() {
        loop.show(99);
        assertThat(loop.index()).isEqualTo(4);
        loop.show(-3);
        assertThat(loop.index()).isZero();
    }

    @Test
    void playingHoldsOnTheLastSweep() {
        loop.sweepsPerSecondProperty().set(2);
        loop.holdSecondsProperty().set(1);
        loop.show(3);
        loop.toggle(Motion.FORWARD);
        loop.advance(0.5);
        assertThat(loop.index()).isEqualTo(4);
        loop.advance(1.4);
        assertThat(loop.index()).as("still held").isEqualTo(4);
        loop.advance(0.1);
        assertThat(loop.index()).isZero();
    }

    @Test
    void playsEverySweepHoweverSlowTheScreen() {
        loop.show(0);
        loop.sweepsPerSecondProperty().set(30);
        loop.toggle(Motion.FORWARD);
        assertThat(visited(4, 0.4)).containsExactly(1, 2, 3, 4);
    }

    @Test
    void playsBackward() {
        loop.holdSecondsProperty().set(0);
        loop.show(2);
        loop.toggle(Motion.BACK);
        assertThat(visited(4, 0.25)).containsExactly(1, 0, 4, 3);
    }

    @Test
    void rocksBetweenTheEndsOfTheRange() {
        loop.holdSecondsProperty().set(0);
        loop.limit(1, 3);
        loop.show(1);
        loop.toggle(Motion.ROCK);
        assertThat(visited(6, 0.25)).containsExactly(2, 3, 2, 1, 2, 3);
    }

    @Test
    void togglingTwiceStops() {
        loop.toggle(Motion.FORWARD);
        loop.toggle(Motion.FORWARD);
        assertThat(loop.motionProperty().get()).isEqualTo(Motion.STILL);
    }

    @Test
    void steppingStopsPlaying() {
        loop.toggle(Motion.FORWARD);
        loop.step(1);
        assertThat(loop.motionProperty().get()).isEqualTo(Motion.STILL);
    }

    @Test
    void speedStaysWithinItsBounds() {
        for (int i = 0; i < 30; i++) {
            loop.faster();
        }
        assertThat(loop.sweepsPerSecondProperty().get()).isEqualTo(LoopModel.MAX_SWEEPS_PER_SECOND);
        for (int i = 0; i < 60; i++) {
            loop.slower();
        }
        assertThat(loop.sweepsPerSecondProperty().get()).isEqualTo(LoopModel.MIN_SWEEPS_PER_SECOND);
    }

    @Test
    void aNewSweepMovesOnlyAViewThatWasOnTheNewest() {
        loop.grow(6);
        assertThat(loop.index()).isEqualTo(5);
        loop.show(2);
        loop.grow(7);
        assertThat(loop.index()).isEqualTo(2);
        assertThat(loop.lastProperty().get()).isEqualTo(6);
    }

    @Test
    void aNewSweepLeavesAChosenRangeAlone() {
        loop.limit(1, 3);
        loop.grow(6);
        assertThat(loop.lastProperty().get()).isEqualTo(3);
    }

    @Test
    void anEmptyLoopCannotPlayOrStep() {
        loop.open(0);
        loop.toggle(Motion.FORWARD);
        loop.step(1);
        assertThat(loop.motionProperty().get()).isEqualTo(Motion.STILL);
        assertThat(loop.index()).isZero();
    }

    private List<Integer> visited(int moves, double everySeconds) {
        List<Integer> seen = new ArrayList<>();
        for (int i = 0; i < moves; i++) {
            loop.advance(everySeconds);
            seen.add(loop.index());
        }
        return seen;
    }
}
