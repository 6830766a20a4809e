package hemline.boundary.station;

import hemline.numerics.Estimate;

/**
 * A change in one quantity at a station: level, ramp, level.
 *
 * @param startMs when it begins, ms since 1970-01-01T00:00Z
 * @param startSdS standard deviation of that, s
 * @param endMs   when the new level is reached, ms since 1970-01-01T00:00Z
 * @param change  new level less the old, in the unit of the quantity
 */
public record Onset(long startMs, double startSdS, long endMs, Estimate change) {
}
