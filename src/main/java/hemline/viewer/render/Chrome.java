package hemline.viewer.render;

import javafx.scene.paint.Color;

/**
 * Colours of drawn parts that belong to the window rather than to the sweep, for a dark or a light window.
 *
 * @param ground  behind everything
 * @param text    words and numbers
 * @param muted   less important words and ticks
 * @param line    rules
 * @param mark    the sweep shown
 * @param letters fonts at the user's text size
 */
public record Chrome(Color ground, Color text, Color muted, Color line, Color mark, Letters letters) {
    public static Chrome of(boolean dark, Letters letters) {
        return dark
                ? new Chrome(Color.web("#12161c"), Color.web("#e3e9f0"), Color.web("#97a3b1"), Color.web("#2d3640"),
                        Color.web("#7dffce"), letters)
                : new Chrome(Color.web("#f4f5f2"), Color.web("#1b2026"), Color.web("#59636e"), Color.web("#cfd4d2"),
                        Color.web("#00745a"), letters);
    }

    /** A track's ink, darkened enough to read on this ground. */
    Color readable(Color ink) {
        return ground.getBrightness() > 0.5 ? ink.deriveColor(0, 1.25, 0.68, 1) : ink;
    }
}
