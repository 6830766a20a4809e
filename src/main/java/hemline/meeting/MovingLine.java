package hemline.meeting;

import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.geometry.Point;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * One stretch of a track in flat arrays, its ends carried on smoothly, every vertex with its own time and motion.
 *
 * @param x        km
 * @param y        km
 * @param timeS    s from the loop's start
 * @param velocityX m s⁻¹ along the normal toward the east
 * @param velocityY m s⁻¹ toward the north
 * @param sdMs     standard deviation of the speed, m s⁻¹
 * @param carriedKm distance beyond the seen line, km; 0 on it
 */
record MovingLine(double[] x, double[] y, double[] timeS, double[] velocityX, double[] velocityY, double[] sdMs,
                  double[] carriedKm) {
    /** Length from which an end's bend is taken, km. */
    private static final double BEND_KM = 12;
    /** Largest turn over which an end is carried on, radians. */
    private static final double MAX_TURN = Math.toRadians(40);

    int size() {
        return x.length;
    }

    /** Where a vertex is at a time, s from the loop's start, if it goes on as it does. */
    Point at(int i, double atS) {
        double moved = (atS - timeS[i]) / 1000;
        return new Point(x[i] + velocityX[i] * moved, y[i] + velocityY[i] * moved);
    }

    double speedMs(int i) {
        return Math.hypot(velocityX[i], velocityY[i]);
    }

    /** The runs of at least three vertices that, carried on to the time of other lines, lie apart from them. */
    List<MovingLine> apartFrom(List<MovingLine> others, double withinKm) {
        List<MovingLine> runs = new ArrayList<>();
        int start = 0;
        for (int i = 0; i <= size(); i++) {
            if (i == size() || near(i, others, withinKm)) {
                if (i - start >= 3) {
                    runs.add(part(start, i));
                }
                start = i + 1;
            }
        }
        return runs;
    }

    private boolean near(int i, List<MovingLine> others, double withinKm) {
        for (MovingLine other : others) {
            Point moved = at(i, other.timeS[0]);
            for (int j = 0; j < other.size(); j++) {
                if (Math.hypot(moved.xKm() - other.x[j], moved.yKm() - other.y[j]) < withinKm) {
                    return true;
                }
            }
        }
        return false;
    }

    private MovingLine part(int from, int to) {
        return new MovingLine(Arrays.copyOfRange(x, from, to), Arrays.copyOfRange(y, from, to),
                Arrays.copyOfRange(timeS, from, to), Arrays.copyOfRange(velocityX, from, to),
                Arrays.copyOfRange(velocityY, from, to), Arrays.copyOfRange(sdMs, from, to),
                Arrays.copyOfRange(carriedKm, from, to));
    }

    /**
     * The stretch with both ends carried on by up to {@code extendKm}, along the track's arc where its radius is known
     * (else NaN); unknown speeds are those of the nearest known.
     */
    static MovingLine of(TrackPiece piece, long originMs, double extendKm, double fallbackMs, double radiusKm) {
        List<double[]> rows = new ArrayList<>();
        for (TrackVertex vertex : piece.vertices()) {
            Point toward = Double.isNaN(vertex.normalBearingDeg()) ? new Point(0, 0)
                    : Point.towards(vertex.normalBearingDeg());
            double speed = vertex.speed().speedMs();
            rows.add(new double[] {vertex.position().xKm(), vertex.position().yKm(),
                (vertex.timeMs() - originMs) / 1000.0, toward.xKm(), toward.yKm(), speed, vertex.speed().sdMs(), 0});
        }
        fillSpeeds(rows, fallbackMs);
        List<double[]> before = carryOn(rows, extendKm, true, radiusKm);
        List<double[]> after = carryOn(rows, extendKm, false, radiusKm);
        java.util.Collections.reverse(before);
        List<double[]> all = new ArrayList<>(before);
        all.addAll(rows);
        all.addAll(after);
        int n = all.size();
        MovingLine line = new MovingLine(new double[n], new double[n], new double[n], new double[n], new double[n],
                new double[n], new double[n]);
        for (int i = 0; i < n; i++) {
            double[] row = all.get(i);
            line.x[i] = row[0];
            line.y[i] = row[1];
            line.timeS[i] = row[2];
            line.velocityX[i] = row[3] * row[5];
            line.velocityY[i] = row[4] * row[5];
            line.sdMs[i] = row[6];
            line.carriedKm[i] = row[7];
        }
        return line;
    }

    private static void fillSpeeds(List<double[]> rows, double fallbackMs) {
        for (int i = 0; i < rows.size(); i++) {
            if (!Double.isNaN(rows.get(i)[5])) {
                continue;
            }
            for (int away = 1; away < rows.size() && Double.isNaN(rows.get(i)[5]); away++) {
                for (int j : new int[] {i - away, i + away}) {
                    if (j >= 0 && j < rows.size() && rows.get(j)[7] == 0 && !Double.isNaN(rows.get(j)[5])
                            && Double.isNaN(rows.get(i)[5])) {
                        rows.get(i)[5] = rows.get(j)[5];
                        rows.get(i)[6] = rows.get(j)[6] + 0.05 * away;
                        rows.get(i)[7] = -1;
                    }
                }
            }
            if (Double.isNaN(rows.get(i)[5])) {
                rows.get(i)[5] = fallbackMs;
                rows.get(i)[6] = 3;
            }
        }
        rows.forEach(row -> row[7] = 0);
    }

    /** Steps of 1 km beyond an end along the circle of its last kilometres. */
    private static List<double[]> carryOn(List<double[]> rows, double extendKm, boolean front,
                                          double radiusKm) {
        int n = rows.size();
        int end = front ? 0 : n - 1;
        int inward = front ? 1 : -1;
        int half = end;
        int far = end;
        while (far + inward >= 0 && far + inward < n && distance(rows.get(far), rows.get(end)) < BEND_KM) {
            far += inward;
        }
        half = (end + far) / 2;
        double fx = rows.get(end)[0] - rows.get(half)[0];
        double fy = rows.get(end)[1] - rows.get(half)[1];
        double gx = rows.get(half)[0] - rows.get(far)[0];
        double gy = rows.get(half)[1] - rows.get(far)[1];
        double near = Math.hypot(fx, fy);
        double beyond = Math.hypot(gx, gy);
        List<double[]> steps = new ArrayList<>();
        if (near < 1e-6) {
            return steps;
        }
        double curvature = 0;
        if (beyond > 2 && near > 2) {
            double turn = Math.atan2(gx * fy - gy * fx, gx * fx + gy * fy);
            curvature = turn / (0.5 * (near + beyond));
        }
        if (!Double.isNaN(radiusKm)) {
            // A grown arc bends away from where it moves; its radius is known better than a few kilometres tell.
            double[] row = rows.get(end);
            double side = fx * row[4] - fy * row[3];
            curvature = (side > 0 ? -1 : 1) / radiusKm;
        }
        double heading = Math.atan2(fy, fx) + curvature * near / 2;
        double[] last = rows.get(end).clone();
        double turned = 0;
        for (int step = 1; step <= (int) extendKm && Math.abs(turned) < MAX_TURN; step++) {
            heading += curvature;
            turned += curvature;
            double[] next = last.clone();
            next[0] += Math.cos(heading);
            next[1] += Math.sin(heading);
            double cos = Math.cos(curvature);
            double sin = Math.sin(curvature);
            next[3] = cos * last[3] - sin * last[4];
            next[4] = sin * last[3] + cos * last[4];
            next[6] = last[6] + 0.1;
            next[7] = step;
            steps.add(next);
            last = next;
        }
        return steps;
    }

    private static double distance(double[] a, double[] b) {
        return Math.hypot(a[0] - b[0], a[1] - b[1]);
    }
}
