package hemline.viewer.viewmodel;

import hemline.sweep.ScreenedSweep;
import hemline.workflow.LoopSession;
import java.util.HashMap;
import java.util.Iterator;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.Executor;

/**
 * Sweeps of one session, loaded off the drawing thread and kept while there is room; the one unused longest goes
 * first. Safe for use by several threads.
 */
public final class SweepStore {
    private final LoopSession session;
    private final Executor background;
    private final long budgetBytes;
    private final LinkedHashMap<Integer, HeldSweep> held = new LinkedHashMap<>(16, 0.75f, true);
    private final Map<Integer, CompletableFuture<HeldSweep>> loading = new HashMap<>();
    private long heldBytes;

    /** @param budgetBytes what may stay in memory; the sweep asked for last always stays */
    public SweepStore(LoopSession session, Executor background, long budgetBytes) {
        this.session = session;
        this.background = background;
        this.budgetBytes = budgetBytes;
    }

    /** The sweep if it is in memory; never waits for a file. */
    public synchronized Optional<HeldSweep> peek(int index) {
        return Optional.ofNullable(held.get(index));
    }

    /** The sweep, now or later; fails with what the session threw when it cannot be read. */
    public CompletableFuture<HeldSweep> load(int index) {
        CompletableFuture<HeldSweep> promise = new CompletableFuture<>();
        synchronized (this) {
            HeldSweep there = held.get(index);
            if (there != null) {
                return CompletableFuture.completedFuture(there);
            }
            CompletableFuture<HeldSweep> already = loading.get(index);
            if (already != null) {
                return already;
            }
            loading.put(index, promise);
        }
        background.execute(() -> fulfil(index, promise));
        return promise;
    }

    private void fulfil(int index, CompletableFuture<HeldSweep> promise) {
        try {
            Optional<ScreenedSweep> screened = session.screened(index);
            HeldSweep sweep = screened.map(s -> new HeldSweep(index, s.raw(), Optional.of(s.mask())))
                    .orElseGet(() -> new HeldSweep(index, session.sweep(index), Optional.empty()));
            keep(sweep);
            promise.complete(sweep);
        } catch (RuntimeException | OutOfMemoryError e) {
            synchronized (this) {
                loading.remove(index);
            }
            promise.completeExceptionally(e);
        }
    }

    private synchronized void keep(HeldSweep sweep) {
        loading.remove(sweep.index());
        held.put(sweep.index(), sweep);
        heldBytes += sweep.bytes();
        Iterator<HeldSweep> oldest = held.values().iterator();
        while (heldBytes > budgetBytes && held.size() > 1) {
            heldBytes -= oldest.next().bytes();
            oldest.remove();
        }
    }
}
