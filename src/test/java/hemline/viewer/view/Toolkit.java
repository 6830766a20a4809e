package hemline.viewer.view;

import hemline.viewer.render.RasterFeed;
import hemline.viewer.viewmodel.ViewerModel;
import hemline.workflow.SessionOpener;
import java.nio.file.Path;
import java.time.Clock;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.TimeUnit;
import java.util.function.BooleanSupplier;
import javafx.application.Platform;
import javafx.stage.Stage;
import org.testfx.api.FxToolkit;
import org.testfx.util.WaitForAsyncUtils;

/** One viewer window under the headless toolkit, with questions answered by the test. */
final class Toolkit implements WindowDesk.Ask, AutoCloseable {
    /** On a busy machine a window takes its time; a test must fail for what it shows, not for that. */
    private static final int PATIENCE_S = 240;

    static {
        System.setProperty("testfx.launch.timeout", String.valueOf(1000 * PATIENCE_S));
        System.setProperty("testfx.setup.timeout", String.valueOf(1000 * PATIENCE_S));
        // The robot's usual pauses are for people who watch.
        System.setProperty("testfx.robot.move_max_count", "3");
        System.setProperty("testfx.robot.write_sleep", "0");
    }

    final ViewerModel model;
    final ViewerWindow window;
    final Stage stage;
    List<Path> files = List.of();
    Optional<Path> folder = Optional.empty();
    Optional<Path> picture = Optional.empty();
    Optional<Path> mapLayer = Optional.empty();
    private final ExecutorService background = Executors.newFixedThreadPool(2);

    Toolkit(SessionOpener opener, double width, double height) throws Exception {
        FxToolkit.registerPrimaryStage();
        model = onFx(() -> new ViewerModel(opener, background, background, Platform::runLater,
                Clock.fixed(Instant.parse("2031-07-14T22:12:00Z"), ZoneOffset.UTC)));
        stage = onFx(Stage::new);
        window = onFx(() -> new ViewerWindow(stage, model, new RasterFeed(background, Platform::runLater), this));
        onFx(() -> {
            stage.setWidth(width);
            stage.setHeight(height);
            stage.show();
            return null;
        });
        settle();
    }

    /** Opens the invented loop and waits until it is analysed and drawn. */
    Toolkit open() throws Exception {
        run(() -> model.open(List.of(Path.of("invented"))));
        await(() -> model.session() != null && model.session().analysed() && model.shownProperty().get() != null
                && !model.job().runningProperty().get());
        settle();
        return this;
    }

    static <T> T onFx(java.util.concurrent.Callable<T> call) throws Exception {
        return WaitForAsyncUtils.waitForAsyncFx(PATIENCE_S * 1000, call);
    }

    static void run(Runnable change) throws Exception {
        onFx(() -> {
            change.run();
            return null;
        });
        settle();
    }

    static void settle() {
        WaitForAsyncUtils.waitForFxEvents(3);
    }

    static void await(BooleanSupplier condition) throws Exception {
        WaitForAsyncUtils.waitFor(PATIENCE_S, TimeUnit.SECONDS, () -> onFx(condition::getAsBoolean));
        settle();
    }

    @Override
    public List<Path> files(Stage owner) {
        return files;
    }

    @Override
    public Optional<Path> folder(Stage owner) {
        return folder;
    }

    @Override
    public Optional<Path> mapLayer(Stage owner) {
        return mapLayer;
    }

    @Override
    public Optional<Path> pictureFile(Stage owner) {
        return picture;
    }

    @Override
    public void close() throws Exception {
        run(stage::close);
        background.shutdownNow();
    }
}
