package hemline.viewer.viewmodel;

import static org.assertj.core.api.Assertions.assertThat;

import hemline.viewer.FakeLoop;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.concurrent.CompletableFuture;
import org.junit.jupiter.api.Test;

class SweepStoreTest {
    private final FakeLoop loop = new FakeLoop(8, 36, 50, true);
    private final long one = new HeldSweep(0, loop.sweep(0), loop.screened(0).map(s -> s.mask())).bytes();

    @Test
    void theSweepUnusedLongestGoesFirst() {
        SweepStore store = new SweepStore(loop, Runnable::run, 3 * one);
        store.load(0);
        store.load(1);
        store.load(2);
        store.peek(0);
        store.load(3);
        assertThat(store.peek(1)).isEmpty();
        assertThat(store.peek(0)).isPresent();
        assertThat(store.peek(3)).isPresent();
    }

    @Test
    void aSweepLargerThanTheBudgetIsStillShown() {
        SweepStore store = new SweepStore(loop, Runnable::run, 1);
        store.load(4);
        assertThat(store.peek(4)).isPresent();
    }

    @Test
    void aSweepOnItsWayIsNotLoadedTwice() {
        Deque<Runnable> waiting = new ArrayDeque<>();
        SweepStore store = new SweepStore(loop, waiting::add, 10 * one);
        CompletableFuture<HeldSweep> first = store.load(2);
        assertThat(store.load(2)).isSameAs(first);
        assertThat(waiting).hasSize(1);
        waiting.poll().run();
        assertThat(first).isCompleted();
    }

    @Test
    void aFailureCanBeTriedAgain() {
        SweepStore store = new SweepStore(new BrokenSweep(loop, 3), Runnable::run, 10 * one);
        assertThat(store.load(3)).isCompletedExceptionally();
        assertThat(store.load(3)).isCompletedExceptionally();
        assertThat(store.peek(3)).isEmpty();
    }
}
