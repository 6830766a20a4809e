package hemline.viewer.render;

import hemline.viewer.viewmodel.NiceSteps;
import hemline.viewer.viewmodel.Overlay;
import hemline.viewer.viewmodel.StatusModel;
import hemline.viewer.viewmodel.ViewTransform;
import java.util.ArrayList;
import java.util.List;
import javafx.scene.paint.Color;

/** Which rings a scene shows; their spacing follows the zoom. */
final class Rings {
    private static final double LEAST_PX = 95;
    private static final double CEILING_DASH_PX = 5;
    private static final double FARTHEST_KM = 1000;

    private Rings() {
    }

    static double stepKm(ViewTransform view) {
        return NiceSteps.step(LEAST_PX / view.pxPerKm());
    }

    /** Ground ranges of the rings that cross the view, km. */
    static List<Double> rangesKm(ViewTransform view) {
        double halfDiagonal = Math.hypot(view.widthPx(), view.heightPx()) / 2 / view.pxPerKm();
        double away = view.centre().lengthKm();
        double step = stepKm(view);
        return NiceSteps.multiples(Math.max(step, away - halfDiagonal), Math.min(FARTHEST_KM, away + halfDiagonal), step);
    }

    static double ceilingKm(PlaneScene scene) {
        return StatusModel.ceilingRangeKm(scene.session().frames().get(scene.index()).beam(),
                scene.session().heightCeilingM());
    }

    static List<Ring> of(PlaneScene scene) {
        List<Ring> rings = new ArrayList<>();
        if (scene.shows(Overlay.RINGS)) {
            rangesKm(scene.view()).forEach(range -> rings.add(new Ring(range, argb(Inks.GRID), 0)));
        }
        if (scene.shows(Overlay.CEILING)) {
            rings.add(new Ring(ceilingKm(scene), argb(Inks.CEILING), CEILING_DASH_PX));
        }
        return List.copyOf(rings);
    }

    private static int argb(Color colour) {
        return (int) Math.round(255 * colour.getOpacity()) << 24 | (int) Math.round(255 * colour.getRed()) << 16
                | (int) Math.round(255 * colour.getGreen()) << 8 | (int) Math.round(255 * colour.getBlue());
    }
}
