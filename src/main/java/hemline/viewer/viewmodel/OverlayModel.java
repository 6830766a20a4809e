package hemline.viewer.viewmodel;

import java.util.EnumMap;
import java.util.Map;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.SimpleBooleanProperty;

/** Which overlays are shown. */
public final class OverlayModel {
    private final Map<Overlay, BooleanProperty> shown = new EnumMap<>(Overlay.class);

    public OverlayModel() {
        for (Overlay overlay : Overlay.values()) {
            shown.put(overlay, new SimpleBooleanProperty(this, overlay.name(), overlay.shownAtFirst()));
        }
    }

    public BooleanProperty shown(Overlay overlay) {
        return shown.get(overlay);
    }

    public boolean isShown(Overlay overlay) {
        return shown.get(overlay).get();
    }

    public void toggle(Overlay overlay) {
        BooleanProperty property = shown.get(overlay);
        property.set(!property.get());
    }

    public void reset() {
        shown.forEach((overlay, property) -> property.set(overlay.shownAtFirst()));
    }
}
