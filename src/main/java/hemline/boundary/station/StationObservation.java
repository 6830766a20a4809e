package hemline.boundary.station;

/**
 * One observation at a station. What is not known is NaN.
 *
 * @param timeMs       ms since 1970-01-01T00:00Z
 * @param temperatureC °C
 * @param dewPointC    °C
 * @param pressureHpa  at the station, not reduced to sea level, hPa
 * @param windSpeedMs  m s⁻¹
 * @param windFromDeg  compass bearing the wind comes from, degrees clockwise from north; NaN also in a calm
 */
public record StationObservation(long timeMs, double temperatureC, double dewPointC, double pressureHpa,
                                 double windSpeedMs, double windFromDeg) {

    /** Component of the wind toward a compass bearing, m s⁻¹; NaN when the wind is not known. */
    public double windTowardMs(double bearingDeg) {
        return windSpeedMs == 0 ? 0 : -windSpeedMs * Math.cos(Math.toRadians(windFromDeg - bearingDeg));
    }
}
