package hemline.numerics;

import org.apache.commons.math3.distribution.ChiSquaredDistribution;
import org.apache.commons.math3.distribution.NormalDistribution;
import org.apache.commons.math3.distribution.TDistribution;

/** Quantiles and tails of the usual distributions, from Apache Commons Math. */
public final class Distributions {
    private Distributions() {
    }

    /** The value below which a chi-squared variable lies with a probability. */
    public static double chiSquaredQuantile(double degreesOfFreedom, double probability) {
        return new ChiSquaredDistribution(null, degreesOfFreedom).inverseCumulativeProbability(probability);
    }

    /** The value below which a Student t variable lies with a probability. */
    public static double studentQuantile(double degreesOfFreedom, double probability) {
        return new TDistribution(null, degreesOfFreedom).inverseCumulativeProbability(probability);
    }

    /** Probability that a standard normal variable lies below a value. */
    public static double normalBelow(double value) {
        return new NormalDistribution(null, 0, 1).cumulativeProbability(value);
    }
}
