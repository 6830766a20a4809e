package hemline.geometry;

import hemline.numerics.NonlinearFit;
import java.util.List;
import java.util.Optional;

/**
 * Circles through points: Taubin's algebraic fit to start, the geometric fit to finish.
 *
 * <p>Taubin (1991), IEEE Trans. Pattern Anal. Mach. Intell. 13:1115–1138, solved by Newton's method on the
 * characteristic polynomial; Gander, Golub and Strebel (1994), BIT 34:558–578, for the geometric fit. Neither shrinks
 * short arcs as the plain algebraic fit of Kåsa (1976) does.
 */
public final class CircleFits {
    private CircleFits() {
    }

    /** Taubin's fit; empty for fewer than three different points or points on a line. No covariance. */
    public static Optional<Circle> taubin(List<Point> points) {
        int n = points.size();
        if (n < 3) {
            return Optional.empty();
        }
        Point mean = mean(points);
        double xx = 0;
        double yy = 0;
        double xy = 0;
        double xz = 0;
        double yz = 0;
        double zz = 0;
        for (Point point : points) {
            Point d = point.minus(mean);
            double z = d.dot(d);
            xx += d.xKm() * d.xKm() / n;
            yy += d.yKm() * d.yKm() / n;
            xy += d.xKm() * d.yKm() / n;
            xz += d.xKm() * z / n;
            yz += d.yKm() * z / n;
            zz += z * z / n;
        }
        double trace = xx + yy;
        double determinant = xx * yy - xy * xy;
        if (!(determinant > 1e-14 * trace * trace)) {
            return Optional.empty();
        }
        double varZ = zz - trace * trace;
        double a3 = 4 * trace;
        double a2 = -3 * trace * trace - zz;
        double a1 = varZ * trace + 4 * determinant * trace - xz * xz - yz * yz;
        double a0 = xz * (xz * yy - yz * xy) + yz * (yz * xx - xz * xy) - varZ * determinant;
        double root = 0;
        double value = a0;
        for (int step = 0; step < 99; step++) {
            double slope = a1 + root * (2 * a2 + 3 * a3 * root);
            double next = root - value / slope;
            if (!Double.isFinite(next) || next == root) {
                break;
            }
            double nextValue = a0 + next * (a1 + next * (a2 + next * a3));
            if (Math.abs(nextValue) >= Math.abs(value)) {
                break;
            }
            root = next;
            value = nextValue;
        }
        double det = root * root - root * trace + determinant;
        double cx = (xz * (yy - root) - yz * xy) / det / 2;
        double cy = (yz * (xx - root) - xz * xy) / det / 2;
        double radius = Math.sqrt(cx * cx + cy * cy + trace);
        if (!Double.isFinite(radius)) {
            return Optional.empty();
        }
        Point centre = mean.plus(new Point(cx, cy));
        return Optional.of(new Circle(centre, radius, rms(points, centre, radius), new double[0][]));
    }

    /**
     * The circle of least squared distance, with the covariance of its three parameters from the residuals.
     * Empty when Taubin's fit is, or the minimum is not found (points nearly on a line).
     */
    public static Optional<Circle> geometric(List<Point> points) {
        return taubin(points).flatMap(start -> NonlinearFit.of(
                new double[] {start.centre().xKm(), start.centre().yKm(), start.radiusKm()}, points.size(),
                (at, residual, jacobian) -> {
                    for (int i = 0; i < points.size(); i++) {
                        double dx = points.get(i).xKm() - at[0];
                        double dy = points.get(i).yKm() - at[1];
                        double r = Math.max(1e-12, Math.hypot(dx, dy));
                        residual[i] = r - at[2];
                        jacobian[i][0] = -dx / r;
                        jacobian[i][1] = -dy / r;
                        jacobian[i][2] = -1;
                    }
                }).map(fit -> new Circle(new Point(fit.parameters()[0], fit.parameters()[1]),
                        Math.abs(fit.parameters()[2]), Math.sqrt(fit.sumOfSquares() / points.size()),
                        fit.covariance())));
    }

    private static Point mean(List<Point> points) {
        Point sum = new Point(0, 0);
        for (Point point : points) {
            sum = sum.plus(point);
        }
        return sum.times(1.0 / points.size());
    }

    private static double rms(List<Point> points, Point centre, double radius) {
        double sum = 0;
        for (Point point : points) {
            double off = point.distanceKm(centre) - radius;
            sum += off * off;
        }
        return Math.sqrt(sum / points.size());
    }
}
