package hemline.sweep;

import java.util.concurrent.CancellationException;

/** Told how far long work has come; asked whether to go on. Called from several threads. */
public interface Progress {
    /** Nobody is looking and nothing is cancelled. */
    Progress NONE = new Progress() {
    };

    /**
     * Work has come further.
     *
     * @param stage what is being done, in words a user understands ("reading", "screening")
     * @param done  steps done in this stage
     * @param total steps in this stage
     */
    default void step(String stage, int done, int total) {
    }

    default boolean cancelled() {
        return false;
    }

    /** @throws CancellationException if cancelled */
    default void check() {
        if (cancelled()) {
            throw new CancellationException("cancelled");
        }
    }
}
