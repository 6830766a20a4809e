package hemline.tracking;

import hemline.boundary.BoundaryKind;
import java.util.Arrays;

/**
 * A connected stretch of a track in one sweep while the track is being made. Vertices in order along the line; normals
 * point toward motion. Arrays are owned by the strand; {@code x} and {@code y} may be moved by the smoother.
 */
final class Strand {
    private static final int NORMAL_REACH = 3;

    final int sweep;
    final BoundaryKind kind;
    final double[] x;
    final double[] y;
    /** Seconds from the loop's start. */
    final double[] timeS;
    final double[] dbz;
    /** Signed along the normal, m s⁻¹. */
    final double[] speedMs;
    /** Evidence of the vertex, larger is surer. */
    final double[] evidence;
    final boolean[] seen;
    final double[] normalX;
    final double[] normalY;

    /**
     * @param towardX a vector toward motion at each vertex, of any length
     * @param towardY likewise
     */
    Strand(int sweep, BoundaryKind kind, double[][] columns, boolean[] seen, double[] towardX, double[] towardY) {
        this.sweep = sweep;
        this.kind = kind;
        x = columns[0];
        y = columns[1];
        timeS = columns[2];
        dbz = columns[3];
        speedMs = columns[4];
        evidence = columns[5];
        this.seen = seen;
        normalX = new double[x.length];
        normalY = new double[x.length];
        normals(towardX, towardY);
    }

    private void normals(double[] towardX, double[] towardY) {
        for (int i = 0; i < x.length; i++) {
            int a = Math.max(0, i - NORMAL_REACH);
            int b = Math.min(x.length - 1, i + NORMAL_REACH);
            double tx = x[b] - x[a];
            double ty = y[b] - y[a];
            double length = Math.max(1e-9, Math.hypot(tx, ty));
            double sign = -ty * towardX[i] + tx * towardY[i] < 0 ? -1 : 1;
            normalX[i] = -ty / length * sign;
            normalY[i] = tx / length * sign;
        }
    }

    int size() {
        return x.length;
    }

    double lengthKm() {
        double sum = 0;
        for (int i = 1; i < x.length; i++) {
            sum += Math.hypot(x[i] - x[i - 1], y[i] - y[i - 1]);
        }
        return sum;
    }

    /** Vertices {@code from} to {@code to} (excluded) as a strand of their own. */
    Strand part(int from, int to) {
        double[][] columns = {x, y, timeS, dbz, speedMs, evidence};
        double[][] cut = new double[columns.length][];
        Arrays.setAll(cut, c -> Arrays.copyOfRange(columns[c], from, to));
        return new Strand(sweep, kind, cut, Arrays.copyOfRange(seen, from, to),
                Arrays.copyOfRange(normalX, from, to), Arrays.copyOfRange(normalY, from, to));
    }

    Strand reversed() {
        double[][] columns = {x, y, timeS, dbz, speedMs, evidence};
        double[][] back = new double[columns.length][];
        Arrays.setAll(back, c -> turned(columns[c]));
        boolean[] seenBack = new boolean[seen.length];
        for (int i = 0; i < seen.length; i++) {
            seenBack[i] = seen[seen.length - 1 - i];
        }
        return new Strand(sweep, kind, back, seenBack, turned(normalX), turned(normalY));
    }

    private static double[] turned(double[] values) {
        double[] back = new double[values.length];
        Arrays.setAll(back, i -> values[values.length - 1 - i]);
        return back;
    }

    /** This strand followed by others of the same sweep, in the order given. */
    Strand followedBy(Strand... others) {
        Strand[] all = new Strand[others.length + 1];
        all[0] = this;
        System.arraycopy(others, 0, all, 1, others.length);
        int n = Arrays.stream(all).mapToInt(Strand::size).sum();
        double[][] joined = new double[6][n];
        boolean[] joinedSeen = new boolean[n];
        double[] nx = new double[n];
        double[] ny = new double[n];
        int at = 0;
        for (Strand one : all) {
            double[][] columns = {one.x, one.y, one.timeS, one.dbz, one.speedMs, one.evidence};
            for (int c = 0; c < columns.length; c++) {
                System.arraycopy(columns[c], 0, joined[c], at, one.size());
            }
            System.arraycopy(one.seen, 0, joinedSeen, at, one.size());
            System.arraycopy(one.normalX, 0, nx, at, one.size());
            System.arraycopy(one.normalY, 0, ny, at, one.size());
            at += one.size();
        }
        return new Strand(sweep, kind, joined, joinedSeen, nx, ny);
    }
}
