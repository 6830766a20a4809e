package hemline.viewer.render;

import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.geometry.Point;
import hemline.viewer.viewmodel.ViewTransform;
import hemline.viewer.viewmodel.Words;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import javafx.geometry.Rectangle2D;
import javafx.geometry.VPos;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.text.TextAlignment;

/** Name and speed beside each boundary of the shown sweep, where no other label stands. */
final class LabelPainter {
    private static final double OFF_PX = 20;
    /** Shares of the line's length at which a label is tried, best first. */
    private static final double[] PLACES = {0.5, 0.35, 0.65, 0.2, 0.8, 0.05, 0.95};

    /** @param taken where words stand already; grows by those drawn here */
    void paint(GraphicsContext g, PlaneScene scene, List<Rectangle2D> taken) {
        List<Track> order = new ArrayList<>(scene.session().tracks());
        order.sort(Comparator.comparing(t -> !scene.isSelected(t)));
        for (Track track : order) {
            track.pieces().stream().filter(p -> p.sweep() == scene.index())
                    .max(Comparator.comparingDouble(p -> p.line().lengthKm()))
                    .ifPresent(piece -> label(g, scene, track, piece, taken));
        }
    }

    private static void label(GraphicsContext g, PlaneScene scene, Track track, TrackPiece piece,
                              List<Rectangle2D> taken) {
        String words = track.id() + (track.speed().isKnown() ? "  " + Words.number(track.speed().speedMs(), 1) : "");
        double width = scene.letters().width(words, scene.letters().label()) + 10;
        Optional<Rectangle2D> place = free(scene, piece, width, taken);
        if (place.isEmpty()) {
            return;
        }
        Rectangle2D box = place.get();
        taken.add(box);
        g.setFill(Inks.CASING);
        g.fillRoundRect(box.getMinX(), box.getMinY(), box.getWidth(), box.getHeight(), 7, 7);
        if (scene.isSelected(track)) {
            Lines.pen(g, Inks.SELECTED, 1.2);
            g.strokeRoundRect(box.getMinX(), box.getMinY(), box.getWidth(), box.getHeight(), 7, 7);
        }
        g.setFont(scene.letters().label());
        g.setTextAlign(TextAlignment.CENTER);
        g.setTextBaseline(VPos.CENTER);
        g.setFill(Inks.of(track, scene.session().tracks()));
        g.fillText(words, box.getMinX() + box.getWidth() / 2, box.getMinY() + box.getHeight() / 2);
    }

    /** Behind the line first, where no arrow runs; then ahead of it. */
    private static Optional<Rectangle2D> free(PlaneScene scene, TrackPiece piece, double width,
                                              List<Rectangle2D> taken) {
        ViewTransform view = scene.view();
        double height = scene.letters().lineHeight() + 2;
        List<TrackVertex> vertices = piece.vertices();
        for (double side : new double[] {-1, 1}) {
            for (double share : PLACES) {
                TrackVertex vertex = vertices.get((int) Math.round(share * (vertices.size() - 1)));
                double bearing = Double.isFinite(vertex.normalBearingDeg()) ? vertex.normalBearingDeg() : 180;
                Point way = Point.towards(bearing).times(side);
                double x = view.screenX(vertex.position()) + way.xKm() * (OFF_PX + width / 2 - 10) - width / 2;
                double y = view.screenY(vertex.position()) - way.yKm() * OFF_PX - height / 2;
                Rectangle2D box = new Rectangle2D(x, y, width, height);
                boolean inside = x >= 0 && y >= 0 && x + width <= view.widthPx() && y + height <= view.heightPx();
                if (inside && taken.stream().noneMatch(box::intersects)) {
                    return Optional.of(box);
                }
            }
        }
        return Optional.empty();
    }
}
