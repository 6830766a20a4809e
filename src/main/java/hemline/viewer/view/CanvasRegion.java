package hemline.viewer.view;

import hemline.viewer.render.Chrome;
import hemline.viewer.render.Letters;
import hemline.viewer.viewmodel.SettingsModel;
import javafx.scene.canvas.Canvas;
import javafx.scene.layout.Region;

/** A region filled by a canvas that is redrawn when its size changes. */
abstract class CanvasRegion extends Region {
    private final SettingsModel settings;
    private Letters letters = new Letters(1);
    private final Canvas canvas = new Canvas();
    private final Redraw redraw = new Redraw(this::draw);

    CanvasRegion(SettingsModel settings) {
        this.settings = settings;
        getChildren().add(canvas);
        // The canvas takes the region's size and must not push back.
        canvas.setManaged(false);
        setMinSize(0, 0);
        redraw.on(widthProperty(), heightProperty(), settings.darkProperty(), settings.textScaleProperty());
        settings.textScaleProperty().addListener((o, was, now) -> letters = new Letters(now.doubleValue()));
        widthProperty().addListener((o, was, now) -> canvas.setWidth(Math.max(0, now.doubleValue())));
        heightProperty().addListener((o, was, now) -> canvas.setHeight(Math.max(0, now.doubleValue())));
    }

    /** Colours and fonts of the window as it is now. */
    final Chrome chrome() {
        return Chrome.of(settings.darkProperty().get(), letters);
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
