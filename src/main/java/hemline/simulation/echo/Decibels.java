package hemline.simulation.echo;

import org.apache.commons.math3.util.FastMath;

/** Decibels and plain ratios; with pure Java arithmetic, so that every platform gives the same bytes. */
public final class Decibels {
    private static final double LN10_OVER_10 = 0.23025850929940458;

    private Decibels() {
    }

    public static double toLinear(double db) {
        return FastMath.exp(LN10_OVER_10 * db);
    }

    public static double fromLinear(double linear) {
        return 10 * FastMath.log10(linear);
    }
}
