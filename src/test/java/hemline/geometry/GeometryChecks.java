package hemline.geometry;

import hemline.checks.CheckList;
import hemline.checks.OutsideCheck;
import hemline.checks.OutsideCheck.Basis;
import java.util.List;

/** Outside checks of circle fits and distances between lines. */
public final class GeometryChecks {

    private GeometryChecks() {
    }

    public static List<OutsideCheck> list() {
        CheckList list = new CheckList("Circles and distances");
        Circle geometric = CircleFits.geometric(CircleFitsTest.SIX).orElseThrow();
        Circle taubin = CircleFits.taubin(CircleFitsTest.SIX).orElseThrow();
        list.from(Basis.READ, "Gander, Golub and Strebel (1994), digits from Chernov's test text")
                .check("centre x", "geometric fit of the six points", "4.739782", 1e-6, () -> geometric.centre().xKm())
                .check("centre y", "geometric fit of the six points", "2.983533", 1e-6, () -> geometric.centre().yKm())
                .check("radius", "geometric fit of the six points", "4.714226", 1e-6, geometric::radiusKm)
                .check("rms distance", "geometric fit of the six points", "0.4523271", 1e-6, geometric::rmsKm);
        list.from(Basis.READ, "Chernov's test text")
                .check("centre x", "Taubin's fit of the six points", "4.613933", 1e-6, () -> taubin.centre().xKm())
                .check("centre y", "Taubin's fit of the six points", "2.795209", 1e-6, () -> taubin.centre().yKm())
                .check("radius", "Taubin's fit of the six points", "4.879213", 1e-6, taubin::radiusKm)
                .check("rms distance", "Taubin's fit of the six points", "0.4572958", 1e-6, taubin::rmsKm);
        Circle commons = CircleFits.geometric(List.of(new Point(30, 68), new Point(50, -6), new Point(110, -20),
                new Point(35, 15), new Point(45, 97))).orElseThrow();
        list.from(Basis.READ, "public tests of Apache Commons Math")
                .check("centre x", "its five points", "96.07590212", 1e-6, () -> commons.centre().xKm())
                .check("centre y", "its five points", "48.13516790", 1e-6, () -> commons.centre().yKm())
                .check("radius", "its five points", "69.96016177", 1e-6, commons::radiusKm)
                .check("norm of residuals", "its five points", "1.768262623567", 1e-6,
                        () -> commons.rmsKm() * Math.sqrt(5));
        String[][] spread = {{"60", "1539.5"}, {"90", "663.7"}, {"180", "148.3"}};
        for (String[] row : spread) {
            list.from(Basis.CALCULATED, "variance of the least-squares radius of evenly spread points")
                    .check("standard deviation of the radius, m", "500 m, 60 points, arc " + row[0] + "°", row[1], 0.1,
                            () -> Math.sqrt(Circle.radiusVariance(500, 60, Double.parseDouble(row[0]))));
        }
        List<Point> u = List.of(new Point(1, 0), new Point(0, 1), new Point(-1, 0), new Point(0, -1));
        List<Point> v = List.of(new Point(2, 0), new Point(0, 2), new Point(-2, 0), new Point(0, -4));
        list.from(Basis.FROM_MEMORY, "documentation of scipy.spatial.distance.directed_hausdorff, recalculated")
                .check("directed Hausdorff distance", "its four points and four", "2.23606797749979", 1e-12,
                        () -> LineDistances.directedHausdorffKm(u, v))
                .check("the other way", "its four points and four", "3", 1e-12,
                        () -> LineDistances.directedHausdorffKm(v, u));
        return list.checks();
    }
}
