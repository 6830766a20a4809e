package hemline.workflow;

import hemline.geodesy.GeoPoint;
import java.util.Objects;
import java.util.Optional;

/**
 * What a user chose about reading.
 *
 * @param minElevationDeg lowest elevation taken, degrees
 * @param maxElevationDeg highest elevation taken, degrees
 * @param field           name of the reflectivity field; empty for the usual choice
 * @param site            name of the radar, where files of several are given; empty for the only one
 * @param position        where the radar stands, for files that do not say; empty for what they say
 */
public record ReadChoices(double minElevationDeg, double maxElevationDeg, Optional<String> field,
                          Optional<String> site, Optional<Position> position) {
    public static final double DEFAULT_MIN_ELEVATION_DEG = 0;
    public static final double DEFAULT_MAX_ELEVATION_DEG = 1.5;

    public ReadChoices {
        Objects.requireNonNull(field);
        Objects.requireNonNull(site);
        Objects.requireNonNull(position);
        if (!(minElevationDeg >= -90 && minElevationDeg <= maxElevationDeg && maxElevationDeg <= 90)) {
            throw new IllegalArgumentException("elevations must rise within -90..90 degrees, got " + minElevationDeg
                    + ".." + maxElevationDeg);
        }
    }

    public static ReadChoices defaults() {
        return new ReadChoices(DEFAULT_MIN_ELEVATION_DEG, DEFAULT_MAX_ELEVATION_DEG, Optional.empty(),
                Optional.empty(), Optional.empty());
    }

    /**
     * Where a radar stands.
     *
     * @param place     latitude and longitude
     * @param altitudeM of the antenna above mean sea level, m
     */
    public record Position(GeoPoint place, double altitudeM) {
    }
}
