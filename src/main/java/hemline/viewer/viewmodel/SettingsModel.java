package hemline.viewer.viewmodel;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.DoubleProperty;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.property.SimpleDoubleProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;

/** What a user may choose once and keep: theme, text size, local time, side panel. */
public final class SettingsModel {
    private static final int MOST_RECENT = 8;

    private final BooleanProperty dark = new SimpleBooleanProperty(this, "dark", true);
    private final BooleanProperty localTime = new SimpleBooleanProperty(this, "localTime", false);
    private final BooleanProperty sidePanel = new SimpleBooleanProperty(this, "sidePanel", true);
    private final DoubleProperty textScale = new SimpleDoubleProperty(this, "textScale", 1) {
        @Override
        public void set(double wanted) {
            super.set(Math.max(0.8, Math.min(2, wanted)));
        }
    };

    private final ObjectProperty<WindowPlace> window = new SimpleObjectProperty<>(this, "window");
    private final ObservableList<Path> recent = FXCollections.observableArrayList();

    /** Puts a path in front of those opened before. */
    public void remember(Path path) {
        List<Path> paths = new ArrayList<>(recent);
        paths.remove(path);
        paths.add(0, path);
        recent.setAll(paths.subList(0, Math.min(MOST_RECENT, paths.size())));
    }

    /** Back to the usual; what was opened before stays. */
    public void reset() {
        dark.set(true);
        localTime.set(false);
        sidePanel.set(true);
        textScale.set(1);
    }

    /** Where the window was; null when never kept. */
    public ObjectProperty<WindowPlace> windowProperty() {
        return window;
    }

    /** Paths opened before, newest first. */
    public ObservableList<Path> recent() {
        return recent;
    }

    public BooleanProperty darkProperty() {
        return dark;
    }

    /** Whether the computer's local time stands beside UTC. */
    public BooleanProperty localTimeProperty() {
        return localTime;
    }

    /** Whether ledger and traces are shown. */
    public BooleanProperty sidePanelProperty() {
        return sidePanel;
    }

    /** Size of all text over the usual, 0.8 to 2. */
    public DoubleProperty textScaleProperty() {
        return textScale;
    }
}
