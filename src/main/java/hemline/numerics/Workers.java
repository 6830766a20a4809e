package hemline.numerics;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.concurrent.CancellationException;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.BooleanSupplier;
import java.util.function.IntFunction;

/**
 * Runs numbered, independent tasks on a fixed number of threads and gives their results in task order, so that
 * what comes out never depends on the number of threads or on their timing.
 */
public final class Workers implements AutoCloseable {
    private final int threads;
    private final ExecutorService pool;

    public Workers(int threads) {
        if (threads < 1) {
            throw new IllegalArgumentException("at least one thread is needed, got " + threads);
        }
        this.threads = threads;
        AtomicInteger number = new AtomicInteger();
        pool = threads == 1 ? null : Executors.newFixedThreadPool(threads, task -> {
            Thread thread = new Thread(task, "hemline-worker-" + number.incrementAndGet());
            thread.setDaemon(true);
            return thread;
        });
    }

    public int threads() {
        return threads;
    }

    /**
     * Results of tasks 0 to {@code count − 1}, in that order. Must not be called from within a task of this object.
     *
     * @param cancelled asked before each task; once true, no further task starts
     * @throws CancellationException if cancelled
     */
    public <T> List<T> map(int count, BooleanSupplier cancelled, IntFunction<T> task) {
        List<T> results = new ArrayList<>(count);
        if (pool == null) {
            for (int i = 0; i < count; i++) {
                check(cancelled);
                results.add(task.apply(i));
            }
            return results;
        }
        List<Future<T>> running = new ArrayList<>(count);
        for (int i = 0; i < count; i++) {
            int index = i;
            Callable<T> call = () -> {
                check(cancelled);
                return task.apply(index);
            };
            running.add(pool.submit(call));
        }
        try {
            for (Future<T> one : running) {
                results.add(one.get());
            }
            return results;
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new CancellationException("interrupted");
        } catch (ExecutionException e) {
            if (e.getCause() instanceof RuntimeException unchecked) {
                throw unchecked;
            }
            if (e.getCause() instanceof Error error) {
                throw error;
            }
            throw new IllegalStateException(e.getCause());
        } finally {
            running.forEach(one -> one.cancel(true));
        }
    }

    private static void check(BooleanSupplier cancelled) {
        if (cancelled.getAsBoolean()) {
            throw new CancellationException("cancelled");
        }
    }

    @Override
    public void close() {
        if (pool != null) {
            pool.shutdownNow();
        }
    }
}
