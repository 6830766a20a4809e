package hemline.viewer.render;

import hemline.viewer.viewmodel.MeasureModel.Mark;
import javafx.scene.canvas.GraphicsContext;

/** The measure tool's marks and the way between them. */
final class MeasurePainter {
    void paint(GraphicsContext g, PlaneScene scene) {
        Lines.pen(g, Inks.MEASURE, 1.5);
        double lastX = Double.NaN;
        double lastY = Double.NaN;
        for (Mark mark : scene.marks()) {
            double x = scene.view().screenX(mark.place());
            double y = scene.view().screenY(mark.place());
            g.strokeLine(x - 7, y, x + 7, y);
            g.strokeLine(x, y - 7, x, y + 7);
            if (!Double.isNaN(lastX)) {
                g.strokeLine(lastX, lastY, x, y);
            }
            lastX = x;
            lastY = y;
        }
    }
}
