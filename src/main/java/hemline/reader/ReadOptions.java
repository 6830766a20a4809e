package hemline.reader;

import hemline.geodesy.GeoPoint;
import java.util.Objects;
import java.util.Optional;

/**
 * What to take from the files.
 *
 * @param minElevationDeg lowest elevation taken, degrees; 0 stands for "down to wherever the radar looks": antennas on
 *                        mountains scan below the horizon, so that a sweep down to −{@value #DOWN_TILT_DEG}° is taken
 *                        too; any other bound is held to within {@value #TOLERANCE_DEG}°
 * @param maxElevationDeg highest elevation taken, degrees, held to within {@value #TOLERANCE_DEG}°
 * @param field           reflectivity field to take; empty to choose
 * @param site            radar to take where files of several are given; empty for the one with most files
 * @param position        position of a radar whose files do not state one
 */
public record ReadOptions(double minElevationDeg, double maxElevationDeg, Optional<String> field,
                          Optional<String> site, Optional<Position> position) {
    /** How far below the horizon a sweep may look when the lower bound is 0, degrees. */
    public static final double DOWN_TILT_DEG = 1.0;
    /** Antennas miss their nominal elevation by up to this, degrees. */
    public static final double TOLERANCE_DEG = 0.1;

    /**
     * Where a radar stands.
     *
     * @param altitudeM antenna height above mean sea level, m
     */
    public record Position(GeoPoint place, double altitudeM) {
        public Position {
            Objects.requireNonNull(place);
            if (!(altitudeM >= -500 && altitudeM <= 10_000)) {
                throw new IllegalArgumentException("altitude must lie within -500..10000 m, got " + altitudeM);
            }
        }
    }

    public ReadOptions {
        Objects.requireNonNull(field);
        Objects.requireNonNull(site);
        Objects.requireNonNull(position);
        if (!(minElevationDeg >= -10 && maxElevationDeg <= 90 && minElevationDeg <= maxElevationDeg)) {
            throw new IllegalArgumentException("elevations must rise within -10..90 degrees, got " + minElevationDeg
                    + ".." + maxElevationDeg);
        }
    }

    /** Elevations 0 to 1.5°, everything else chosen from the files. */
    public static ReadOptions defaults() {
        return new ReadOptions(0, 1.5, Optional.empty(), Optional.empty(), Optional.empty());
    }

    public ReadOptions withElevation(double minDeg, double maxDeg) {
        return new ReadOptions(minDeg, maxDeg, field, site, position);
    }

    public ReadOptions withField(String name) {
        return new ReadOptions(minElevationDeg, maxElevationDeg, Optional.of(name), site, position);
    }

    public ReadOptions withSite(String name) {
        return new ReadOptions(minElevationDeg, maxElevationDeg, field, Optional.of(name), position);
    }

    public ReadOptions withPosition(GeoPoint place, double altitudeM) {
        return new ReadOptions(minElevationDeg, maxElevationDeg, field, site,
                Optional.of(new Position(place, altitudeM)));
    }

    /** True if a sweep at this elevation lies in the window. */
    public boolean takes(double elevationDeg) {
        double slack = minElevationDeg == 0 ? DOWN_TILT_DEG : TOLERANCE_DEG;
        return elevationDeg >= minElevationDeg - slack && elevationDeg <= maxElevationDeg + TOLERANCE_DEG;
    }

    FieldChoice fieldChoice() {
        return new FieldChoice(field, true);
    }
}
