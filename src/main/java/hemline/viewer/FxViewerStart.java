package hemline.viewer;

import hemline.viewer.render.RasterFeed;
import hemline.viewer.view.ChooserAsk;
import hemline.viewer.view.ViewerWindow;
import hemline.viewer.viewmodel.SettingsKeeper;
import hemline.viewer.viewmodel.ViewerModel;
import hemline.workflow.ViewerRequest;
import hemline.workflow.ViewerStart;
import java.time.Clock;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.atomic.AtomicReference;
import javafx.application.Platform;
import javafx.stage.Stage;

/** Starts JavaFX without an {@code Application}, shows one window, and waits until it is closed. */
public final class FxViewerStart implements ViewerStart {
    @Override
    public int start(ViewerRequest request) {
        CountDownLatch closed = new CountDownLatch(1);
        AtomicReference<RuntimeException> failure = new AtomicReference<>();
        ExecutorService work = daemons("hemline-open", 1);
        ExecutorService draw = daemons("hemline-draw", Math.max(1, Math.min(3,
                Runtime.getRuntime().availableProcessors() - 1)));
        Platform.startup(() -> {
            try {
                show(request, work, draw, closed);
            } catch (RuntimeException e) {
                failure.set(e);
                closed.countDown();
            }
        });
        try {
            closed.await();
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
        Platform.exit();
        work.shutdownNow();
        draw.shutdownNow();
        if (failure.get() != null) {
            throw failure.get();
        }
        return 0;
    }

    private void show(ViewerRequest request, ExecutorService work, ExecutorService draw, CountDownLatch closed) {
        ViewerModel model = new ViewerModel(request.opener(), work, draw, Platform::runLater, Clock.systemUTC());
        SettingsKeeper keeper = new SettingsKeeper(SettingsPlace.file(System.getenv(), System.getProperty("os.name"),
                System.getProperty("user.home"), System.getProperty(SettingsPlace.OVERRIDE)), model);
        model.job().attempt("Reading the settings", keeper::load);
        Stage stage = new Stage();
        ViewerWindow window = new ViewerWindow(stage, model, new RasterFeed(draw, Platform::runLater),
                new ChooserAsk());
        stage.setOnHiding(e -> {
            window.closing();
            model.job().attempt("Keeping the settings", keeper::save);
        });
        stage.setOnHidden(e -> {
            model.job().cancel();
            closed.countDown();
        });
        stage.show();
        if (!request.paths().isEmpty()) {
            model.open(request.paths());
        }
    }

    private static ExecutorService daemons(String name, int threads) {
        return Executors.newFixedThreadPool(threads, task -> {
            Thread thread = new Thread(task, name);
            thread.setDaemon(true);
            return thread;
        });
    }
}
