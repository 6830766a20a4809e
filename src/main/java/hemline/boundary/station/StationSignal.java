package hemline.boundary.station;

import java.util.Optional;

/**
 * The passage as the station's own record shows it.
 *
 * @param timeMs      ms since 1970-01-01T00:00Z
 * @param timeSdS     standard deviation, s
 * @param from        which quantity the time is of: {@code wind}, {@code temperature} or {@code pressure}
 * @param wind        rise of the wind toward the boundary's motion, m s⁻¹
 * @param temperature fall of the temperature, K, as a negative change
 * @param pressure    rise of the pressure, hPa
 */
public record StationSignal(long timeMs, double timeSdS, String from, Optional<Onset> wind, Optional<Onset> temperature,
                            Optional<Onset> pressure) {
}
