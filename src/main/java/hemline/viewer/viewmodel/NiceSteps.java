package hemline.viewer.viewmodel;

import java.util.ArrayList;
import java.util.List;

/** Round numbers for axes and rings. */
public final class NiceSteps {
    private NiceSteps() {
    }

    /** The smallest of 1, 2, 5 times a power of ten that is not below {@code least}, which is above 0. */
    public static double step(double least) {
        if (!(least > 0 && Double.isFinite(least))) {
            throw new IllegalArgumentException("a step must be above 0, got " + least);
        }
        double power = Math.pow(10, Math.floor(Math.log10(least)));
        for (double times : new double[] {1, 2, 5}) {
            if (times * power >= least * (1 - 1e-9)) {
                return times * power;
            }
        }
        return 10 * power;
    }

    /** Multiples of a step within {@code from..to}. */
    public static List<Double> multiples(double from, double to, double step) {
        List<Double> found = new ArrayList<>();
        for (long i = (long) Math.ceil(from / step - 1e-9); i * step <= to + 1e-9 * step; i++) {
            found.add(i * step);
        }
        return found;
    }
}
