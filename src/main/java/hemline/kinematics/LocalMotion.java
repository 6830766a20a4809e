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
    private static final int UNKNOWNS = 7;
    /** A line that has gone farther than this is another line, bent otherwise, km. */
    private static final double LONGEST_PATH_KM = 12;
    private static final double MAX_SPEED_MS = 35;
    /** Cosine of the largest turn between a vertex's normal and those it is compared with. */
    private static final double TURN_COS = Math.cos(Math.toRadians(40));
    /** Cauchy scales of the passes, km. */
    private static final double[] SCALES_KM = {2, 0.8, 0.6};
    /** Position error that neighbours in one sweep share, km. */
    private static final double SHARED_KM = 0.3;
    /** Neighbouring vertices that share one error. */
    private static final double CORRELATED = 5;
    /** Sweeps' worth of trust in the shared error against the residuals. */
    private static final double PRIOR_SWEEPS = 3;
    /** Speed error that no number of sweeps removes: bends, unsteadiness, m s⁻¹. */
    private static final double FLOOR_MS = 0.15;

    /** Slope of waves too short to be resolved, which a shape that slides along itself turns into speed. */
    private static final double WAVINESS = 0.07;

    private final TrackPoints points;
    private final double halfLengthKm;
    private final double halfSpanS;
    private final double leastSpanS;
    private double spanS;
    private double slideMs;
    private final NormalEquations equations = new NormalEquations(UNKNOWNS);
    private final double[] solved = new double[UNKNOWNS];
    private final double[][] covariance = new double[UNKNOWNS][UNKNOWNS];
    private double[] s = new double[256];
    private double[] t = new double[256];
    private double[] d = new double[256];
    private double[] w = new double[256];
    private int[] sweepOf = new int[256];
    private int count;

    /**
     * @param halfLengthKm half length along the line that is taken
     * @param halfSpanS    half span of time that is taken for a line at rest
     * @param leastSpanS   half span below which a fast line's is not cut
     */
    LocalMotion(TrackPoints points, double halfLengthKm, double halfSpanS, double leastSpanS) {
        this.points = points;
        this.halfLengthKm = halfLengthKm;
        this.halfSpanS = Math.max(halfSpanS, leastSpanS);
        this.leastSpanS = leastSpanS;
    }

    /**
     * @param offsetKm how far the fitted line lies ahead of the vertex, km
     * @param speedMs  signed along the vertex's normal, m s⁻¹
     * @param sdMs     standard deviation, m s⁻¹
     */
    record Local(double offsetKm, double speedMs, double sdMs) {
    }

    /**
     * The motion at a vertex; null when fewer than two sweeps show the line there.
     *
     * @param alongMs speed at which the line's shape slides along itself, in the direction of the tangent 90 degrees
     *                to the left of the normal, m s⁻¹: the fit follows it, so that a bend stays where it is
     */
    Local at(int i, double alongMs) {
        slideMs = alongMs;
        spanS = halfSpanS;
        Local wide = fit(i);
        if (wide == null) {
            return null;
        }
        double fitting = Math.max(leastSpanS, Math.min(halfSpanS, 1000 * LONGEST_PATH_KM / Math.abs(wide.speedMs())));
        if (fitting > 0.9 * halfSpanS) {
            return wide;
        }
        spanS = fitting;
        Local narrow = fit(i);
        return narrow == null ? wide : narrow;
    }

    private Local fit(int i) {
        gather(i);
        if (!spread()) {
            return null;
        }
        Arrays.fill(solved, 0);
        for (int pass = 0; pass < SCALES_KM.length; pass++) {
            equations.clear();
            for (int j = 0; j < count; j++) {
                double r = pass == 0 ? 0 : residual(j);
                equations.add(row(j), d[j], w[j] * Robust.cauchy(r, SCALES_KM[pass]) / (CORRELATED * square(SHARED_KM)));
            }
            equations.prior(2, 0, 4);
            equations.prior(3, 0, 400);
            equations.prior(4, 0, 4);
            equations.prior(5, 0, 1 / square(0.02));
            equations.prior(6, 0, 1 / square(0.7));
            if (!equations.solve(solved, pass == SCALES_KM.length - 1 ? covariance : null)) {
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
        row[5] = s[j] * s[j] * t[j];
        row[6] = t[j] * t[j];
        return row;
    }

    private static double square(double value) {
        return value * value;
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
            if (Math.abs(span) > spanS + 60) {
                continue;
            }
            double reach = Math.hypot(halfLengthKm + Math.abs(slideMs * span) / 1000,
                    MAX_SPEED_MS * Math.abs(span) / 1000 + 2);
            points.grid(g).within(points.x[i], points.y[i], reach, j -> {
                double dx = points.x[j] - points.x[i];
                double dy = points.y[j] - points.y[i];
                double turn = nx * points.normalX[j] + ny * points.normalY[j];
                double time = (points.timeS[j] - points.timeS[i]) / 1000;
                double along = -dx * ny + dy * nx - slideMs * time;
                if (Math.abs(along) <= halfLengthKm && turn > TURN_COS && Math.abs(time) * 1000 <= spanS) {
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

    /**
     * From the covariance of the fit, which knows how far the line had to be carried on beyond its ends, scaled by how
     * well the sweeps agree with it.
     */
    private double sd() {
        double residuals = 0;
        double sweeps = 0;
        for (int j = 0; j < count; ) {
            int sweep = sweepOf[j];
            double weights = 0;
            double off = 0;
            for (; j < count && sweepOf[j] == sweep; j++) {
                double r = residual(j);
                double weight = w[j] * Robust.cauchy(r, 0.6);
                weights += weight;
                off += weight * r;
            }
            if (weights > 1e-9) {
                double share = Math.min(1, weights / CORRELATED);
                off /= weights;
                residuals += share * off * off;
                sweeps += share;
            }
        }
        double ratio = (residuals / square(SHARED_KM) + PRIOR_SWEEPS) / (Math.max(0, sweeps - 2) + PRIOR_SWEEPS);
        return Math.sqrt(square(FLOOR_MS) + square(WAVINESS * slideMs) + ratio * covariance[1][1]);
    }
}
