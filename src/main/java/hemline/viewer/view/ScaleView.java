package hemline.viewer.view;

import hemline.viewer.render.ScalePainter;
import hemline.viewer.viewmodel.ViewerModel;
import javafx.scene.AccessibleRole;

/** The scale of the field shown. */
final class ScaleView extends CanvasRegion {
    private final ViewerModel model;
    private final ScalePainter painter = new ScalePainter();

    ScaleView(ViewerModel model) {
        super(model.settings());
        this.model = model;
        setId("scale");
        setMouseTransparent(true);
        setAccessibleRole(AccessibleRole.IMAGE_VIEW);
        setAccessibleText("Scale of the field shown");
        setPrefSize(ScalePainter.WIDTH_PX, 330);
        setMaxSize(ScalePainter.WIDTH_PX, 330);
        redraw().on(model.plane().fieldProperty(), model.readOut());
    }

    @Override
    void paint() {
        painter.paint(canvas().getGraphicsContext2D(), model.plane().fieldProperty().get(), model.readOut().get(),
                chrome().letters(), getHeight());
    }
}
