package hemline.viewer.viewmodel;

import java.util.List;

/**
 * Values along a vertical screen axis, larger upward.
 *
 * @param low    value at {@code bottomPx}
 * @param high   value at {@code topPx}; above {@code low}
 */
public record ValueScale(double low, double high, double bottomPx, double topPx) {

    /** A scale that holds all samples with their bands and a little air; zero is included when it is near. */
    public static ValueScale of(Trace trace, double bottomPx, double topPx) {
        double low = trace.samples().stream().mapToDouble(Trace.Sample::low).min().orElse(0);
        double high = trace.samples().stream().mapToDouble(Trace.Sample::high).max().orElse(1);
        if (low > 0 && low < 0.5 * high) {
            low = 0;
        }
        double air = Math.max(0.5, 0.06 * (high - low));
        return new ValueScale(low == 0 ? 0 : low - air, high + air, bottomPx, topPx);
    }

    public double y(double value) {
        return bottomPx + (value - low) * (topPx - bottomPx) / (high - low);
    }

    public List<Double> ticks(double leastPx) {
        double step = NiceSteps.step(leastPx * (high - low) / Math.max(1, Math.abs(bottomPx - topPx)));
        return NiceSteps.multiples(low, high, step);
    }
}
