package hemline.export;

import hemline.export.Series.Value;
import java.util.List;

/** A series against time with its band of two standard deviations, as SVG. */
final class TraceChart {
    private static final int WIDTH = 400;
    private static final int HEIGHT = 170;
    private static final int LEFT = 44;
    private static final int RIGHT = 10;
    private static final int TOP = 24;
    private static final int BOTTOM = 26;

    private final long firstMs;
    private final long lastMs;

    /** All charts of a loop share its span of time, so that they can be compared. */
    TraceChart(long firstMs, long lastMs) {
        this.firstMs = firstMs;
        this.lastMs = Math.max(lastMs, firstMs + 1);
    }

    String draw(String title, Series series, String colour) {
        double low = Double.POSITIVE_INFINITY;
        double high = Double.NEGATIVE_INFINITY;
        for (Value value : series.values()) {
            double band = Double.isNaN(value.sd()) ? 0 : 2 * value.sd();
            low = Math.min(low, value.value() - band);
            high = Math.max(high, value.value() + band);
        }
        double step = step(high - Math.min(0, low));
        double bottom = step * Math.floor(Math.min(0, low) / step);
        double top = Math.max(bottom + step, step * Math.ceil(high / step));
        Svg svg = new Svg(WIDTH, HEIGHT);
        for (double mark = bottom; mark <= top + step / 2; mark += step) {
            double y = y(mark, bottom, top);
            svg.line(new double[][] {{LEFT, y}, {WIDTH - RIGHT, y}}, PaperInk.GRID, 1, 1, "");
            svg.words(Numbers.fixed(mark, step < 1 ? 1 : 0), LEFT - 6, y + 4, 11, PaperInk.FAINT, "end");
        }
        svg.words(Times.clock(firstMs).substring(0, 5), LEFT, HEIGHT - 8, 11, PaperInk.FAINT, "start");
        svg.words(Times.clock(lastMs).substring(0, 5) + " UTC", WIDTH - RIGHT, HEIGHT - 8, 11, PaperInk.FAINT, "end");
        svg.words(title + " " + series.name(), LEFT, 15, 12, PaperInk.WORDS, "start");
        marks(svg, series.values(), bottom, top, colour);
        return svg.drawing(title + " " + series.name() + " against time, with a band of two standard deviations");
    }

    private void marks(Svg svg, List<Value> values, double bottom, double top, String colour) {
        int n = values.size();
        if (values.stream().noneMatch(v -> Double.isNaN(v.sd())) && n > 1) {
            double[][] band = new double[2 * n][];
            for (int i = 0; i < n; i++) {
                Value v = values.get(i);
                band[i] = new double[] {x(v.timeMs()), y(v.value() + 2 * v.sd(), bottom, top)};
                band[2 * n - 1 - i] = new double[] {x(v.timeMs()), y(v.value() - 2 * v.sd(), bottom, top)};
            }
            svg.area(band, colour, 0.18);
        }
        double[][] line = values.stream().map(v -> new double[] {x(v.timeMs()), y(v.value(), bottom, top)})
                .toArray(double[][]::new);
        if (n > 1) {
            svg.line(line, colour, 1.6, 1, "");
        }
        for (double[] point : line) {
            svg.circle(point[0], point[1], 2, colour, 1.2, "");
        }
    }

    private double x(long timeMs) {
        return LEFT + (double) (timeMs - firstMs) / (lastMs - firstMs) * (WIDTH - LEFT - RIGHT);
    }

    private static double y(double value, double bottom, double top) {
        return TOP + (top - value) / (top - bottom) * (HEIGHT - TOP - BOTTOM);
    }

    /** A round step that gives three to seven marks. */
    private static double step(double span) {
        double step = 0.1;
        double[] ladder = {2, 2.5, 2};
        for (int i = 0; span / step > 6; i++) {
            step *= ladder[i % 3];
        }
        return step;
    }
}
