package hemline.viewer.render;

import hemline.viewer.viewmodel.Overlay;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.paint.Color;

/** A small sample of how each overlay is drawn. */
public final class LegendPainter {
    public static final double WIDTH_PX = 34;
    public static final double HEIGHT_PX = 16;
    private static final Color SAMPLE = Color.web("#ff9a1f");

    private static final Letters LETTERS = new Letters(1);

    private LegendPainter() {
    }

    public static void paint(GraphicsContext g, Overlay overlay) {
        double middle = HEIGHT_PX / 2;
        switch (overlay) {
            case BOUNDARIES -> line(g, SAMPLE, 2.4, middle, Inks.SOLID);
            case LABELS -> {
                g.setFont(LETTERS.label());
                g.setFill(SAMPLE);
                g.fillText("T01", 5, middle + 4);
            }
            case ARROWS -> {
                line(g, SAMPLE, 1.2, middle, Inks.SOLID);
                Lines.pen(g, SAMPLE, 1.2);
                g.strokeLine(WIDTH_PX - 2, middle, WIDTH_PX - 8, middle - 3.5);
                g.strokeLine(WIDTH_PX - 2, middle, WIDTH_PX - 8, middle + 3.5);
                Lines.pen(g, Inks.faded(SAMPLE, 0.6), 4);
                g.strokeLine(WIDTH_PX - 11, middle, WIDTH_PX - 3, middle);
            }
            case EARLIER -> {
                for (int i = 0; i < 3; i++) {
                    line(g, Inks.faded(SAMPLE, 0.3 + 0.25 * i), 1, 3 + 5 * i, Inks.SOLID);
                }
            }
            case ARCS -> line(g, SAMPLE, 1.2, middle, Inks.ARC_FIT);
            case MEETINGS -> {
                MeetingPainter.diamond(g, 9, middle, 6, true);
                MeetingPainter.diamond(g, 25, middle, 6, false);
            }
            case RINGS -> {
                Lines.pen(g, Inks.GRID, 1);
                g.strokeOval(9, 0.5, 15, 15);
            }
            case AZIMUTHS -> {
                Lines.pen(g, Inks.GRID_TEXT, 1);
                g.strokeLine(12, 2, 12, 9);
                g.setFont(LETTERS.small());
                g.setFill(Inks.GRID_TEXT);
                g.fillText("\u00b0", 16, 14);
            }
            case CEILING -> line(g, Inks.CEILING, 1, middle, Inks.FAINT);
            case MAP -> {
                Lines.pen(g, Inks.COAST, 1);
                g.strokePolyline(new double[] {2, 9, 15, 22, 32}, new double[] {12, 5, 9, 3, 7}, 5);
            }
            case GRATICULE -> {
                line(g, Inks.GRID, 1, middle, Inks.SOLID);
                Lines.pen(g, Inks.GRID, 1);
                g.strokeLine(WIDTH_PX / 2, 1, WIDTH_PX / 2, HEIGHT_PX - 1);
            }
        }
    }

    private static void line(GraphicsContext g, Color colour, double width, double y, double[] dashes) {
        Lines.pen(g, colour, width, dashes);
        g.strokeLine(2, y, WIDTH_PX - 2, y);
    }
}
