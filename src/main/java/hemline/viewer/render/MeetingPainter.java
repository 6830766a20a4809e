package hemline.viewer.render;

import hemline.boundary.Meeting;
import hemline.geometry.Point;
import hemline.viewer.viewmodel.ViewTransform;
import hemline.viewer.viewmodel.Words;
import java.util.List;
import javafx.geometry.Rectangle2D;
import javafx.geometry.VPos;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.text.TextAlignment;

/**
 * Meetings: a diamond, filled when observed, open when expected, with the ellipse of one standard deviation. One
 * that is still to come at the shown sweep is faint.
 */
final class MeetingPainter {
    private static final double HALF_PX = 8;

    /** @param taken where words stand; grows by those drawn here */
    void paint(GraphicsContext g, PlaneScene scene, List<Rectangle2D> taken) {
        for (Meeting meeting : scene.session().meetings()) {
            if (!Lines.onScreen(scene.view(), meeting.place(), 100)) {
                continue;
            }
            boolean selected = meeting.id().equals(scene.meeting());
            boolean past = meeting.timeMs() <= scene.nowMs() + 60_000;
            g.setGlobalAlpha(past || selected ? 1 : 0.55);
            paint(g, scene, meeting, selected, taken);
            g.setGlobalAlpha(1);
        }
    }

    private static void paint(GraphicsContext g, PlaneScene scene, Meeting meeting, boolean selected,
                              List<Rectangle2D> taken) {
        ViewTransform view = scene.view();
        double x = view.screenX(meeting.place());
        double y = view.screenY(meeting.place());
        ellipse(g, view, meeting);
        double half = selected ? HALF_PX + 3 : HALF_PX;
        diamond(g, x, y, half, meeting.status() == Meeting.Status.OBSERVED);
        String words = meeting.id() + "  " + Words.shortClock(meeting.timeMs());
        g.setFont(scene.letters().label());
        g.setTextAlign(TextAlignment.LEFT);
        g.setTextBaseline(VPos.CENTER);
        Lines.pen(g, Inks.CASING, 3);
        g.strokeText(words, x + half + 5, y);
        g.setFill(Inks.MEETING);
        g.fillText(words, x + half + 5, y);
        double height = scene.letters().lineHeight();
        double width = scene.letters().width(words, scene.letters().label());
        taken.add(new Rectangle2D(x - half, y - height / 2, 2 * half + 5 + width, height));
    }

    /** A diamond about a place; also used for the rail and the legend. */
    static void diamond(GraphicsContext g, double x, double y, double half, boolean filled) {
        double[] xs = {x, x + half, x, x - half};
        double[] ys = {y - half, y, y + half, y};
        Lines.pen(g, Inks.CASING, 4.5);
        g.strokePolygon(xs, ys, 4);
        if (filled) {
            g.setFill(Inks.MEETING);
            g.fillPolygon(xs, ys, 4);
        }
        Lines.pen(g, Inks.MEETING, 1.8);
        g.strokePolygon(xs, ys, 4);
    }

    private static void ellipse(GraphicsContext g, ViewTransform view, Meeting meeting) {
        double major = meeting.ellipse().majorKm() * view.pxPerKm();
        double minor = meeting.ellipse().minorKm() * view.pxPerKm();
        if (!Double.isFinite(major) || !Double.isFinite(minor)) {
            return;
        }
        Point along = Point.towards(meeting.ellipse().majorBearingDeg());
        int points = 48;
        double[] xs = new double[points];
        double[] ys = new double[points];
        for (int i = 0; i < points; i++) {
            double angle = 2 * Math.PI * i / points;
            double a = major * Math.cos(angle);
            double b = minor * Math.sin(angle);
            xs[i] = view.screenX(meeting.place()) + a * along.xKm() + b * along.yKm();
            ys[i] = view.screenY(meeting.place()) - a * along.yKm() + b * along.xKm();
        }
        Lines.pen(g, Inks.CASING, 3);
        g.strokePolygon(xs, ys, points);
        Lines.pen(g, Inks.MEETING, 1.2);
        g.strokePolygon(xs, ys, points);
    }
}
