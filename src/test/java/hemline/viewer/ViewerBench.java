package hemline.viewer;

import hemline.viewer.render.RasterFeed;
import hemline.viewer.view.ChooserAsk;
import hemline.viewer.view.ViewerWindow;
import hemline.viewer.viewmodel.ViewerModel;
import java.lang.management.ManagementFactory;
import java.lang.management.ThreadMXBean;
import java.nio.file.Path;
import java.time.Clock;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.function.IntConsumer;
import javafx.animation.AnimationTimer;
import javafx.application.Platform;
import javafx.stage.Stage;

/**
 * Drives the real window and prints how long frames take: run with {@code -Djavafx.animation.fullspeed=true
 * -Dprism.order=sw}, in a real or virtual display of at least 1600 × 1000.
 */
public final class ViewerBench {
    private static final int FRAMES = 600;

    private ViewerBench() {
    }

    public static void main(String[] args) throws Exception {
        long launched = System.nanoTime();
        ExecutorService draw = Executors.newFixedThreadPool(Math.max(1,
                Runtime.getRuntime().availableProcessors() - 1));
        CountDownLatch done = new CountDownLatch(1);
        Platform.startup(() -> {
            FakeOpener opener = new FakeOpener(analysed -> new FakeLoop(16, 720, 1000, analysed));
            ViewerModel model = new ViewerModel(opener, draw, draw, Platform::runLater, Clock.systemUTC());
            Stage stage = new Stage();
            RasterFeed feed = new RasterFeed(draw, Platform::runLater);
            new ViewerWindow(stage, model, feed, new ChooserAsk());
            model.settings().sidePanelProperty().set(false);
            stage.setWidth(1600);
            stage.setHeight(1000);
            stage.show();
            feed.rasterProperty().addListener((o, was, now) -> {
                if (was == null) {
                    System.out.printf(Locale.ROOT, "first picture after %.0f ms%n",
                            (System.nanoTime() - launched) / 1e6);
                }
            });
            model.open(List.of(Path.of("invented")));
            new AnimationTimer() {
                private int calm;

                @Override
                public void handle(long now) {
                    calm = model.session() != null && model.session().analysed() && !model.job().runningProperty().get()
                            ? calm + 1 : 0;
                    if (calm == 60) {
                        stop();
                        series(model, done);
                    }
                }
            }.start();
        });
        done.await();
        System.exit(0);
    }

    private static void series(ViewerModel model, CountDownLatch done) {
        time("still", i -> { }, () ->
                time("step", i -> model.loop().step(1), () ->
                        time("pan", i -> model.plane().pan(i % 40 < 20 ? 6 : -6, 3 - i % 7), () ->
                                time("zoom", i -> model.plane().zoom(i % 60 < 30 ? 1.03 : 1 / 1.03, 700, 400),
                                        done::countDown))));
    }

    private static void time(String name, IntConsumer change, Runnable next) {
        double[] frameMs = new double[FRAMES];
        double[] cpuMs = new double[3];
        new AnimationTimer() {
            private int frame = -200;
            private long before;

            @Override
            public void handle(long ignored) {
                long now = System.nanoTime();
                if (frame > 0) {
                    frameMs[frame - 1] = (now - before) / 1e6;
                } else if (frame == 0) {
                    cpuMs(cpuMs, -1);
                }
                before = now;
                if (++frame > FRAMES) {
                    stop();
                    cpuMs(cpuMs, 1);
                    Arrays.sort(frameMs);
                    System.out.printf(Locale.ROOT,
                            "%-6s median %.1f ms, p90 %.1f ms, largest %.1f ms (%.0f frames/s); processor"
                            + " time a frame: user's thread %.1f ms, renderer %.1f ms, background %.1f ms%n",
                            name, frameMs[FRAMES / 2], frameMs[FRAMES * 9 / 10], frameMs[FRAMES - 1],
                            1000 / (Arrays.stream(frameMs).sum() / FRAMES), cpuMs[0] / FRAMES, cpuMs[1] / FRAMES,
                            cpuMs[2] / FRAMES);
                    next.run();
                    return;
                }
                change.accept(frame);
            }
        }.start();
    }

    /** Adds the processor time of the user's thread, the renderer and the background so far, times {@code sign}. */
    private static void cpuMs(double[] sums, int sign) {
        ThreadMXBean threads = ManagementFactory.getThreadMXBean();
        for (long id : threads.getAllThreadIds()) {
            String name = threads.getThreadInfo(id) == null ? "" : threads.getThreadInfo(id).getThreadName();
            int slot = name.contains("FX Application") ? 0 : name.contains("QuantumRenderer") ? 1
                    : name.startsWith("pool") ? 2 : -1;
            if (slot >= 0) {
                sums[slot] += sign * threads.getThreadCpuTime(id) / 1e6;
            }
        }
    }
}
