package hemline.boundary;

/**
 * A speed with its uncertainty, or neither.
 *
 * @param speedMs m s⁻¹; NaN when not available
 * @param sdMs    standard deviation, m s⁻¹; NaN when and only when the speed is
 */
public record Speed(double speedMs, double sdMs) {
    public static final Speed UNKNOWN = new Speed(Double.NaN, Double.NaN);

    public Speed {
        if (Double.isNaN(speedMs) != Double.isNaN(sdMs) || sdMs < 0) {
            throw new IllegalArgumentException("a speed needs its uncertainty: " + speedMs + " +- " + sdMs + " m/s");
        }
    }

    public boolean isKnown() {
        return !Double.isNaN(speedMs);
    }
}
