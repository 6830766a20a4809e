package hemline.viewer.render;

import hemline.viewer.viewmodel.TimeScale;
import hemline.viewer.viewmodel.Trace;
import hemline.viewer.viewmodel.ValueScale;
import hemline.viewer.viewmodel.Words;
import java.util.List;
import java.util.Optional;
import javafx.geometry.VPos;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.paint.Color;
import javafx.scene.text.TextAlignment;

/** Draws one trace: the band of two standard deviations, the line, its samples, and the sweep shown. */
public final class TracePainter {
    public static final double LEFT_PX = 42;
    public static final double RIGHT_PX = 12;
    private static final double TOP_PX = 20;
    private static final double BOTTOM_PX = 17;
    private static final double BOTTOM_BARE_PX = 6;

    /**
     * @param time    of the axis, from {@link #LEFT_PX} to {@link #RIGHT_PX} before the right edge
     * @param nowMs   time of the sweep shown
     * @param hovered sample to be read out; empty for none
     * @param ink     the track's colour
     * @param timed   whether times are written under it; stacked traces need them once
     */
    public void paint(GraphicsContext g, Trace trace, TimeScale time, double nowMs, Optional<Trace.Sample> hovered,
                      Color ink, Chrome chrome, boolean timed, double width, double height) {
        double bottom = height - (timed ? BOTTOM_PX : BOTTOM_BARE_PX);
        Color colour = chrome.readable(ink);
        g.setFill(chrome.ground());
        g.fillRect(0, 0, width, height);
        g.setFont(chrome.letters().small());
        g.setTextBaseline(VPos.CENTER);
        heading(g, trace, hovered, chrome, width);
        if (trace.samples().isEmpty()) {
            g.setTextAlign(TextAlignment.LEFT);
            g.setFill(chrome.muted());
            g.fillText(trace.none(), LEFT_PX, height / 2, width - LEFT_PX - RIGHT_PX);
            return;
        }
        ValueScale value = ValueScale.of(trace, bottom, TOP_PX);
        axes(g, time, value, chrome, timed, width, bottom);
        band(g, trace.samples(), time, value, colour);
        line(g, trace.samples(), time, value, colour);
        if (nowMs >= time.fromMs() && nowMs <= time.toMs()) {
            Lines.pen(g, chrome.mark(), 1.2);
            g.strokeLine(time.x(nowMs), TOP_PX, time.x(nowMs), bottom);
        }
        hovered.ifPresent(sample -> {
            Lines.pen(g, chrome.text(), 1.5);
            g.strokeOval(time.x(sample.timeMs()) - 4.5, value.y(sample.value()) - 4.5, 9, 9);
        });
    }

    private static void heading(GraphicsContext g, Trace trace, Optional<Trace.Sample> hovered, Chrome chrome,
                                double width) {
        g.setTextAlign(TextAlignment.LEFT);
        g.setFill(chrome.text());
        g.fillText(trace.name() + ", " + trace.unit(), 8, 9);
        hovered.ifPresent(sample -> {
            g.setTextAlign(TextAlignment.RIGHT);
            g.fillText(trace.words(sample), width - RIGHT_PX, 9);
        });
    }

    private static void axes(GraphicsContext g, TimeScale time, ValueScale value, Chrome chrome, boolean timed,
                             double width, double bottom) {
        Lines.pen(g, chrome.line(), 1);
        g.setFill(chrome.muted());
        g.setTextAlign(TextAlignment.RIGHT);
        for (double tick : value.ticks(17)) {
            double y = Math.round(value.y(tick)) + 0.5;
            g.strokeLine(LEFT_PX, y, width - RIGHT_PX, y);
            g.fillText(Words.number(tick, Math.abs(tick - Math.rint(tick)) > 1e-6 ? 1 : 0), LEFT_PX - 5, y);
        }
        g.setTextAlign(TextAlignment.CENTER);
        for (long tick : time.ticks(58)) {
            double x = time.x(tick);
            g.strokeLine(x, bottom, x, bottom + 4);
            if (timed) {
                g.fillText(Words.shortClock(tick), x, bottom + BOTTOM_PX - 7);
            }
        }
    }

    private static void band(GraphicsContext g, List<Trace.Sample> samples, TimeScale time, ValueScale value,
                             Color colour) {
        List<Trace.Sample> known = samples.stream().filter(s -> Double.isFinite(s.sd())).toList();
        int n = known.size();
        double[] xs = new double[2 * n];
        double[] ys = new double[2 * n];
        for (int i = 0; i < n; i++) {
            xs[i] = time.x(known.get(i).timeMs());
            ys[i] = value.y(known.get(i).high());
            xs[2 * n - 1 - i] = xs[i];
            ys[2 * n - 1 - i] = value.y(known.get(i).low());
        }
        g.setFill(Inks.faded(colour, 0.22));
        g.fillPolygon(xs, ys, 2 * n);
    }

    private static void line(GraphicsContext g, List<Trace.Sample> samples, TimeScale time, ValueScale value,
                             Color colour) {
        double[] xs = samples.stream().mapToDouble(s -> time.x(s.timeMs())).toArray();
        double[] ys = samples.stream().mapToDouble(s -> value.y(s.value())).toArray();
        Lines.pen(g, colour, 1.8);
        g.strokePolyline(xs, ys, xs.length);
        g.setFill(colour);
        for (int i = 0; i < xs.length; i++) {
            g.fillOval(xs[i] - 2.3, ys[i] - 2.3, 4.6, 4.6);
        }
    }
}
