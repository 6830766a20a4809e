package hemline.boundary.station;

import hemline.numerics.Estimate;

/**
 * What changed at a station from before a passage to after it. Unknown where not observed on both sides.
 *
 * @param before            means over the minutes before the first sign of the passage
 * @param after             means over the minutes after the last
 * @param temperatureFallK  K, positive for a fall
 * @param thetaVFallK       of virtual potential temperature, K, positive for a fall
 * @param thetaEFallK       of equivalent potential temperature, K, positive for a fall
 * @param pressureRiseHpa   hPa, positive for a rise
 * @param windShiftDeg      turn of the wind, degrees in (−180, 180], positive for a veer (clockwise)
 * @param pressureAssumed   true when no pressure was observed and that of a standard atmosphere was taken
 */
public record AirChange(AirMeans before, AirMeans after, Estimate temperatureFallK, Estimate thetaVFallK,
                        Estimate thetaEFallK, Estimate pressureRiseHpa, Estimate windShiftDeg,
                        boolean pressureAssumed) {
}
