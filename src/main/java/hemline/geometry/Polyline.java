package hemline.geometry;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * An open line through at least two points of the plane, measured along its length.
 *
 * <p>Successive equal points are dropped; a line whose points are all equal is refused.
 */
public final class Polyline {
    private final List<Point> points;
    private final double[] alongKm;

    public Polyline(List<Point> through) {
        List<Point> kept = new ArrayList<>(through.size());
        for (Point point : through) {
            if (!Double.isFinite(point.xKm()) || !Double.isFinite(point.yKm())) {
                throw new IllegalArgumentException("a line needs finite points, got " + point);
            }
            if (kept.isEmpty() || !kept.get(kept.size() - 1).equals(point)) {
                kept.add(point);
            }
        }
        if (kept.size() < 2) {
            throw new IllegalArgumentException("a line needs two different points, got " + kept.size());
        }
        points = List.copyOf(kept);
        alongKm = new double[points.size()];
        for (int i = 1; i < alongKm.length; i++) {
            alongKm[i] = alongKm[i - 1] + points.get(i).distanceKm(points.get(i - 1));
        }
    }

    public List<Point> points() {
        return points;
    }

    public double lengthKm() {
        return alongKm[alongKm.length - 1];
    }

    /** Distance from the start to vertex {@code index}, km along the line. */
    public double alongKm(int index) {
        return alongKm[index];
    }

    /** The place {@code sKm} along the line; beyond the ends, the end itself. */
    public Point at(double sKm) {
        int i = segmentAt(sKm);
        double span = alongKm[i + 1] - alongKm[i];
        double share = Math.max(0, Math.min(1, (sKm - alongKm[i]) / span));
        return points.get(i).plus(points.get(i + 1).minus(points.get(i)).times(share));
    }

    /** Unit direction of travel of the segment {@code sKm} along the line. */
    public Point tangentAt(double sKm) {
        int i = segmentAt(sKm);
        Point step = points.get(i + 1).minus(points.get(i));
        return step.times(1 / step.lengthKm());
    }

    private int segmentAt(double sKm) {
        int found = Arrays.binarySearch(alongKm, sKm);
        int i = found >= 0 ? found : -found - 2;
        return Math.max(0, Math.min(i, points.size() - 2));
    }

    /** The same line with vertices evenly spaced by at most {@code spacingKm}; both ends are kept. */
    public Polyline resampled(double spacingKm) {
        if (!(spacingKm > 0)) {
            throw new IllegalArgumentException("spacing must be above 0 km, got " + spacingKm);
        }
        int steps = Math.max(1, (int) Math.ceil(lengthKm() / spacingKm - 1e-9));
        List<Point> even = new ArrayList<>(steps + 1);
        for (int i = 0; i <= steps; i++) {
            even.add(at(lengthKm() * i / steps));
        }
        return new Polyline(even);
    }

    /** The place of the line nearest to a point. */
    public Nearest nearest(Point to) {
        Nearest best = null;
        for (int i = 0; i + 1 < points.size(); i++) {
            Point from = points.get(i);
            Point step = points.get(i + 1).minus(from);
            double share = Math.max(0, Math.min(1, to.minus(from).dot(step) / step.dot(step)));
            Point foot = from.plus(step.times(share));
            double distance = foot.distanceKm(to);
            if (best == null || distance < best.distanceKm()) {
                best = new Nearest(foot, distance, alongKm[i] + share * step.lengthKm());
            }
        }
        return best;
    }

    public Polyline reversed() {
        List<Point> back = new ArrayList<>(points);
        java.util.Collections.reverse(back);
        return new Polyline(back);
    }

    /**
     * A nearest place on a line.
     *
     * @param foot       the place
     * @param distanceKm its distance from the point asked about, km
     * @param alongKm    its distance from the start of the line, km along the line
     */
    public record Nearest(Point foot, double distanceKm, double alongKm) {
    }
}
