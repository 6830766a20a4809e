package hemline.sweep;

/** A loop and the screening learned from it; screened sweeps may be made afresh at each call. Thread-safe. */
public interface ScreenedLoop {
    int size();

    /** Screened sweep {@code index}, 0 the earliest. */
    ScreenedSweep screened(int index);
}
