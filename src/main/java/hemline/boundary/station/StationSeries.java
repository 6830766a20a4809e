package hemline.boundary.station;

import hemline.geodesy.GeoPoint;
import java.util.List;
import java.util.Objects;

/**
 * A station and all it observed.
 *
 * @param name         never empty
 * @param place        where it stands
 * @param altitudeM    of its barometer above mean sea level, m; NaN when unknown
 * @param observations by rising time, no two at the same
 */
public record StationSeries(String name, GeoPoint place, double altitudeM, List<StationObservation> observations) {
    public StationSeries {
        Objects.requireNonNull(place);
        observations = List.copyOf(observations);
        if (name.isBlank()) {
            throw new IllegalArgumentException("a station needs a name");
        }
        for (int i = 1; i < observations.size(); i++) {
            if (observations.get(i).timeMs() <= observations.get(i - 1).timeMs()) {
                throw new IllegalArgumentException("observations of station " + name + " must rise in time, number " + i
                        + " does not");
            }
        }
    }
}
