package hemline.geometry;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.assertj.core.data.Offset;
import org.junit.jupiter.api.Test;

class CircleFitsTest {
    static final List<Point> SIX = List.of(new Point(1, 7), new Point(2, 6), new Point(5, 8), new Point(7, 7),
            new Point(9, 5), new Point(3, 7));

    /** Gander, Golub and Strebel (1994), BIT 34:558, their six points; digits from N. Chernov's test text. */
    @Test
    void geometricFitIsThatOfGanderGolubAndStrebel() {
        Circle circle = CircleFits.geometric(SIX).orElseThrow();
        assertThat(circle.centre().xKm()).isCloseTo(4.739782, Offset.offset(1e-6));
        assertThat(circle.centre().yKm()).isCloseTo(2.983533, Offset.offset(1e-6));
        assertThat(circle.radiusKm()).isCloseTo(4.714226, Offset.offset(1e-6));
        assertThat(circle.rmsKm()).isCloseTo(0.4523271, Offset.offset(1e-6));
    }

    /** The same points, Taubin's fit; digits from N. Chernov's test text. */
    @Test
    void taubinFitIsThatOfChernovsText() {
        Circle circle = CircleFits.taubin(SIX).orElseThrow();
        assertThat(circle.centre().xKm()).isCloseTo(4.613933, Offset.offset(1e-6));
        assertThat(circle.centre().yKm()).isCloseTo(2.795209, Offset.offset(1e-6));
        assertThat(circle.radiusKm()).isCloseTo(4.879213, Offset.offset(1e-6));
        assertThat(circle.rmsKm()).isCloseTo(0.4572958, Offset.offset(1e-6));
    }

    /** Apache Commons Math, circle of its least-squares tests: centre, radius, norm of residuals. */
    @Test
    void geometricFitIsThatOfTheCommonsMathTests() {
        List<Point> points = List.of(new Point(30, 68), new Point(50, -6), new Point(110, -20), new Point(35, 15),
                new Point(45, 97));
        Circle circle = CircleFits.geometric(points).orElseThrow();
        assertThat(circle.centre().xKm()).isCloseTo(96.07590212, Offset.offset(1e-6));
        assertThat(circle.centre().yKm()).isCloseTo(48.13516790, Offset.offset(1e-6));
        assertThat(circle.radiusKm()).isCloseTo(69.96016177, Offset.offset(1e-6));
        assertThat(circle.rmsKm() * Math.sqrt(5)).isCloseTo(1.768262623567, Offset.offset(1e-6));
        // There without the residual variance: covariance 1.839, 0.731 and 0.786 for unit noise.
        double variance = circle.rmsKm() * circle.rmsKm() * 5 / 2;
        assertThat(circle.covariance()[0][0] / variance).isCloseTo(1.839, Offset.offset(1e-3));
        assertThat(circle.covariance()[0][1] / variance).isCloseTo(0.731, Offset.offset(1e-3));
        assertThat(circle.covariance()[1][1] / variance).isCloseTo(0.786, Offset.offset(1e-3));
    }

    /** Calculated from the formula in the Javadoc: 500 m, 60 points, arcs of 60, 90 and 180 degrees. */
    @Test
    void radiusVarianceIsThatOfTheFormula() {
        assertThat(Math.sqrt(Circle.radiusVariance(500, 60, 60))).isCloseTo(1539.5, Offset.offset(0.1));
        assertThat(Math.sqrt(Circle.radiusVariance(500, 60, 90))).isCloseTo(663.7, Offset.offset(0.1));
        assertThat(Math.sqrt(Circle.radiusVariance(500, 60, 180))).isCloseTo(148.3, Offset.offset(0.1));
    }

    @Test
    void shortArcsAreNotShrunkAndScatterAsTheFormulaSays() {
        Random random = new Random(3);
        double[] radii = new double[400];
        for (int trial = 0; trial < radii.length; trial++) {
            List<Point> points = new ArrayList<>();
            for (int i = 0; i < 60; i++) {
                double bearing = -30 + 60.0 * i / 59;
                points.add(Point.towards(bearing).times(30 + 0.5 * random.nextGaussian()));
            }
            radii[trial] = CircleFits.geometric(points).orElseThrow().radiusKm();
        }
        assertThat(hemline.numerics.Robust.median(radii)).isCloseTo(30, Offset.offset(0.3));
        assertThat(hemline.numerics.Robust.spread(radii)).isCloseTo(1.54, Offset.offset(0.25));
    }

    @Test
    void pointsOnALineGiveNoCircle() {
        assertThat(CircleFits.taubin(List.of(new Point(0, 0), new Point(1, 1), new Point(2, 2), new Point(5, 5))))
                .isEmpty();
        assertThat(CircleFits.geometric(List.of(new Point(0, 0), new Point(1, 1)))).isEmpty();
    }

    /** The example of scipy.spatial.distance.directed_hausdorff's documentation. */
    @Test
    void directedHausdorffIsThatOfTheWorkedExample() {
        List<Point> u = List.of(new Point(1, 0), new Point(0, 1), new Point(-1, 0), new Point(0, -1));
        List<Point> v = List.of(new Point(2, 0), new Point(0, 2), new Point(-2, 0), new Point(0, -4));
        assertThat(LineDistances.directedHausdorffKm(u, v)).isCloseTo(2.23606797749979, Offset.offset(1e-12));
        assertThat(LineDistances.directedHausdorffKm(v, u)).isCloseTo(3, Offset.offset(1e-12));
    }

    @Test
    void parallelLinesLieTheirDistanceApart() {
        Polyline a = new Polyline(List.of(new Point(0, 0), new Point(10, 0)));
        Polyline b = new Polyline(List.of(new Point(0, 3), new Point(10, 3)));
        assertThat(LineDistances.meanKm(a, b)).isCloseTo(3, Offset.offset(1e-9));
        assertThat(LineDistances.frechetKm(a, b)).isCloseTo(3, Offset.offset(1e-9));
        assertThat(LineDistances.frechetKm(a, b.reversed())).isGreaterThan(10);
    }
}
