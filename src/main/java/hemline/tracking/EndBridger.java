package hemline.tracking;

import hemline.geometry.Point;
import hemline.sweep.SweepFrame;
import java.util.ArrayList;
import java.util.List;

/**
 * Joins strands of one sweep whose ends continue each other, over gaps up to a given length, by a cubic curve that
 * leaves and arrives along both (Hermite). Bridging vertices are marked as not seen.
 */
final class EndBridger {
    private static final double LEAST_COS = Math.cos(Math.toRadians(40));
    private static final double SPACING_KM = 0.9;

    private final List<SweepFrame> frames;
    private final long originMs;
    private final double longestKm;

    EndBridger(List<SweepFrame> frames, long originMs, double longestKm) {
        this.frames = frames;
        this.originMs = originMs;
        this.longestKm = longestKm;
    }

    void bridge(Draft draft) {
        for (int k = 0; k < draft.sweeps(); k++) {
            List<Strand> strands = draft.at(k);
            boolean joined = true;
            while (joined && strands.size() > 1) {
                joined = joinNearest(strands, k);
            }
        }
    }

    private boolean joinNearest(List<Strand> strands, int sweep) {
        double best = longestKm;
        int[] pair = null;
        for (int a = 0; a < strands.size(); a++) {
            for (int b = 0; b < strands.size(); b++) {
                for (int turn = 0; turn < 4 && a != b; turn++) {
                    Strand first = (turn & 1) == 0 ? strands.get(a) : strands.get(a).reversed();
                    Strand second = (turn & 2) == 0 ? strands.get(b) : strands.get(b).reversed();
                    double gap = gap(first, second);
                    if (gap < best) {
                        best = gap;
                        pair = new int[] {a, b, turn};
                    }
                }
            }
        }
        if (pair == null) {
            return false;
        }
        Strand first = (pair[2] & 1) == 0 ? strands.get(pair[0]) : strands.get(pair[0]).reversed();
        Strand second = (pair[2] & 2) == 0 ? strands.get(pair[1]) : strands.get(pair[1]).reversed();
        Strand whole = join(first, second, sweep);
        strands.remove(Math.max(pair[0], pair[1]));
        strands.remove(Math.min(pair[0], pair[1]));
        strands.add(whole);
        return true;
    }

    private static Point heading(Strand strand, boolean end) {
        int n = strand.size();
        int reach = Math.min(4, n - 1);
        int a = end ? n - 1 - reach : 0;
        int b = end ? n - 1 : reach;
        Point step = new Point(strand.x[b] - strand.x[a], strand.y[b] - strand.y[a]);
        double length = step.lengthKm();
        return length < 1e-9 ? new Point(0, 0) : step.times(1 / length);
    }

    /** Length of the gap from the end of one to the start of the other; infinite if they do not continue each other. */
    private static double gap(Strand first, Strand second) {
        int last = first.size() - 1;
        Point step = new Point(second.x[0] - first.x[last], second.y[0] - first.y[last]);
        double length = step.lengthKm();
        Point out = heading(first, true);
        Point in = heading(second, false);
        if (out.dot(in) < LEAST_COS - Math.min(0.3, length / 40)) {
            return Double.POSITIVE_INFINITY;
        }
        if (length > 1.5 && (out.dot(step) < LEAST_COS * length || in.dot(step) < LEAST_COS * length)) {
            return Double.POSITIVE_INFINITY;
        }
        if (length <= 1.5 && out.dot(step) < -0.5) {
            return Double.POSITIVE_INFINITY;
        }
        double sides = first.normalX[last] * second.normalX[0] + first.normalY[last] * second.normalY[0];
        return sides > 0 ? length : Double.POSITIVE_INFINITY;
    }

    private Strand join(Strand first, Strand second, int sweep) {
        int last = first.size() - 1;
        Point from = new Point(first.x[last], first.y[last]);
        Point to = new Point(second.x[0], second.y[0]);
        double length = from.distanceKm(to);
        int steps = (int) Math.ceil(length / SPACING_KM) - 1;
        if (steps < 1) {
            return first.followedBy(second);
        }
        Point out = heading(first, true).times(length);
        Point in = heading(second, false).times(length);
        List<Point> between = new ArrayList<>();
        for (int s = 1; s <= steps; s++) {
            double t = s / (steps + 1.0);
            between.add(from.times(2 * t * t * t - 3 * t * t + 1).plus(out.times(t * t * t - 2 * t * t + t))
                    .plus(to.times(-2 * t * t * t + 3 * t * t)).plus(in.times(t * t * t - t * t)));
        }
        int n = between.size();
        double[][] columns = new double[6][n];
        double[] nx = new double[n];
        double[] ny = new double[n];
        for (int i = 0; i < n; i++) {
            double share = (i + 1.0) / (n + 1);
            columns[0][i] = between.get(i).xKm();
            columns[1][i] = between.get(i).yKm();
            columns[2][i] = (frames.get(sweep).timeAtMs(between.get(i)) - originMs) / 1000.0;
            columns[3][i] = Double.NaN;
            columns[4][i] = (1 - share) * first.speedMs[last] + share * second.speedMs[0];
            columns[5][i] = Math.min(first.evidence[last], second.evidence[0]);
            nx[i] = (1 - share) * first.normalX[last] + share * second.normalX[0];
            ny[i] = (1 - share) * first.normalY[last] + share * second.normalY[0];
        }
        Strand bridge = new Strand(sweep, first.kind, columns, new boolean[n], nx, ny);
        return first.followedBy(bridge, second);
    }
}
