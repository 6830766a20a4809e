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
    private static final int CHORDS_A_STROKE = 4;

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

    /**
     * Strokes a circle in short arcs, leaving out those off the screen: the software renderer takes time in
     * proportion to the bounding box of each stroke, and a whole ring's is most of the screen.
     */
    static void circle(GraphicsContext g, ViewTransform view, Point centre, double radiusKm) {
        double x = view.screenX(centre);
        double y = view.screenY(centre);
        double r = radiusKm * view.pxPerKm();
        if (!(r > 0.5)) {
            return;
        }
        // A chord strays from its arc by about r(1 - cos(half its angle)): a tenth of a pixel at most.
        int chords = (int) Math.max(16, Math.ceil(Math.PI / Math.acos(Math.max(0, 1 - 0.1 / r)) / CHORDS_A_STROKE)
                * CHORDS_A_STROKE);
        double[] xs = new double[CHORDS_A_STROKE + 1];
        double[] ys = new double[CHORDS_A_STROKE + 1];
        for (int start = 0; start < chords; start += CHORDS_A_STROKE) {
            double left = Double.POSITIVE_INFINITY;
            double right = Double.NEGATIVE_INFINITY;
            double top = Double.POSITIVE_INFINITY;
            double bottom = Double.NEGATIVE_INFINITY;
            for (int i = 0; i <= CHORDS_A_STROKE; i++) {
                double angle = 2 * Math.PI * (start + i) / chords;
                xs[i] = x + r * Math.sin(angle);
                ys[i] = y - r * Math.cos(angle);
                left = Math.min(left, xs[i]);
                right = Math.max(right, xs[i]);
                top = Math.min(top, ys[i]);
                bottom = Math.max(bottom, ys[i]);
            }
            if (right >= 0 && left <= view.widthPx() && bottom >= 0 && top <= view.heightPx()) {
                g.strokePolyline(xs, ys, xs.length);
            }
        }
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
