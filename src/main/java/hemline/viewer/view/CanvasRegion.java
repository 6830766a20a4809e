package hemline.viewer.view;

import javafx.scene.canvas.Canvas;
import javafx.scene.layout.Region;

/** A region filled by a canvas that is redrawn when its size changes. */
abstract class CanvasRegion extends Region {
    private final Canvas canvas = new Canvas();
    private final Redraw redraw = new Redraw(this::draw);

    CanvasRegion() {
        getChildren().add(canvas);
        // The canvas takes the region's size and must not push back.
        canvas.setManaged(false);
        setMinSize(0, 0);
        redraw.on(widthProperty(), heightProperty());
        widthProperty().addListener((o, was, now) -> canvas.setWidth(Math.max(0, now.doubleValue())));
        heightProperty().addListener((o, was, now) -> canvas.setHeight(Math.max(0, now.doubleValue())));
    }

    final Redraw redraw() {
        return redraw;
    }

    final Canvas canvas() {
        return canvas;
    }

    private void draw() {
        if (getWidth() >= 1 && getHeight() >= 1) {
            paint();
        }
    }

    /** Paints the whole canvas; its size is at least one pixel. */
    abstract void paint();
}
