package hemline.geodesy;

import hemline.checks.CheckList;
import hemline.checks.OutsideCheck;
import hemline.checks.OutsideCheck.Basis;
import hemline.geometry.Point;
import java.util.List;

/** Outside checks of beam height, ground range and the local plane. */
public final class GeodesyChecks {
    private static final String DZ = "Doviak and Zrnić (1993), eqs. 2.28b, c";
    private static final String KARNEY = "public tests of GeographicLib (Karney 2013)";

    private GeodesyChecks() {
    }

    public static List<OutsideCheck> list() {
        CheckList list = new CheckList("Beam height and places");
        beam(list);
        places(list);
        return list.checks();
    }

    private static void beam(CheckList list) {
        BeamGeometry two = new BeamGeometry(2, 0, 6_370_040);
        list.from(Basis.READ, DZ + ", public tests of wradlib")
                .check("beam height, m", "10 km, 2°, Re 6370040 m", "354.87448647", 1e-4,
                        () -> two.heightAboveAntennaM(10_000))
                .check("beam height, m", "50 km, 2°, Re 6370040 m", "1891.93744678", 1e-4,
                        () -> two.heightAboveAntennaM(50_000))
                .check("beam height, m", "100 km, 2°, Re 6370040 m", "4077.66415017", 1e-4,
                        () -> two.heightAboveAntennaM(100_000))
                .check("ground range, m", "10 km, 2°, Re 6370040 m", "9993.49302358", 1e-4, () -> two.groundRangeM(10_000))
                .check("ground range, m", "50 km, 2°, Re 6370040 m", "49958.70098959", 1e-4,
                        () -> two.groundRangeM(50_000))
                .check("ground range, m", "100 km, 2°, Re 6370040 m", "99893.4281037", 1e-4,
                        () -> two.groundRangeM(100_000))
                .check("beam height, m", "111 km, 0°, Re of 48° N", "725.71598", 1e-3,
                        () -> at48North(0).heightAboveAntennaM(111_000))
                .check("beam height, m", "111 km, 0.5°, Re of 48° N", "1694.22337", 1e-3,
                        () -> at48North(0.5).heightAboveAntennaM(111_000))
                .check("ground range, m", "111 km, 0°, Re of 48° N", "110993.674", 1e-3,
                        () -> at48North(0).groundRangeM(111_000))
                .check("ground range, m", "111 km, 0.5°, Re of 48° N", "110976.786", 1e-3,
                        () -> at48North(0.5).groundRangeM(111_000));
        BeamGeometry low = new BeamGeometry(0.5, 0, 6_371_000);
        list.from(Basis.CALCULATED, DZ)
                .check("beam height, m", "50 km, 0.5°, Re 6371 km", "583.46", 0.01, () -> low.heightAboveAntennaM(50_000))
                .check("beam height, m", "100 km, 0.5°, Re 6371 km", "1461.13", 0.01,
                        () -> low.heightAboveAntennaM(100_000))
                .check("beam height, m", "150 km, 0.5°, Re 6371 km", "2632.93", 0.01,
                        () -> low.heightAboveAntennaM(150_000))
                .check("beam height, m", "200 km, 0.5°, Re 6371 km", "4098.74", 0.01,
                        () -> low.heightAboveAntennaM(200_000))
                .check("range of 1 km height, km", "0.5°", "75.8", 0.05, () -> rangeOfHeightM(low, 1000) / 1000)
                .check("range of 1.5 km height, km", "0.5°", "101.9", 0.05, () -> rangeOfHeightM(low, 1500) / 1000)
                .check("range of 2 km height, km", "0.5°", "124.6", 0.05, () -> rangeOfHeightM(low, 2000) / 1000);
        list.from(Basis.READ, "worked example in a radar toolbox's public documentation")
                .check("ground range of a target 1 km up, m", "antenna 10 m up, 2°, effective radius 8477.4 km", "27106", 1,
                        () -> {
                            BeamGeometry beam = new BeamGeometry(2, 10, 8.4774e6 * 0.75 - 10);
                            return beam.groundRangeM(rangeOfHeightM(beam, 1000));
                        })
                .check("effective earth radius, km", "gradient of refractivity −39 per km there, 4/3 here", "8477.4", 20,
                        () -> BeamGeometry.EFFECTIVE_RADIUS_FACTOR * BeamGeometry.MEAN_EARTH_RADIUS_M / 1000);
        list.from(Basis.PRACTICE, "a low sweep sees the low free troposphere, about 1 km up, by about 75 km")
                .check("beam height, km", "75 km, 0.5°", "1", 0.05, () -> low.heightAboveAntennaM(75_000) / 1000);
    }

    private static BeamGeometry at48North(double elevationDeg) {
        return new BeamGeometry(elevationDeg, 0, 6_366_371.419);
    }

    private static double rangeOfHeightM(BeamGeometry beam, double heightM) {
        double low = 0;
        double high = 500_000;
        for (int i = 0; i < 60; i++) {
            double middle = (low + high) / 2;
            if (beam.heightAboveSeaM(middle) < heightM) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return low;
    }

    private static void places(CheckList list) {
        list.from(Basis.READ, KARNEY)
                .check("distance, m", "40.6 N 73.8 W to 49.01666667 N 2.55 E", "5853226", 0.5,
                        () -> 1000 * line(40.6, -73.8, 49.01666667, 2.55).lengthKm())
                .check("azimuth, degrees", "40.6 N 73.8 W to 49.01666667 N 2.55 E", "53.47022", 5e-6,
                        () -> line(40.6, -73.8, 49.01666667, 2.55).bearingDeg())
                .check("distance, m", "35.60777 N 139.44815 W to 11.17491 S 69.95921 W", "8935244.5604818305", 1e-8,
                        () -> 1000 * line(35.60777, -139.44815, -11.17491, -69.95921).lengthKm())
                .check("azimuth, degrees", "35.60777 N 139.44815 W to 11.17491 S 69.95921 W", "111.098748429560326", 1e-12,
                        () -> line(35.60777, -139.44815, -11.17491, -69.95921).bearingDeg())
                .check("latitude, degrees", "40.63972222 N 73.77888889 W, 53.5°, 5850 km", "49.01467", 5e-6,
                        () -> end(40.63972222, -73.77888889, 53.5, 5850).latitudeDeg())
                .check("longitude, degrees", "40.63972222 N 73.77888889 W, 53.5°, 5850 km", "2.56106", 5e-6,
                        () -> end(40.63972222, -73.77888889, 53.5, 5850).longitudeDeg())
                .check("distance across the date line, m", "0 N 179 E to 0 N 179 W", "222639", 0.5,
                        () -> 1000 * line(0, 179, 0, -179).lengthKm());
        String guam = "Snyder (1987), USGS Prof. Paper 1395, Guam example (Clarke 1866 there, WGS 84 here)";
        list.from(Basis.READ, guam)
                .check("east on the plane, m", "13.339038461 N 144.635331292 E from 13.472466333 N 144.748750694 E",
                        "-12287.52", 1, () -> 1000 * line(13.472466333, 144.748750694, 13.339038461, 144.635331292).xKm())
                .check("north on the plane, m", "13.339038461 N 144.635331292 E from 13.472466333 N 144.748750694 E",
                        "-14758.00", 1, () -> 1000 * line(13.472466333, 144.748750694, 13.339038461, 144.635331292).yKm());
        String vincenty = "closed by an independent Vincenty (1975) calculation";
        double[][] ends = {{0, 48.89928818, 9}, {45, 48.63193821, 9.95932217}, {90, 47.99218505, 10.33989225},
            {135, 47.36017391, 9.93603077}};
        for (double[] row : ends) {
            String inputs = "48 N 9 E, 100 km toward " + (int) row[0] + "°";
            list.from(Basis.CALCULATED, vincenty)
                    .check("latitude, degrees", inputs, Double.toString(row[1]), 1e-8,
                            () -> end(48, 9, row[0], 100).latitudeDeg())
                    .check("longitude, degrees", inputs, Double.toString(row[2]), 1e-8,
                            () -> end(48, 9, row[0], 100).longitudeDeg());
        }
    }

    private static Point line(double fromLat, double fromLon, double toLat, double toLon) {
        return new LocalPlane(new GeoPoint(fromLat, fromLon)).toPlane(new GeoPoint(toLat, toLon));
    }

    private static GeoPoint end(double lat, double lon, double bearingDeg, double km) {
        return new LocalPlane(new GeoPoint(lat, lon)).toGeo(Point.towards(bearingDeg).times(km));
    }
}
