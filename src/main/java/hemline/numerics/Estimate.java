package hemline.numerics;

/**
 * A number with its standard deviation, or neither.
 *
 * @param value NaN when not available
 * @param sd    standard deviation, in the unit of the value, at least 0; NaN when and only when the value is
 */
public record Estimate(double value, double sd) {
    public static final Estimate UNKNOWN = new Estimate(Double.NaN, Double.NaN);

    public Estimate {
        if (Double.isNaN(value) != Double.isNaN(sd) || sd < 0 || Double.isInfinite(value) || Double.isInfinite(sd)) {
            throw new IllegalArgumentException("an estimate needs its uncertainty: " + value + " +- " + sd);
        }
    }

    /** A value with a standard deviation that is a share of its size. */
    public static Estimate relative(double value, double share) {
        return new Estimate(value, Math.abs(value) * share);
    }

    public boolean isKnown() {
        return !Double.isNaN(value);
    }

    /** Standard deviation as a share of the value. */
    public double relativeSd() {
        return sd / Math.abs(value);
    }

    /** Sum of independent estimates. */
    public Estimate plus(Estimate other) {
        return new Estimate(value + other.value, Math.hypot(sd, other.sd));
    }

    /** Difference of independent estimates. */
    public Estimate minus(Estimate other) {
        return new Estimate(value - other.value, Math.hypot(sd, other.sd));
    }

    /** Product of independent estimates, to first order. */
    public Estimate times(Estimate other) {
        return new Estimate(value * other.value, Math.hypot(other.value * sd, value * other.sd));
    }

    public Estimate times(double factor) {
        return new Estimate(value * factor, Math.abs(factor) * sd);
    }

    /** Quotient of independent estimates, to first order; the other must not be 0. */
    public Estimate over(Estimate other) {
        if (other.value == 0) {
            throw new IllegalArgumentException("an estimate cannot be divided by 0");
        }
        return new Estimate(value / other.value,
                Math.hypot(sd / other.value, value * other.sd / (other.value * other.value)));
    }

    /** A power, to first order; the value must be above 0. */
    public Estimate power(double exponent) {
        if (value <= 0) {
            throw new IllegalArgumentException("a power needs a value above 0, got " + value);
        }
        double power = Math.pow(value, exponent);
        return new Estimate(power, Math.abs(exponent) * power * relativeSd());
    }
}
