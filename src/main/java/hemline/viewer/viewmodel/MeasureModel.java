package hemline.viewer.viewmodel;

import hemline.geometry.Point;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.SimpleBooleanProperty;

/**
 * The measure tool: a first place at its ray's time and a second at its own; with two different sweeps it gives a
 * speed.
 */
public final class MeasureModel {
    private final BooleanProperty on = new SimpleBooleanProperty(this, "on", false);
    private final ReadOnlyObjectWrapper<Mark> from = new ReadOnlyObjectWrapper<>(this, "from");
    private final ReadOnlyObjectWrapper<Mark> to = new ReadOnlyObjectWrapper<>(this, "to");

    /**
     * A place at a time.
     *
     * @param place  km east and north of the radar
     * @param timeMs of the ray over it in the sweep shown, ms since 1970-01-01T00:00Z
     * @param sweep  index of that sweep in the loop
     */
    public record Mark(Point place, long timeMs, int sweep) {
    }

    public MeasureModel() {
        on.addListener((o, was, now) -> {
            if (!now) {
                from.set(null);
                to.set(null);
            }
        });
    }

    /** Sets the first mark, then the second, then starts afresh. */
    public void mark(Mark mark) {
        if (from.get() == null || to.get() != null) {
            from.set(mark);
            to.set(null);
        } else {
            to.set(mark);
        }
    }

    /** Distance, bearing and, between different sweeps, the speed it implies; what to do next while incomplete. */
    public String words() {
        if (from.get() == null) {
            return "Measure: click the first place (Enter marks the cursor or the middle of the plane)";
        }
        if (to.get() == null) {
            return "Measure: click the second place; step to another sweep first to get a speed";
        }
        Point way = to.get().place().minus(from.get().place());
        String text = "Measured " + Words.number(way.lengthKm(), 2) + " km toward " + Words.bearing(way.bearingDeg());
        if (from.get().sweep() == to.get().sweep()) {
            return text + " within one sweep";
        }
        double seconds = (to.get().timeMs() - from.get().timeMs()) / 1000.0;
        if (seconds == 0) {
            return text + ", no time between";
        }
        return text + " in " + Words.span(Math.round(1000 * seconds)) + (seconds < 0 ? " backward" : "") + ": "
                + Words.number(1000 * way.lengthKm() / Math.abs(seconds), 1) + " " + Words.METRES_PER_SECOND;
    }

    public BooleanProperty onProperty() {
        return on;
    }

    public ReadOnlyObjectProperty<Mark> fromProperty() {
        return from.getReadOnlyProperty();
    }

    public ReadOnlyObjectProperty<Mark> toProperty() {
        return to.getReadOnlyProperty();
    }
}
