package hemline.viewer.render;

import hemline.boundary.Track;
import java.util.List;
import javafx.scene.paint.Color;

/** Colours and line patterns of everything drawn over a sweep. */
public final class Inks {
    /** Under a line, so that it shows on light echo as well as on dark. */
    public static final Color CASING = Color.web("#05070c", 0.75);
    /** Round the selected track. */
    public static final Color SELECTED = Color.WHITE;
    static final Color GRID = Color.web("#93a4b8", 0.42);
    static final Color GRID_TEXT = Color.web("#c3cfdd");
    static final Color COAST = Color.web("#b8d4e3", 0.8);
    static final Color BORDER = Color.web("#d7d2c4", 0.75);
    static final Color STATE_BORDER = Color.web("#d7d2c4", 0.45);
    static final Color OWN_MAP = Color.web("#b9f0d2", 0.7);
    static final Color CEILING = Color.web("#e9c46a", 0.75);
    public static final Color MEETING = Color.web("#ffffff");
    static final Color MEASURE = Color.web("#7dffce");
    static final double[] SOLID = {};
    /** A boundary drawn by hand. */
    static final double[] HAND = {9, 5};
    static final double[] ARC_FIT = {2, 5};
    static final double[] FAINT = {3, 5};
    /** Warm and saturated, which the sweep's own colours are not; they differ in lightness too. */
    private static final List<Color> TRACKS = List.of(Color.web("#ff9a1f"), Color.web("#ff4f9a"), Color.web("#ffe45c"),
            Color.web("#ff5b3a"), Color.web("#d79bff"), Color.web("#ffc39a"));

    private Inks() {
    }

    /** The colour of a track, by its place among the tracks. */
    public static Color of(Track track, List<Track> among) {
        return TRACKS.get(Math.floorMod(among.indexOf(track), TRACKS.size()));
    }

    static Color faded(Color colour, double opacity) {
        return Color.color(colour.getRed(), colour.getGreen(), colour.getBlue(), opacity);
    }
}
