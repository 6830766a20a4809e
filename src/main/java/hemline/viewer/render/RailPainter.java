package hemline.viewer.render;

import hemline.boundary.Meeting;
import hemline.boundary.Track;
import hemline.viewer.viewmodel.RailLayout;
import hemline.viewer.viewmodel.Words;
import java.util.List;
import javafx.geometry.VPos;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.paint.Color;
import javafx.scene.text.TextAlignment;

/** Draws the rail. */
public final class RailPainter {
    private static final double TICK_Y = 20;

    /**
     * What the rail shows beside its layout.
     *
     * @param index   the sweep shown
     * @param first   first sweep of the range that plays
     * @param last    last sweep of that range
     * @param track   id of the selected track, empty for none
     * @param meeting id of the selected meeting, empty for none
     * @param tracks  all tracks, for their colours
     */
    public record State(int index, int first, int last, String track, String meeting, List<Track> tracks) {
    }

    public void paint(GraphicsContext g, RailLayout layout, State state, Chrome chrome, double width, double height) {
        g.setFill(chrome.ground());
        g.fillRect(0, 0, width, height);
        double from = layout.sweepX().get(state.first());
        double to = layout.sweepX().get(state.last());
        g.setFill(Inks.faded(chrome.mark(), 0.10));
        g.fillRect(from - 3, TICK_Y - 5, to - from + 6, 10);
        times(g, layout, chrome, height);
        ticks(g, layout, state, chrome);
        for (RailLayout.Bar bar : layout.bars()) {
            bar(g, bar, state, chrome);
        }
        for (RailLayout.Mark mark : layout.meetings()) {
            boolean selected = mark.meeting().id().equals(state.meeting());
            g.setGlobalAlpha(1);
            diamond(g, mark.x(), TICK_Y, selected ? 8 : 6, mark.meeting().status() == Meeting.Status.OBSERVED, chrome);
        }
        double now = layout.sweepX().get(state.index());
        Lines.pen(g, chrome.mark(), 1.6);
        g.strokeLine(now, TICK_Y - 6, now, height);
        g.setFill(chrome.mark());
        g.fillPolygon(new double[] {now - 5, now + 5, now}, new double[] {TICK_Y - 12, TICK_Y - 12, TICK_Y - 4}, 3);
    }

    private static void times(GraphicsContext g, RailLayout layout, Chrome chrome, double height) {
        g.setFont(chrome.letters().small());
        g.setTextAlign(TextAlignment.CENTER);
        g.setTextBaseline(VPos.CENTER);
        for (long tick : layout.scale().ticks(64)) {
            double x = layout.scale().x(tick);
            Lines.pen(g, chrome.line(), 1);
            g.strokeLine(x, TICK_Y + 6, x, height);
            g.setFill(chrome.muted());
            g.fillText(Words.shortClock(tick), x, 7);
        }
        Lines.pen(g, chrome.line(), 1);
        g.strokeLine(layout.scale().fromPx(), TICK_Y, layout.scale().toPx(), TICK_Y);
    }

    private static void ticks(GraphicsContext g, RailLayout layout, State state, Chrome chrome) {
        for (int i = 0; i < layout.sweepX().size(); i++) {
            boolean inRange = i >= state.first() && i <= state.last();
            Lines.pen(g, inRange ? chrome.text() : Inks.faded(chrome.muted(), 0.5), inRange ? 1.5 : 1);
            g.strokeLine(layout.sweepX().get(i), TICK_Y - 5, layout.sweepX().get(i), TICK_Y + 5);
        }
    }

    private static void bar(GraphicsContext g, RailLayout.Bar bar, State state, Chrome chrome) {
        boolean selected = bar.track().id().equals(state.track());
        Color ink = chrome.readable(Inks.of(bar.track(), state.tracks()));
        double width = bar.toX() - bar.fromX();
        g.setFill(Inks.faded(ink, selected ? 1 : 0.6));
        g.fillRoundRect(bar.fromX(), bar.y(), width, bar.height(), 4, 4);
        if (selected) {
            Lines.pen(g, chrome.text(), 1.5);
            g.strokeRoundRect(bar.fromX() - 1, bar.y() - 1, width + 2, bar.height() + 2, 5, 5);
        }
        if (bar.height() >= 11) {
            boolean within = width > 34;
            g.setFont(chrome.letters().small());
            g.setTextBaseline(VPos.CENTER);
            g.setTextAlign(TextAlignment.LEFT);
            g.setFill(within ? Color.web("#101318") : chrome.text());
            g.fillText(bar.track().id(), within ? bar.fromX() + 5 : bar.toX() + 5, bar.y() + bar.height() / 2);
        }
    }

    private static void diamond(GraphicsContext g, double x, double y, double half, boolean filled, Chrome chrome) {
        double[] xs = {x, x + half, x, x - half};
        double[] ys = {y - half, y, y + half, y};
        g.setFill(filled ? chrome.text() : chrome.ground());
        g.fillPolygon(xs, ys, 4);
        Lines.pen(g, filled ? chrome.ground() : chrome.text(), 1.5);
        g.strokePolygon(xs, ys, 4);
    }
}
