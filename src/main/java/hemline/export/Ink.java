package hemline.export;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.Shape;
import java.awt.geom.Path2D;

/** Colours and pens of pictures: light marks with a dark rim, so that they show over any reflectivity. */
final class Ink {
    static final Color PAPER = new Color(0x0a0c12);
    static final Color NOT_MEASURED = new Color(0x1d2027);
    static final Color FRAME = new Color(0x5a6270);
    static final Color WORDS = new Color(0xe8e6e1);
    static final Color FAINT_WORDS = new Color(0xa9adb5);
    static final Color MEETING = new Color(0xffffff);
    private static final Color RIM = new Color(0x0a, 0x0c, 0x12, 200);
    /** Warm hues of like lightness, apart from the cool reflectivity; tracks also differ by label. */
    private static final Color[] TRACKS = {new Color(0xffa64d), new Color(0xff7a8a), new Color(0xffd75e),
        new Color(0xf59be0), new Color(0xffb59c), new Color(0xe6c3ff)};

    private final Graphics2D graphics;

    Ink(Graphics2D graphics) {
        this.graphics = graphics;
        graphics.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
        graphics.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
    }

    Graphics2D graphics() {
        return graphics;
    }

    /** The colour of a track by its place in the table. */
    static Color track(int index) {
        return TRACKS[Math.floorMod(index, TRACKS.length)];
    }

    static Color faded(Color color, double opacity) {
        return new Color(color.getRed(), color.getGreen(), color.getBlue(), (int) Math.round(255 * opacity));
    }

    void line(Shape shape, Color color, double width, float... dashes) {
        graphics.setStroke(pen(width, dashes));
        graphics.setColor(color);
        graphics.draw(shape);
    }

    /** A line with a dark rim around it. */
    void rimmedLine(Shape shape, Color color, double width, float... dashes) {
        line(shape, Ink.faded(RIM, color.getAlpha() / 255.0 * RIM.getAlpha() / 255.0), width + 2.2, dashes);
        line(shape, color, width, dashes);
    }

    /** Words that start at a point of their base line. */
    void words(String text, double x, double y, double height, Color color) {
        line(StrokeFont.standard().path(text, x, y, height), color, Math.max(1, height * 0.13));
    }

    /** Words with a dark rim, for use over reflectivity. */
    void rimmedWords(String text, double x, double y, double height, Color color) {
        Path2D path = StrokeFont.standard().path(text, x, y, height);
        double width = Math.max(1, height * 0.14);
        line(path, RIM, width + 3.5);
        line(path, color, width);
    }

    private static BasicStroke pen(double width, float[] dashes) {
        return dashes.length == 0 ? new BasicStroke((float) width, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND)
                : new BasicStroke((float) width, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 10, dashes, 0);
    }
}
