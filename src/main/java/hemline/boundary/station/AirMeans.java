package hemline.boundary.station;

/**
 * Means over some minutes at a station; NaN for what was not observed.
 *
 * @param observations number of them
 * @param temperatureC °C
 * @param dewPointC    °C
 * @param pressureHpa  hPa
 * @param thetaVK      virtual potential temperature, K
 * @param thetaEK      equivalent potential temperature, K
 * @param windSpeedMs  of the mean wind vector, m s⁻¹
 * @param windFromDeg  compass bearing the mean wind vector comes from, degrees
 */
public record AirMeans(int observations, double temperatureC, double dewPointC, double pressureHpa, double thetaVK,
                       double thetaEK, double windSpeedMs, double windFromDeg) {
}
