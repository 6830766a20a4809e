package hemline.reader;

import hemline.geodesy.GeoPoint;
import java.util.Optional;

/** Positions as files state them, where "not stated" comes as NaN, as a fill value or as 0, 0. */
final class Positions {
    private static final double LOWEST_M = -500;
    private static final double HIGHEST_M = 10_000;

    private Positions() {
    }

    /** @throws UnreadableFileException if the position is stated but lies nowhere on earth */
    static Optional<GeoPoint> of(InputFile file, String place, double latitudeDeg, double longitudeDeg)
            throws UnreadableFileException {
        boolean missing = Double.isNaN(latitudeDeg) || Double.isNaN(longitudeDeg)
                || latitudeDeg == 0 && longitudeDeg == 0 || latitudeDeg < -900 || longitudeDeg < -900;
        if (missing) {
            return Optional.empty();
        }
        double longitude = longitudeDeg > 180 && longitudeDeg <= 360 ? longitudeDeg - 360 : longitudeDeg;
        if (!(Math.abs(latitudeDeg) <= 90) || !(Math.abs(longitude) <= 180)) {
            throw file.fault(place, "the radar's position is latitude " + latitudeDeg + ", longitude " + longitudeDeg,
                    "correct the file");
        }
        return Optional.of(new GeoPoint(latitudeDeg, longitude));
    }

    /** The altitude, m; NaN where it is not stated or absurd. */
    static double altitude(double altitudeM) {
        return altitudeM >= LOWEST_M && altitudeM <= HIGHEST_M ? altitudeM : Double.NaN;
    }
}
