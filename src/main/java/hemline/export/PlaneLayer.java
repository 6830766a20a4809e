package hemline.export;

import hemline.geometry.Point;
import java.awt.Color;
import java.awt.Shape;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Path2D;
import java.util.List;

/** What helps to find one's way on the plane: range rings with their ranges, the compass, the height ceiling. */
final class PlaneLayer {
    private static final Color RING = Ink.faded(Ink.FRAME, 0.75);

    private PlaneLayer() {
    }

    static void paint(Ink ink, PlaneView view, double ceilingRangeKm) {
        Shape clip = ink.graphics().getClip();
        ink.graphics().clipRect(view.leftPx(), view.topPx(), view.sizePx(), view.sizePx());
        double step = PlaneExtent.ringStepKm(view.halfKm());
        double reach = view.halfKm() * Math.sqrt(2) + view.centre().lengthKm();
        for (double km = step; km < reach; km += step) {
            ink.line(circle(view, km), RING, 0.8);
            Point at = Point.towards(45).times(km);
            String words = Numbers.fixed(km, 0) + " km";
            if (view.x(at) + 3 + StrokeFont.standard().width(words, 9) < view.leftPx() + view.sizePx()) {
                ink.rimmedWords(words, view.x(at) + 3, view.y(at) - 3, 9, Ink.FAINT_WORDS);
            }
        }
        for (int bearing = 0; bearing < 360; bearing += 30) {
            Point out = Point.towards(bearing);
            ink.line(line(view, List.of(out.times(step / 2), out.times(reach))), Ink.faded(Ink.FRAME, 0.35), 0.8);
        }
        if (Double.isFinite(ceilingRangeKm) && ceilingRangeKm < reach) {
            ink.line(circle(view, ceilingRangeKm), Ink.faded(Ink.WORDS, 0.7), 1.1, 2, 5);
            Point at = Point.towards(315).times(ceilingRangeKm);
            ink.rimmedWords("height ceiling", view.x(at) + 4, view.y(at) - 4, 9, Ink.FAINT_WORDS);
        }
        Point radar = new Point(0, 0);
        ink.rimmedLine(new Ellipse2D.Double(view.x(radar) - 3, view.y(radar) - 3, 6, 6), Ink.WORDS, 1.4);
        ink.graphics().setClip(clip);
        ink.line(new java.awt.geom.Rectangle2D.Double(view.leftPx(), view.topPx(), view.sizePx(), view.sizePx()),
                Ink.FRAME, 1);
    }

    private static Shape circle(PlaneView view, double radiusKm) {
        Point radar = new Point(0, 0);
        double px = radiusKm * view.pxPerKm();
        return new Ellipse2D.Double(view.x(radar) - px, view.y(radar) - px, 2 * px, 2 * px);
    }

    /** A line of the plane in pixels. */
    static Path2D line(PlaneView view, List<Point> points) {
        Path2D path = new Path2D.Double();
        path.moveTo(view.x(points.get(0)), view.y(points.get(0)));
        for (Point point : points.subList(1, points.size())) {
            path.lineTo(view.x(point), view.y(point));
        }
        return path;
    }
}
