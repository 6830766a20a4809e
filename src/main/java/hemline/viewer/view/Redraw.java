package hemline.viewer.view;

import javafx.application.Platform;
import javafx.beans.InvalidationListener;
import javafx.beans.Observable;

/** Draws once after any number of changes in one turn of the user's thread. */
final class Redraw {
    private final Runnable draw;
    private final InvalidationListener listener = changed -> request();
    private boolean waiting;

    Redraw(Runnable draw) {
        this.draw = draw;
    }

    /** Redraws whenever one of these changes. */
    Redraw on(Observable... sources) {
        for (Observable source : sources) {
            source.addListener(listener);
        }
        return this;
    }

    void request() {
        if (!waiting) {
            waiting = true;
            Platform.runLater(() -> {
                waiting = false;
                draw.run();
            });
        }
    }
}
