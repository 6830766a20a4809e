package hemline.viewer.render;

import hemline.boundary.ArcHistory;
import hemline.boundary.ArcHistory.RadiusAt;
import hemline.boundary.Track;
import hemline.geometry.Point;
import hemline.viewer.viewmodel.ViewTransform;
import java.util.Optional;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.paint.Color;

/** Arcs fitted through time: the circle at the shown sweep, dotted, and the path of its centre up to then. */
final class ArcPainter {
    void paint(GraphicsContext g, PlaneScene scene) {
        for (Track track : scene.session().tracks()) {
            if (track.arc().isEmpty()) {
                continue;
            }
            ArcHistory arc = track.arc().get();
            Optional<RadiusAt> here = arc.radii().stream().filter(r -> r.sweep() == scene.index()).findFirst();
            Color colour = Inks.of(track, scene.session().tracks());
            here.ifPresent(r -> paint(g, scene.view(), arc, r, colour));
        }
    }

    private static void paint(GraphicsContext g, ViewTransform view, ArcHistory arc, RadiusAt here, Color colour) {
        Point centre = arc.centreAt(here.timeMs());
        double x = view.screenX(centre);
        double y = view.screenY(centre);
        Lines.pen(g, Inks.faded(colour, 0.8), 1.2, Inks.ARC_FIT);
        Lines.circle(g, view, centre, here.radiusKm());
        Point start = arc.centreAt(arc.radii().get(0).timeMs());
        Lines.pen(g, colour, 1.4);
        g.strokeLine(view.screenX(start), view.screenY(start), x, y);
        g.strokeLine(x - 5, y - 5, x + 5, y + 5);
        g.strokeLine(x - 5, y + 5, x + 5, y - 5);
        double sd = arc.centreSdKm() * view.pxPerKm();
        Lines.pen(g, Inks.faded(colour, 0.6), 1);
        g.strokeOval(x - sd, y - sd, 2 * sd, 2 * sd);
    }
}
