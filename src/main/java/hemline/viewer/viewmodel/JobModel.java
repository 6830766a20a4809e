package hemline.viewer.viewmodel;

import hemline.sweep.Progress;
import java.util.concurrent.CancellationException;
import java.util.concurrent.Executor;
import java.util.concurrent.atomic.AtomicBoolean;
import java.util.concurrent.atomic.AtomicReference;
import java.util.function.LongSupplier;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyDoubleProperty;
import javafx.beans.property.ReadOnlyDoubleWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;

/**
 * One long piece of work at a time: what it does, how far it is, how long it will take, and that it can be stopped.
 * Work runs on a background executor, properties change on the user's.
 */
public final class JobModel {
    private final Executor background;
    private final Executor ui;
    private final LongSupplier nanoClock;
    private final ReadOnlyBooleanWrapper running = new ReadOnlyBooleanWrapper(this, "running", false);
    private final ReadOnlyStringWrapper words = new ReadOnlyStringWrapper(this, "words", "");
    private final ReadOnlyDoubleWrapper fraction = new ReadOnlyDoubleWrapper(this, "fraction", -1);
    private final ReadOnlyStringWrapper trouble = new ReadOnlyStringWrapper(this, "trouble", "");
    private AtomicBoolean cancelled = new AtomicBoolean();

    /** Work that may throw what its user should read. */
    @FunctionalInterface
    public interface Work {
        void run(Progress progress) throws Exception;
    }

    public JobModel(Executor background, Executor ui, LongSupplier nanoClock) {
        this.background = background;
        this.ui = ui;
        this.nanoClock = nanoClock;
    }

    /** Starts work; what still runs is cancelled and its reports are dropped. Call on the user's thread. */
    public void start(String title, Work work) {
        cancelled.set(true);
        AtomicBoolean mine = new AtomicBoolean();
        cancelled = mine;
        running.set(true);
        trouble.set("");
        words.set(title);
        fraction.set(-1);
        background.execute(() -> run(title, work, mine));
    }

    private void run(String title, Work work, AtomicBoolean mine) {
        try {
            work.run(new Reporter(mine));
            ui.execute(() -> end(mine, ""));
        } catch (CancellationException e) {
            ui.execute(() -> end(mine, title + " was cancelled. What was there before stays."));
        } catch (Exception | OutOfMemoryError | StackOverflowError e) {
            String cause = e.getMessage() == null ? e.getClass().getSimpleName() : e.getMessage();
            ui.execute(() -> end(mine, title + " failed: " + cause));
        }
    }

    private void end(AtomicBoolean mine, String message) {
        if (mine == cancelled) {
            running.set(false);
            trouble.set(message);
        }
    }

    /** Does something short at once, on this thread; a failure is said like that of long work. */
    public void attempt(String title, Attempt attempt) {
        try {
            attempt.run();
            trouble.set("");
        } catch (Exception e) {
            trouble.set(title + " failed: " + (e.getMessage() == null ? e.getClass().getSimpleName() : e.getMessage()));
        }
    }

    /** Says why something failed, in whole words. */
    void say(String why) {
        trouble.set(why);
    }

    /** Something short that may fail. */
    @FunctionalInterface
    public interface Attempt {
        void run() throws Exception;
    }

    /** Asks the work to stop; it does so at its next step. */
    public void cancel() {
        cancelled.set(true);
        words.set("Stopping\u2026");
    }

    public void dismissTrouble() {
        trouble.set("");
    }

    public ReadOnlyBooleanProperty runningProperty() {
        return running.getReadOnlyProperty();
    }

    /** What is being done and how long it will still take, in words. */
    public ReadOnlyStringProperty wordsProperty() {
        return words.getReadOnlyProperty();
    }

    /** Share of this stage done, 0 to 1; −1 when not known. */
    public ReadOnlyDoubleProperty fractionProperty() {
        return fraction.getReadOnlyProperty();
    }

    /** Why the last work ended without a result, in words; empty when it did not. */
    public ReadOnlyStringProperty troubleProperty() {
        return trouble.getReadOnlyProperty();
    }

    private final class Reporter implements Progress {
        private final AtomicBoolean mine;
        private final AtomicReference<Runnable> waiting = new AtomicReference<>();
        private String stage = "";
        private long stageStartNs;

        Reporter(AtomicBoolean mine) {
            this.mine = mine;
        }

        @Override
        public synchronized void step(String newStage, int done, int total) {
            long now = nanoClock.getAsLong();
            if (!newStage.equals(stage)) {
                stage = newStage;
                stageStartNs = now;
            }
            double share = total > 0 ? Math.min(1, (double) done / total) : -1;
            String left = share > 0.02 && share < 1
                    ? ", about " + Words.span(Math.round((now - stageStartNs) / 1e6 * (1 - share) / share)) + " left"
                            : "";
            String text = newStage + (total > 0 ? " " + done + " of " + total : "") + left;
            Runnable show = () -> {
                if (mine == cancelled && !mine.get()) {
                    words.set(text);
                    fraction.set(share);
                }
            };
            // Only the newest report waits for the user's thread, however fast they come.
            if (waiting.getAndSet(show) == null) {
                ui.execute(() -> waiting.getAndSet(null).run());
            }
        }

        @Override
        public boolean cancelled() {
            return mine.get();
        }
    }
}
