package hemline.viewer.render;

import hemline.sweep.Field;
import hemline.sweep.MaskReason;
import hemline.sweep.ReflectivityScale;
import hemline.viewer.viewmodel.PlaneField;
import hemline.viewer.viewmodel.ReadOut;
import hemline.viewer.viewmodel.Words;
import java.util.Optional;
import javafx.geometry.VPos;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.paint.Color;
import javafx.scene.text.TextAlignment;

/** The scale of the field shown, with the value under the cursor marked on it. */
public final class ScalePainter {
    public static final double WIDTH_PX = 62;
    private static final double BAR_PX = 14;
    private static final double TOP_PX = 24;
    private static final double BOTTOM_PX = 26;
    private static final double LOW_DBZ = ReflectivityScale.LOWEST_DBZ;
    private static final double HIGH_DBZ = ReflectivityScale.HIGHEST_DBZ;

    public void paint(GraphicsContext g, PlaneField field, Optional<ReadOut> cursor, Letters letters, double height) {
        g.clearRect(0, 0, WIDTH_PX, height);
        g.setFill(Inks.faded(Color.web("#0b0e13"), 0.82));
        g.fillRoundRect(0, 0, WIDTH_PX, height, 10, 10);
        g.setFont(letters.small());
        g.setTextBaseline(VPos.CENTER);
        g.setTextAlign(TextAlignment.LEFT);
        switch (field) {
            case VELOCITY -> velocity(g, cursor, height);
            case REMOVED -> reasons(g, height);
            default -> reflectivity(g, cursor, height);
        }
    }

    private static void reflectivity(GraphicsContext g, Optional<ReadOut> cursor, double height) {
        title(g, "dBZ");
        double bottom = height - BOTTOM_PX;
        for (double y = TOP_PX; y < bottom; y++) {
            double dbz = HIGH_DBZ - (y - TOP_PX) / (bottom - TOP_PX) * (HIGH_DBZ - LOW_DBZ);
            swatch(g, y, 1, ReflectivityScale.standard().argb((float) dbz));
        }
        for (double dbz = -20; dbz <= 60; dbz += 10) {
            number(g, bottom - (dbz - LOW_DBZ) / (HIGH_DBZ - LOW_DBZ) * (bottom - TOP_PX), dbz);
        }
        swatch(g, bottom + 6, 12, ReflectivityScale.BELOW_DETECTION_ARGB);
        Lines.pen(g, Inks.GRID, 1);
        g.strokeRect(8.5, bottom + 6.5, BAR_PX - 1, 11);
        g.setFill(Inks.GRID_TEXT);
        g.fillText("below", 27, bottom + 12, WIDTH_PX - 28);
        cursor.filter(r -> Field.isMeasured(r.dbz()) && Field.isEcho(r.dbz())).ifPresent(r ->
                pointer(g, bottom - (clamp(r.dbz(), LOW_DBZ, HIGH_DBZ) - LOW_DBZ) / (HIGH_DBZ - LOW_DBZ)
                        * (bottom - TOP_PX)));
    }

    private static void velocity(GraphicsContext g, Optional<ReadOut> cursor, double height) {
        title(g, Words.METRES_PER_SECOND);
        double bottom = height - BOTTOM_PX;
        double largest = VelocityScale.LARGEST_MS;
        for (double y = TOP_PX; y < bottom; y++) {
            swatch(g, y, 1, VelocityScale.argb(largest - (y - TOP_PX) / (bottom - TOP_PX) * 2 * largest));
        }
        for (double v = -30; v <= 30; v += 10) {
            number(g, bottom - (v + largest) / (2 * largest) * (bottom - TOP_PX), v);
        }
        g.setFill(Inks.GRID_TEXT);
        g.fillText("+ is away", 6, bottom + 13, WIDTH_PX - 8);
        cursor.filter(r -> Double.isFinite(r.velocityMs())).ifPresent(r -> pointer(g,
                bottom - (clamp(r.velocityMs(), -largest, largest) + largest) / (2 * largest) * (bottom - TOP_PX)));
    }

    private static void reasons(GraphicsContext g, double height) {
        title(g, "why");
        double step = Math.min(40, (height - TOP_PX) / MaskReason.values().length);
        for (MaskReason reason : MaskReason.values()) {
            double y = TOP_PX + step * reason.ordinal();
            swatch(g, y + 2, 10, ReasonColours.argb(reason));
            g.setFill(Inks.GRID_TEXT);
            g.fillText(shortWord(reason), 8, y + 20, WIDTH_PX - 12);
        }
    }

    private static String shortWord(MaskReason reason) {
        return switch (reason) {
            case CLUTTER -> "clutter";
            case SPIKE -> "spike";
            case SPECKLE -> "speckle";
            case SECOND_TRIP -> "2nd trip";
            case BLOCKED -> "blocked";
            case DEEP_CONVECTION -> "deep rain";
            case ABOVE_CEILING -> "too high";
        };
    }

    private static void title(GraphicsContext g, String words) {
        g.setFill(Inks.GRID_TEXT);
        g.fillText(words, 8, 11);
    }

    private static void swatch(GraphicsContext g, double y, double height, int argb) {
        g.setFill(Color.rgb(argb >> 16 & 0xff, argb >> 8 & 0xff, argb & 0xff));
        g.fillRect(8, y, BAR_PX, height);
    }

    private static void number(GraphicsContext g, double y, double value) {
        Lines.pen(g, Inks.GRID_TEXT, 1);
        g.strokeLine(8 + BAR_PX, y, 8 + BAR_PX + 3, y);
        g.setFill(Inks.GRID_TEXT);
        g.fillText(Words.number(value, 0), 8 + BAR_PX + 6, y);
    }

    private static void pointer(GraphicsContext g, double y) {
        g.setFill(Color.WHITE);
        g.fillPolygon(new double[] {1, 8, 1}, new double[] {y - 5, y, y + 5}, 3);
        Lines.pen(g, Color.WHITE, 1);
        g.strokeLine(8, y, 8 + BAR_PX, y);
    }

    private static double clamp(double value, double low, double high) {
        return Math.max(low, Math.min(high, value));
    }
}
