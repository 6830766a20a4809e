package hemline.viewer.render;

import java.util.HashMap;
import java.util.Map;
import javafx.geometry.VPos;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.paint.Color;
import javafx.scene.text.Font;
import javafx.scene.text.FontWeight;
import javafx.scene.text.Text;
import javafx.scene.text.TextAlignment;

/** Fonts of drawn words at the user's text size, and how wide words are in them. Not for use by several threads. */
public final class Letters {
    private static final int KEPT_WIDTHS = 2000;

    private final double scale;
    private final Font label;
    private final Font small;
    private final Map<String, Double> widths = new HashMap<>();

    /** @param scale text size over the usual */
    public Letters(double scale) {
        this.scale = scale;
        label = Font.font("System", FontWeight.BOLD, 12 * scale);
        small = Font.font("System", 11 * scale);
    }

    public double scale() {
        return scale;
    }

    Font label() {
        return label;
    }

    Font small() {
        return small;
    }

    /** Height of a line of words, pixels. */
    double lineHeight() {
        return 15 * scale;
    }

    /** Width of words, pixels. */
    double width(String words, Font font) {
        if (widths.size() > KEPT_WIDTHS) {
            widths.clear();
        }
        return widths.computeIfAbsent(font.getSize() + words, key -> {
            Text text = new Text(words);
            text.setFont(font);
            return text.getLayoutBounds().getWidth();
        });
    }

    /** Small words centred on a dark plate, so that they read on any echo. */
    void plate(GraphicsContext g, String words, double x, double y, Color colour) {
        double half = width(words, small) / 2 + 4;
        g.setFont(small);
        g.setTextAlign(TextAlignment.CENTER);
        g.setTextBaseline(VPos.CENTER);
        g.setFill(Inks.CASING);
        g.fillRoundRect(x - half, y - lineHeight() / 2, 2 * half, lineHeight(), 6, 6);
        g.setFill(colour);
        g.fillText(words, x, y);
    }
}
