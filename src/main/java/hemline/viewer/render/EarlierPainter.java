package hemline.viewer.render;

import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.paint.Color;

/** The tracks where they were in earlier sweeps: one thin line a sweep, fainter with age. */
final class EarlierPainter {
    private static final int MOST = 8;
    private static final int MOST_SELECTED = 60;

    void paint(GraphicsContext g, PlaneScene scene) {
        for (Track track : scene.session().tracks()) {
            Color colour = Inks.of(track, scene.session().tracks());
            int most = scene.isSelected(track) ? MOST_SELECTED : MOST;
            for (TrackPiece piece : track.pieces()) {
                int age = scene.index() - piece.sweep();
                // A track that has ended leaves no lines behind unless it is selected.
                boolean live = scene.isSelected(track) || lastSweep(track) >= scene.index() - 1;
                if (age > 0 && age <= most && live) {
                    Lines.pen(g, Inks.faded(colour, 0.65 * Math.max(0.2, 1 - (double) age / (most + 1))), 1);
                    Lines.stroke(g, scene.view(), piece);
                }
            }
        }
    }

    private static int lastSweep(Track track) {
        return track.pieces().get(track.pieces().size() - 1).sweep();
    }
}
