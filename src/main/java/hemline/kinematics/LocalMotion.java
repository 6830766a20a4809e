package hemline.kinematics;

import hemline.numerics.NormalEquations;
import hemline.numerics.Robust;
import java.util.Arrays;

/**
 * The normal speed at a vertex from the track's vertices around it in space and time: a robust fit of the offset
 * along its normal, {@code d = a + v t + b s + c s² + e s t}, with {@code s} along the line, km, and {@code t} from
 * the vertex's own ray, 1000 s. The terms in {@code s} let the line be bent and turning; only {@code v}, the normal
 * component, can be told from a line's motion (the aperture problem).
 */
final class LocalMotion {
    private static final int UNKNOWNS = 5;
    private static final double MAX_SPEED_MS = 35;
    /** Cosine of the largest turn between a vertex's normal and those it is compared with. */
    private static final double TURN_COS = Math.cos(Math.toRadians(40));
    /** Cauchy scales of the passes, km. */
    private static final double[] SCALES_KM = {2, 1, 0.6, 0.6};
    /** Position error that neighbours in one sweep share, km. */
    private static final double SHARED_KM = 0.3;
    /** Speed error that no number of sweeps removes: bends, unsteadiness, m s⁻¹. */
    private static final double FLOOR_MS = 0.3;

    private final TrackPoints points;
    private final double halfLengthKm;
    private final double halfSpanS;
    private final NormalEquations equations = new NormalEquations(UNKNOWNS);
    private final double[] solved = new double[UNKNOWNS];
    private final double[][] covariance = new double[UNKNOWNS][UNKNOWNS];
    private double[] s = new double[256];
    private double[] t = new double[256];
    private double[] d = new double[256];
    private double[] w = new double[256];
    private int[] sweepOf = new int[256];
    private int count;

    LocalMotion(TrackPoints points, double halfLengthKm, double halfSpanS) {
        this.points = points;
        this.halfLengthKm = halfLengthKm;
        this.halfSpanS = halfSpanS;
    }

    /**
     * @param offsetKm how far the fitted line lies ahead of the vertex, km
     * @param speedMs  signed along the vertex's normal, m s⁻¹
     * @param sdMs     standard deviation, m s⁻¹
     */
    record Local(double offsetKm, double speedMs, double sdMs) {
    }

    /** The motion at a vertex; null when fewer than two sweeps show the line there. */
    Local at(int i) {
        gather(i);
        if (!spread()) {
            return null;
        }
        Arrays.fill(solved, 0);
        for (int pass = 0; pass < SCALES_KM.length; pass++) {
            equations.clear();
            for (int j = 0; j < count; j++) {
                double r = pass == 0 ? 0 : residual(j);
                equations.add(row(j), d[j], w[j] * Robust.cauchy(r, SCALES_KM[pass]) / (SHARED_KM * SHARED_KM));
            }
            equations.prior(2, 0, 4);
            equations.prior(3, 0, 400);
            equations.prior(4, 0, 4);
            if (!equations.solve(solved, covariance)) {
                return null;
            }
        }
        return new Local(solved[0], solved[1], sd());
    }

    private final double[] row = new double[UNKNOWNS];

    private double[] row(int j) {
        row[0] = 1;
        row[1] = t[j];
        row[2] = s[j];
        row[3] = s[j] * s[j];
        row[4] = s[j] * t[j];
        return row;
    }

    private double residual(int j) {
        row(j);
        double fitted = 0;
        for (int k = 0; k < UNKNOWNS; k++) {
            fitted += row[k] * solved[k];
        }
        return d[j] - fitted;
    }

    private void gather(int i) {
        count = 0;
        double nx = points.normalX[i];
        double ny = points.normalY[i];
        for (int g = 0; g < points.gridCount(); g++) {
            double span = points.gridTimeS(g) - points.timeS[i];
            if (Math.abs(span) > halfSpanS + 60) {
                continue;
            }
            double reach = Math.hypot(halfLengthKm, MAX_SPEED_MS * Math.abs(span) / 1000 + 2);
            points.grid(g).within(points.x[i], points.y[i], reach, j -> {
                double dx = points.x[j] - points.x[i];
                double dy = points.y[j] - points.y[i];
                double along = -dx * ny + dy * nx;
                double turn = nx * points.normalX[j] + ny * points.normalY[j];
                double time = (points.timeS[j] - points.timeS[i]) / 1000;
                if (Math.abs(along) <= halfLengthKm && turn > TURN_COS && Math.abs(time) * 1000 <= halfSpanS) {
                    double off = dx * nx + dy * ny;
                    if (Math.abs(off) <= MAX_SPEED_MS * Math.abs(time) + 2) {
                        add(along, time, off, Math.exp(-Math.abs(along) / halfLengthKm) * (points.seen[j] ? 1 : 0.3),
                                points.sweep[j]);
                    }
                }
            });
        }
    }

    private void add(double along, double time, double off, double weight, int sweep) {
        if (count == s.length) {
            int more = 2 * count;
            s = Arrays.copyOf(s, more);
            t = Arrays.copyOf(t, more);
            d = Arrays.copyOf(d, more);
            w = Arrays.copyOf(w, more);
            sweepOf = Arrays.copyOf(sweepOf, more);
        }
        s[count] = along;
        t[count] = time;
        d[count] = off;
        w[count] = weight;
        sweepOf[count] = sweep;
        count++;
    }

    private boolean spread() {
        for (int j = 1; j < count; j++) {
            if (sweepOf[j] != sweepOf[0]) {
                return true;
            }
        }
        return false;
    }

    /** Each sweep counts as one observation of the line, its error shared by the sweep's vertices. */
    private double sd() {
        double sumW = 0;
        double sumT = 0;
        double sumTT = 0;
        double residuals = 0;
        int sweeps = 0;
        for (int j = 0; j < count; ) {
            int sweep = sweepOf[j];
            double weights = 0;
            double time = 0;
            double off = 0;
            for (; j < count && sweepOf[j] == sweep; j++) {
                double r = residual(j);
                double weight = w[j] * Robust.cauchy(r, 0.6);
                weights += weight;
                time += weight * t[j];
                off += weight * r;
            }
            if (weights > 1e-9) {
                double share = Math.min(1, weights / 3);
                time /= weights;
                off /= weights;
                sumW += share;
                sumT += share * time;
                sumTT += share * time * time;
                residuals += share * off * off;
                sweeps++;
            }
        }
        double spreadT = sumTT - sumT * sumT / sumW;
        double free = Math.max(1, sweeps - 2);
        double variance = (residuals + 3 * SHARED_KM * SHARED_KM) / (free + 3);
        return Math.sqrt(FLOOR_MS * FLOOR_MS + variance / Math.max(1e-6, spreadT));
    }
}
