package hemline.numerics;

import java.util.Arrays;

/** Medians, spreads and weights that a few wild values cannot move. */
public final class Robust {
    /** Makes the median absolute deviation of normal values their standard deviation: 1 / Φ⁻¹(3/4). */
    private static final double NORMAL_FACTOR = 1.482602218505602;

    private Robust() {
    }

    /** Median of values, NaNs left out; NaN if none is left. */
    public static double median(double[] values) {
        return quantile(values, 0.5);
    }

    /** Quantile by linear interpolation of the sorted values, NaNs left out; NaN if none is left. */
    public static double quantile(double[] values, double share) {
        if (!(share >= 0 && share <= 1)) {
            throw new IllegalArgumentException("a quantile lies within 0..1, got " + share);
        }
        double[] sorted = Arrays.stream(values).filter(v -> !Double.isNaN(v)).sorted().toArray();
        if (sorted.length == 0) {
            return Double.NaN;
        }
        double at = share * (sorted.length - 1);
        int below = (int) at;
        int above = Math.min(below + 1, sorted.length - 1);
        return sorted[below] == sorted[above] ? sorted[below]
                : sorted[below] + (at - below) * (sorted[above] - sorted[below]);
    }

    /** Standard deviation from the median absolute deviation; NaN without values. */
    public static double spread(double[] values) {
        double centre = median(values);
        return NORMAL_FACTOR * median(Arrays.stream(values).map(v -> Math.abs(v - centre)).toArray());
    }

    /** Cauchy's weight {@code 1 / (1 + (r/c)²)} of a residual. */
    public static double cauchy(double residual, double scale) {
        double u = residual / scale;
        return 1 / (1 + u * u);
    }
}
