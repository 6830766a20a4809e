package hemline.sweep;

import hemline.geodesy.GeoPoint;
import java.util.Objects;
import java.util.Optional;

/**
 * A radar.
 *
 * @param name      the name in its files; never empty ("unknown" when they have none)
 * @param position  where it stands, empty when its files do not say
 * @param altitudeM antenna height above mean sea level, m; NaN when unknown
 */
public record RadarSite(String name, Optional<GeoPoint> position, double altitudeM) {
    public RadarSite {
        Objects.requireNonNull(position);
        if (name.isBlank()) {
            throw new IllegalArgumentException("a radar needs a name");
        }
    }
}
