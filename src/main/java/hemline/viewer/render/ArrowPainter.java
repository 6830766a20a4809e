package hemline.viewer.render;

import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.geometry.Point;
import hemline.viewer.viewmodel.ViewTransform;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.paint.Color;

/**
 * Motion of the boundaries of the shown sweep: from the line to where it will be in ten minutes at its speed. The
 * bar across the tip runs two standard deviations either way.
 */
final class ArrowPainter {
    /** How far ahead an arrow reaches, s. */
    static final double AHEAD_S = 600;
    private static final double LEAST_SPACING_PX = 46;

    void paint(GraphicsContext g, PlaneScene scene) {
        for (Track track : scene.session().tracks()) {
            Color colour = Inks.of(track, scene.session().tracks());
            for (TrackPiece piece : track.pieces()) {
                if (piece.sweep() == scene.index()) {
                    paint(g, scene.view(), piece, colour);
                }
            }
        }
    }

    private static void paint(GraphicsContext g, ViewTransform view, TrackPiece piece, Color colour) {
        double alongPx = LEAST_SPACING_PX / 2;
        Point before = piece.vertices().get(0).position();
        for (TrackVertex vertex : piece.vertices()) {
            alongPx += vertex.position().distanceKm(before) * view.pxPerKm();
            before = vertex.position();
            if (alongPx >= LEAST_SPACING_PX && vertex.speed().isKnown() && Double.isFinite(vertex.normalBearingDeg())) {
                alongPx = 0;
                if (Lines.onScreen(view, vertex.position(), 200)) {
                    arrow(g, view, vertex, colour);
                }
            }
        }
    }

    private static void arrow(GraphicsContext g, ViewTransform view, TrackVertex vertex, Color colour) {
        Point way = Point.towards(vertex.normalBearingDeg());
        double pxPerMs = AHEAD_S / 1000 * view.pxPerKm();
        double length = vertex.speed().speedMs() * pxPerMs;
        double spread = 2 * vertex.speed().sdMs() * pxPerMs;
        double x = view.screenX(vertex.position());
        double y = view.screenY(vertex.position());
        double tipX = x + length * way.xKm();
        double tipY = y - length * way.yKm();
        for (boolean casing : new boolean[] {true, false}) {
            Color ink = casing ? Inks.CASING : colour;
            double extra = casing ? 2 : 0;
            Lines.pen(g, ink, 1.2 + extra);
            g.strokeLine(x, y, tipX, tipY);
            barb(g, tipX, tipY, way, Math.min(7, Math.abs(length)) * Math.signum(length));
            Lines.pen(g, Inks.faded(ink, casing ? 0.5 : 0.55), 3.6 + extra);
            g.strokeLine(tipX - spread * way.xKm(), tipY + spread * way.yKm(), tipX + spread * way.xKm(),
                    tipY - spread * way.yKm());
        }
    }

    private static void barb(GraphicsContext g, double tipX, double tipY, Point way, double size) {
        for (double side : new double[] {-0.5, 0.5}) {
            g.strokeLine(tipX, tipY, tipX - size * (way.xKm() + side * way.yKm()),
                    tipY + size * (way.yKm() - side * way.xKm()));
        }
    }
}
