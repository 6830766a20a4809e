package hemline.cli;

import hemline.sweep.Progress;
import java.util.function.BooleanSupplier;
import me.tongfei.progressbar.ConsoleProgressBarConsumer;
import me.tongfei.progressbar.ProgressBar;
import me.tongfei.progressbar.ProgressBarBuilder;
import me.tongfei.progressbar.ProgressBarStyle;

/** A progress bar on standard error where that is a terminal; silent anywhere else. */
final class TerminalProgress implements Progress, AutoCloseable {
    private final boolean shown;
    private final BooleanSupplier cancelled;
    private String stage = "";
    private ProgressBar bar;

    TerminalProgress(BooleanSupplier cancelled) {
        this.shown = isTerminal();
        this.cancelled = cancelled;
    }

    /** The launcher says whether standard error is a terminal; started otherwise, a console is taken as a sign. */
    private static boolean isTerminal() {
        String told = System.getProperty("hemline.terminal");
        return told == null ? System.console() != null : Boolean.parseBoolean(told);
    }

    @Override
    public synchronized void step(String newStage, int done, int total) {
        if (!shown) {
            return;
        }
        if (bar == null || !newStage.equals(stage)) {
            closeBar();
            stage = newStage;
            bar = new ProgressBarBuilder().setTaskName(newStage).setInitialMax(total)
                    .setStyle(ProgressBarStyle.ASCII).setUpdateIntervalMillis(200)
                    .setConsumer(new ConsoleProgressBarConsumer(System.err)).build();
        }
        bar.maxHint(total);
        bar.stepTo(done);
    }

    @Override
    public boolean cancelled() {
        return cancelled.getAsBoolean();
    }

    private void closeBar() {
        if (bar != null) {
            bar.close();
            bar = null;
        }
    }

    @Override
    public synchronized void close() {
        closeBar();
    }
}
