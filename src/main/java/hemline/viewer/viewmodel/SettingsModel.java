package hemline.viewer.viewmodel;

import javafx.beans.property.BooleanProperty;
import javafx.beans.property.DoubleProperty;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.property.SimpleDoubleProperty;

/** What a user may choose once and keep: theme, text size, local time, side panel. */
public final class SettingsModel {
    private final BooleanProperty dark = new SimpleBooleanProperty(this, "dark", true);
    private final BooleanProperty localTime = new SimpleBooleanProperty(this, "localTime", false);
    private final BooleanProperty sidePanel = new SimpleBooleanProperty(this, "sidePanel", true);
    private final DoubleProperty textScale = new SimpleDoubleProperty(this, "textScale", 1) {
        @Override
        public void set(double wanted) {
            super.set(Math.max(0.8, Math.min(2, wanted)));
        }
    };

    public void reset() {
        dark.set(true);
        localTime.set(false);
        sidePanel.set(true);
        textScale.set(1);
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
