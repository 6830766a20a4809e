package hemline.scoring;

/**
 * A bootstrap interval over scenes: the 2.5 and 97.5 % points of the replicates.
 *
 * @param low  NaN when too few replicates have a value
 * @param high NaN when and only when {@code low} is
 */
public record Interval(double low, double high) {
    public static final Interval UNKNOWN = new Interval(Double.NaN, Double.NaN);
}
