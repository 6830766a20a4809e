package hemline.tracking;

import hemline.boundary.ObservedBoundary;
import hemline.boundary.ObservedVertex;
import hemline.geometry.Point;
import hemline.geometry.Polyline;
import hemline.sweep.SweepFrame;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * Every vertex of every found boundary in flat arrays, curve by curve and the curves by rising sweep.
 * Times are seconds from the loop's first sweep. Normals are those of the curve, not of the single vertex.
 */
final class VertexCloud {
    /** Half length over which a curve's own direction is taken, vertices. */
    private static final int NORMAL_REACH = 3;

    final int size;
    final int sweeps;
    final long originMs;
    final double[] x;
    final double[] y;
    final double[] timeS;
    final double[] normalX;
    final double[] normalY;
    /** Signed along the normal, m s⁻¹; NaN where nothing is suggested. */
    final double[] hintMs;
    final double[] strength;
    final int[] sweep;
    final int[] curve;
    /** First vertex of each curve; one more entry closes the last. */
    final int[] curveStart;
    /** First vertex of each sweep; one more entry closes the last. */
    final int[] sweepStart;
    final List<ObservedBoundary> boundaries;
    final List<ObservedVertex> vertices;

    VertexCloud(List<ObservedBoundary> found, List<SweepFrame> frames) {
        boundaries = new ArrayList<>(found);
        boundaries.sort(java.util.Comparator.comparingInt(ObservedBoundary::sweep));
        sweeps = frames.size();
        size = boundaries.stream().mapToInt(b -> b.vertices().size()).sum();
        originMs = frames.isEmpty() ? 0 : frames.get(0).meanTimeMs();
        x = new double[size];
        y = new double[size];
        timeS = new double[size];
        normalX = new double[size];
        normalY = new double[size];
        hintMs = new double[size];
        strength = new double[size];
        sweep = new int[size];
        curve = new int[size];
        curveStart = new int[boundaries.size() + 1];
        sweepStart = new int[sweeps + 1];
        vertices = new ArrayList<>(size);
        fill();
    }

    private void fill() {
        int at = 0;
        int openSweep = 0;
        for (int c = 0; c < boundaries.size(); c++) {
            ObservedBoundary boundary = boundaries.get(c);
            if (boundary.sweep() < 0 || boundary.sweep() >= sweeps) {
                throw new IllegalArgumentException("a boundary of sweep " + boundary.sweep() + " in a loop of " + sweeps);
            }
            while (openSweep < boundary.sweep()) {
                sweepStart[++openSweep] = at;
            }
            curveStart[c] = at;
            for (ObservedVertex vertex : boundary.vertices()) {
                x[at] = vertex.position().xKm();
                y[at] = vertex.position().yKm();
                timeS[at] = (vertex.timeMs() - originMs) / 1000.0;
                hintMs[at] = vertex.motionMs();
                strength[at] = vertex.evidence();
                sweep[at] = boundary.sweep();
                curve[at] = c;
                vertices.add(vertex);
                at++;
            }
            normals(curveStart[c], at, boundary);
        }
        curveStart[boundaries.size()] = at;
        while (openSweep < sweeps) {
            sweepStart[++openSweep] = at;
        }
    }

    private void normals(int from, int to, ObservedBoundary boundary) {
        for (int i = from; i < to; i++) {
            int a = Math.max(from, i - NORMAL_REACH);
            int b = Math.min(to - 1, i + NORMAL_REACH);
            double tx = x[b] - x[a];
            double ty = y[b] - y[a];
            double length = Math.hypot(tx, ty);
            Point told = boundary.vertices().get(i - from).normal();
            if (length < 1e-9) {
                normalX[i] = told.xKm();
                normalY[i] = told.yKm();
                continue;
            }
            double sign = Math.signum(-ty * told.xKm() + tx * told.yKm());
            sign = sign == 0 ? 1 : sign;
            normalX[i] = -ty / length * sign;
            normalY[i] = tx / length * sign;
        }
    }

    int curveCount() {
        return boundaries.size();
    }

    /** Points {@code from} to {@code to} (excluded) as a line. */
    Polyline line(int from, int to) {
        List<Point> points = new ArrayList<>(to - from);
        for (int i = from; i < to; i++) {
            points.add(new Point(x[i], y[i]));
        }
        return new Polyline(points);
    }

    /** Turns the normals of all vertices in a range about. */
    void flip(int i) {
        normalX[i] = -normalX[i];
        normalY[i] = -normalY[i];
        hintMs[i] = -hintMs[i];
    }

    /** Mean time of each sweep's rays, s from the loop's start. */
    static double[] sweepTimesS(List<SweepFrame> frames) {
        double[] times = new double[frames.size()];
        long origin = frames.isEmpty() ? 0 : frames.get(0).meanTimeMs();
        Arrays.setAll(times, k -> (frames.get(k).meanTimeMs() - origin) / 1000.0);
        return times;
    }
}
