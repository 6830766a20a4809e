package hemline.cli;

import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;

/** Turns an interrupt from the terminal into a wish to stop, and gives the work time to leave nothing half done. */
final class Interrupts implements AutoCloseable {
    private static final long GRACE_S = 5;

    private final CountDownLatch ended = new CountDownLatch(1);
    private final Thread hook = new Thread(this::stopAndWait, "hemline-interrupt");
    private volatile boolean asked;

    Interrupts() {
        Runtime.getRuntime().addShutdownHook(hook);
    }

    boolean asked() {
        return asked;
    }

    private void stopAndWait() {
        asked = true;
        try {
            ended.await(GRACE_S, TimeUnit.SECONDS);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
    }

    @Override
    public void close() {
        ended.countDown();
        if (!asked) {
            Runtime.getRuntime().removeShutdownHook(hook);
        }
    }
}
