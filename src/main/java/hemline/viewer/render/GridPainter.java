package hemline.viewer.render;

import hemline.geodesy.GeoPoint;
import hemline.geodesy.LocalPlane;
import hemline.geometry.Point;
import hemline.viewer.viewmodel.NiceSteps;
import hemline.viewer.viewmodel.Overlay;
import hemline.viewer.viewmodel.ViewTransform;
import hemline.viewer.viewmodel.Words;
import javafx.scene.canvas.GraphicsContext;

/** Numbers of the rings, azimuth ticks and the graticule; their spacing follows the zoom. */
final class GridPainter {
    private static final double LEAST_GRATICULE_PX = 110;
    private static final int CURVE_POINTS = 24;

    void paint(GraphicsContext g, PlaneScene scene) {
        ViewTransform view = scene.view();
        g.setLineWidth(1);
        g.setLineDashes(Inks.SOLID);
        Letters letters = scene.letters();
        if (scene.shows(Overlay.GRATICULE)) {
            scene.session().site().position().ifPresent(radar -> graticule(g, view, radar, letters));
        }
        if (scene.shows(Overlay.RINGS)) {
            ringNumbers(g, view, letters);
        }
        if (scene.shows(Overlay.CEILING)) {
            Point at = Point.towards(225).times(Backdrop.ceilingKm(scene));
            letters.plate(g, "beam " + Words.number(scene.session().heightCeilingM() / 1000, 1) + " km up",
                    view.screenX(at), view.screenY(at), Inks.CEILING);
        }
        if (scene.shows(Overlay.AZIMUTHS)) {
            azimuths(g, view, letters);
        }
    }

    private static void ringNumbers(GraphicsContext g, ViewTransform view, Letters letters) {
        double step = Backdrop.stepKm(view);
        for (double range : Backdrop.rangesKm(view)) {
            // Along one bearing, so that the numbers read as a scale.
            Point at = Point.towards(45).times(range);
            letters.plate(g, Words.number(range, step < 1 ? 1 : 0) + " km", view.screenX(at), view.screenY(at),
                    Inks.GRID_TEXT);
        }
        g.setStroke(Inks.GRID);
        double x = view.screenX(0);
        double y = view.screenY(0);
        g.strokeLine(x - 5, y, x + 5, y);
        g.strokeLine(x, y - 5, x, y + 5);
    }

    /** Ticks where the bearings from the radar leave the view. */
    private static void azimuths(GraphicsContext g, ViewTransform view, Letters letters) {
        double x0 = view.screenX(0);
        double y0 = view.screenY(0);
        boolean inside = x0 > 0 && y0 > 0 && x0 < view.widthPx() && y0 < view.heightPx();
        int step = inside ? 30 : 5;
        g.setStroke(Inks.GRID_TEXT);
        for (int bearing = 0; bearing < 360; bearing += step) {
            Point way = Point.towards(bearing);
            double reach = leaving(x0, y0, way.xKm(), -way.yKm(), view.widthPx(), view.heightPx());
            if (Double.isNaN(reach)) {
                continue;
            }
            double x = x0 + reach * way.xKm();
            double y = y0 - reach * way.yKm();
            g.strokeLine(x, y, x - 7 * way.xKm(), y + 7 * way.yKm());
            double half = 17 * letters.scale();
            letters.plate(g, Words.bearing(bearing), Math.max(half, Math.min(view.widthPx() - half,
                    x - 20 * way.xKm())),
                    Math.max(9, Math.min(view.heightPx() - 9, y + 16 * way.yKm())), Inks.GRID_TEXT);
        }
    }

    /** Length along a ray to where it leaves the area, NaN when it never crosses it. */
    private static double leaving(double x, double y, double dx, double dy, double width, double height) {
        double enter = 0;
        double leave = Double.POSITIVE_INFINITY;
        for (double[] slab : new double[][] {{x, dx, width}, {y, dy, height}}) {
            if (Math.abs(slab[1]) < 1e-12) {
                if (slab[0] < 0 || slab[0] > slab[2]) {
                    return Double.NaN;
                }
                continue;
            }
            double a = -slab[0] / slab[1];
            double b = (slab[2] - slab[0]) / slab[1];
            enter = Math.max(enter, Math.min(a, b));
            leave = Math.min(leave, Math.max(a, b));
        }
        return leave > enter ? leave : Double.NaN;
    }

    private static void graticule(GraphicsContext g, ViewTransform view, GeoPoint radar, Letters letters) {
        LocalPlane plane = new LocalPlane(radar);
        GeoPoint middle = plane.toGeo(view.centre());
        double step = NiceSteps.step(LEAST_GRATICULE_PX / view.pxPerKm() / 111.2);
        int decimals = step < 0.1 ? 2 : step < 1 ? 1 : 0;
        double tall = Math.min(40, view.heightPx() / view.pxPerKm() / 111.2 / 2 + step);
        double wide = Math.min(90, view.widthPx() / view.pxPerKm() / 111.2 / 2
                / Math.max(0.05, Math.cos(Math.toRadians(middle.latitudeDeg()))) + step);
        double south = Math.max(-89, middle.latitudeDeg() - tall);
        double north = Math.min(89, middle.latitudeDeg() + tall);
        double west = middle.longitudeDeg() - wide;
        double east = middle.longitudeDeg() + wide;
        g.setStroke(Inks.faded(Inks.GRID, 0.3));
        for (double latitude : NiceSteps.multiples(south, north, step)) {
            curve(g, view, plane, latitude, west, latitude, east);
            Point at = plane.toPlane(new GeoPoint(latitude, wrapped(middle.longitudeDeg())));
            letters.plate(g, Words.number(Math.abs(latitude), decimals) + (latitude < 0 ? "\u00b0S" : "\u00b0N"), 66,
                    view.screenY(at), Inks.GRID_TEXT);
        }
        for (double longitude : NiceSteps.multiples(west, east, step)) {
            curve(g, view, plane, south, longitude, north, longitude);
            Point at = plane.toPlane(new GeoPoint(middle.latitudeDeg(), wrapped(longitude)));
            double shown = wrapped(longitude);
            letters.plate(g, Words.number(Math.abs(shown), decimals) + (shown < 0 ? "\u00b0W" : "\u00b0E"),
                    view.screenX(at), view.heightPx() - 44, Inks.GRID_TEXT);
        }
    }

    private static void curve(GraphicsContext g, ViewTransform view, LocalPlane plane, double latitude0,
                              double longitude0, double latitude1, double longitude1) {
        double[] xs = new double[CURVE_POINTS + 1];
        double[] ys = new double[CURVE_POINTS + 1];
        for (int i = 0; i <= CURVE_POINTS; i++) {
            double share = (double) i / CURVE_POINTS;
            Point at = plane.toPlane(new GeoPoint(latitude0 + share * (latitude1 - latitude0),
                    wrapped(longitude0 + share * (longitude1 - longitude0))));
            xs[i] = view.screenX(at);
            ys[i] = view.screenY(at);
        }
        g.strokePolyline(xs, ys, xs.length);
    }

    private static double wrapped(double longitudeDeg) {
        double turned = (longitudeDeg + 180) % 360;
        return (turned < 0 ? turned + 360 : turned) - 180;
    }
}
