package hemline.viewer.render;

import hemline.boundary.BoundaryKind;
import hemline.boundary.Origin;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.geometry.Point;
import hemline.viewer.viewmodel.ViewTransform;
import java.util.List;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.paint.Color;

/**
 * The boundaries of the shown sweep: found solid, drawn by hand dashed; thinner where filled in from the sweeps
 * around. The rim of a clear-air arc has a fine second line on the side it moves toward, where the brighter air is.
 */
final class BoundaryPainter {
    private static final double WIDTH = 2.4;
    private static final double RIM_OFFSET_PX = 4;

    void paint(GraphicsContext g, PlaneScene scene) {
        for (Track track : scene.session().tracks()) {
            Color colour = Inks.of(track, scene.session().tracks());
            for (TrackPiece piece : track.pieces()) {
                if (piece.sweep() == scene.index()) {
                    paint(g, scene.view(), piece, colour, scene.isSelected(track));
                }
            }
        }
    }

    private static void paint(GraphicsContext g, ViewTransform view, TrackPiece piece, Color colour,
                              boolean selected) {
        Lines.pen(g, selected ? Inks.SELECTED : Inks.CASING, WIDTH + (selected ? 4 : 2.5));
        Lines.stroke(g, view, piece);
        if (selected) {
            Lines.pen(g, Inks.CASING, WIDTH + 1.6);
            Lines.stroke(g, view, piece);
        }
        double[] pattern = piece.origin() == Origin.HAND ? Inks.HAND : Inks.SOLID;
        List<TrackVertex> vertices = piece.vertices();
        int from = 0;
        while (from + 1 < vertices.size()) {
            boolean seen = vertices.get(from).seen() && vertices.get(from + 1).seen();
            int to = from + 1;
            while (to + 1 < vertices.size() && (vertices.get(to).seen() && vertices.get(to + 1).seen()) == seen) {
                to++;
            }
            Lines.pen(g, seen ? colour : Inks.faded(colour, 0.8), seen ? WIDTH : 1.1, pattern);
            Lines.stroke(g, view, vertices, from, to);
            from = to;
        }
        if (piece.kind() == BoundaryKind.ARC) {
            rim(g, view, vertices, colour);
        }
    }

    private static void rim(GraphicsContext g, ViewTransform view, List<TrackVertex> vertices, Color colour) {
        double[] xs = new double[vertices.size()];
        double[] ys = new double[vertices.size()];
        int count = 0;
        for (TrackVertex vertex : vertices) {
            if (Double.isFinite(vertex.normalBearingDeg())) {
                Point ahead = Point.towards(vertex.normalBearingDeg());
                xs[count] = view.screenX(vertex.position()) + RIM_OFFSET_PX * ahead.xKm();
                ys[count++] = view.screenY(vertex.position()) - RIM_OFFSET_PX * ahead.yKm();
            }
        }
        Lines.pen(g, colour, 0.9);
        g.strokePolyline(xs, ys, count);
    }
}
