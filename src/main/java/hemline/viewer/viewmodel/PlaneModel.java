package hemline.viewer.viewmodel;

import hemline.geometry.Point;
import javafx.beans.property.DoubleProperty;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleDoubleProperty;
import javafx.beans.property.SimpleObjectProperty;

/** How the plane is looked at: place, zoom, field, opacity, cursor. */
public final class PlaneModel {
    /** Share of the view that one press of an arrow key moves it. */
    private static final double KEY_PAN_SHARE = 0.12;
    private static final double KEY_ZOOM = 1.3;

    private final ObjectProperty<ViewTransform> view =
            new SimpleObjectProperty<>(this, "view", ViewTransform.fitting(150, 600, 600));
    private final ObjectProperty<PlaneField> field = new SimpleObjectProperty<>(this, "field", PlaneField.MEASURED);
    private final DoubleProperty opacity = new SimpleDoubleProperty(this, "opacity", 1) {
        @Override
        public void set(double wanted) {
            super.set(Math.max(0.1, Math.min(1, wanted)));
        }
    };
    private final ObjectProperty<Point> cursor = new SimpleObjectProperty<>(this, "cursor");
    private double reachKm = 150;
    private boolean fitted = true;

    /** A loop of this reach is opened; the view fits it. */
    public void open(double newReachKm) {
        reachKm = newReachKm;
        fit();
    }

    public void fit() {
        fitted = true;
        view.set(ViewTransform.fitting(reachKm, view.get().widthPx(), view.get().heightPx()));
    }

    /** The window gave the plane this size; a fitted view stays fitted, another keeps its centre and zoom. */
    public void resize(double widthPx, double heightPx) {
        view.set(fitted ? ViewTransform.fitting(reachKm, widthPx, heightPx) : view.get().resized(widthPx, heightPx));
    }

    public void pan(double rightPx, double downPx) {
        look(view.get().panned(rightPx, downPx));
    }

    /** Moves the view a step, for example {@code (1, 0)} to look further east. */
    public void panStep(int east, int north) {
        double step = KEY_PAN_SHARE * Math.min(view.get().widthPx(), view.get().heightPx());
        pan(-east * step, north * step);
    }

    public void zoom(double factor, double xPx, double yPx) {
        look(view.get().zoomed(factor, xPx, yPx));
    }

    public void zoomIn() {
        zoom(KEY_ZOOM, view.get().widthPx() / 2, view.get().heightPx() / 2);
    }

    public void zoomOut() {
        zoom(1 / KEY_ZOOM, view.get().widthPx() / 2, view.get().heightPx() / 2);
    }

    /** Brings a place into the middle, if it is not well within the view already. */
    public void reveal(Point place) {
        ViewTransform now = view.get();
        double x = now.screenX(place) / Math.max(1, now.widthPx());
        double y = now.screenY(place) / Math.max(1, now.heightPx());
        if (Math.min(x, y) < 0.08 || Math.max(x, y) > 0.92) {
            look(now.centredOn(place));
        }
    }

    private void look(ViewTransform wanted) {
        fitted = false;
        view.set(wanted);
    }

    public ObjectProperty<ViewTransform> viewProperty() {
        return view;
    }

    public ViewTransform view() {
        return view.get();
    }

    public ObjectProperty<PlaneField> fieldProperty() {
        return field;
    }

    /** Of the sweep over its ground, 0.1 to 1. */
    public DoubleProperty opacityProperty() {
        return opacity;
    }

    /** The place under the cursor; null when it is not on the plane. */
    public ObjectProperty<Point> cursorProperty() {
        return cursor;
    }
}
