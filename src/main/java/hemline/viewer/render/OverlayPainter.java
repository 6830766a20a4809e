package hemline.viewer.render;

import hemline.viewer.viewmodel.Overlay;
import java.util.ArrayList;
import java.util.List;
import javafx.geometry.Rectangle2D;
import javafx.scene.canvas.GraphicsContext;

/** Draws all overlays of a scene in their order, from the ground up. */
public final class OverlayPainter {
    private final GridPainter grid = new GridPainter();
    private final EarlierPainter earlier = new EarlierPainter();
    private final ArcPainter arcs = new ArcPainter();
    private final BoundaryPainter boundaries = new BoundaryPainter();
    private final ArrowPainter arrows = new ArrowPainter();
    private final MeetingPainter meetings = new MeetingPainter();
    private final LabelPainter labels = new LabelPainter();
    private final MeasurePainter measure = new MeasurePainter();

    /** Clears the area and draws. */
    public void paint(GraphicsContext g, PlaneScene scene) {
        g.clearRect(0, 0, scene.view().widthPx(), scene.view().heightPx());
        g.save();
        List<Rectangle2D> taken = new ArrayList<>();
        grid.paint(g, scene);
        if (scene.shows(Overlay.EARLIER)) {
            earlier.paint(g, scene);
        }
        if (scene.shows(Overlay.ARCS)) {
            arcs.paint(g, scene);
        }
        if (scene.shows(Overlay.ARROWS)) {
            arrows.paint(g, scene);
        }
        if (scene.shows(Overlay.BOUNDARIES)) {
            boundaries.paint(g, scene);
        }
        if (scene.shows(Overlay.MEETINGS)) {
            meetings.paint(g, scene, taken);
        }
        if (scene.shows(Overlay.LABELS)) {
            labels.paint(g, scene, taken);
        }
        measure.paint(g, scene);
        g.restore();
    }
}
