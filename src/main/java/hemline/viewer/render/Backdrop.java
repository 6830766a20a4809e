package hemline.viewer.render;

import hemline.viewer.viewmodel.MapLine;
import hemline.viewer.viewmodel.NiceSteps;
import hemline.viewer.viewmodel.Overlay;
import hemline.viewer.viewmodel.StatusModel;
import hemline.viewer.viewmodel.ViewTransform;
import java.util.ArrayList;
import java.util.List;
import javafx.scene.paint.Color;

/**
 * Rings and map lines, drawn into the sweep's own pixels in the background: long thin strokes are what would cost the
 * software renderer most.
 *
 * @param rings about the radar
 * @param map   on the radar's plane
 */
record Backdrop(List<Ring> rings, List<MapLine> map) {
    private static final double LEAST_PX = 95;
    private static final double CEILING_DASH_PX = 5;
    private static final double FARTHEST_KM = 1000;

    Backdrop {
        rings = List.copyOf(rings);
    }

    static Backdrop of(PlaneScene scene) {
        List<Ring> rings = new ArrayList<>();
        if (scene.shows(Overlay.RINGS)) {
            rangesKm(scene.view()).forEach(range -> rings.add(new Ring(range, argb(Inks.GRID), 0)));
        }
        if (scene.shows(Overlay.CEILING)) {
            rings.add(new Ring(ceilingKm(scene), argb(Inks.CEILING), CEILING_DASH_PX));
        }
        return new Backdrop(rings, scene.shows(Overlay.MAP) ? scene.map() : List.of());
    }

    static double stepKm(ViewTransform view) {
        return NiceSteps.step(LEAST_PX / view.pxPerKm());
    }

    /** Ground ranges of the rings that cross the view, km. */
    static List<Double> rangesKm(ViewTransform view) {
        double halfDiagonal = Math.hypot(view.widthPx(), view.heightPx()) / 2 / view.pxPerKm();
        double away = view.centre().lengthKm();
        double step = stepKm(view);
        return NiceSteps.multiples(Math.max(step, away - halfDiagonal), Math.min(FARTHEST_KM, away + halfDiagonal),
                step);
    }

    static double ceilingKm(PlaneScene scene) {
        return StatusModel.ceilingRangeKm(scene.session().frames().get(scene.index()).beam(),
                scene.session().heightCeilingM());
    }

    void paint(PixelPen pen, ViewTransform view, double pixelsPerUnit) {
        for (MapLine line : map) {
            int ink = argb(switch (line.kind()) {
                case COAST -> Inks.COAST;
                case BORDER -> Inks.BORDER;
                case STATE_BORDER -> Inks.STATE_BORDER;
                case OWN -> Inks.OWN_MAP;
            });
            for (int i = 1; i < line.points(); i++) {
                pen.line(pixelsPerUnit * view.screenX(line.xKm(i - 1)), pixelsPerUnit * view.screenY(line.yKm(i - 1)),
                        pixelsPerUnit * view.screenX(line.xKm(i)), pixelsPerUnit * view.screenY(line.yKm(i)), ink);
            }
        }
        rings.forEach(ring -> ring.paint(pen, view, pixelsPerUnit));
    }

    private static int argb(Color colour) {
        return (int) Math.round(255 * colour.getOpacity()) << 24 | (int) Math.round(255 * colour.getRed()) << 16
                | (int) Math.round(255 * colour.getGreen()) << 8 | (int) Math.round(255 * colour.getBlue());
    }
}
