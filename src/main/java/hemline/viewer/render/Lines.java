package hemline.viewer.render;

import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.geometry.Point;
import hemline.viewer.viewmodel.ViewTransform;
import java.util.List;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.paint.Color;

/** Strokes lines of the plane on the screen. */
final class Lines {
    private Lines() {
    }

    /** Draws vertices {@code from..to}, both included. */
    static void stroke(GraphicsContext g, ViewTransform view, List<TrackVertex> vertices, int from, int to) {
        int count = to - from + 1;
        double[] xs = new double[count];
        double[] ys = new double[count];
        for (int i = 0; i < count; i++) {
            Point at = vertices.get(from + i).position();
            xs[i] = view.screenX(at);
            ys[i] = view.screenY(at);
        }
        g.strokePolyline(xs, ys, count);
    }

    static void stroke(GraphicsContext g, ViewTransform view, TrackPiece piece) {
        stroke(g, view, piece.vertices(), 0, piece.vertices().size() - 1);
    }

    static void pen(GraphicsContext g, Color colour, double width, double... dashes) {
        g.setStroke(colour);
        g.setLineWidth(width);
        g.setLineDashes(dashes);
    }

    static boolean onScreen(ViewTransform view, Point place, double marginPx) {
        double x = view.screenX(place);
        double y = view.screenY(place);
        return x > -marginPx && y > -marginPx && x < view.widthPx() + marginPx && y < view.heightPx() + marginPx;
    }
}
