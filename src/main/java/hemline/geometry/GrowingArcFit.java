package hemline.geometry;

import hemline.numerics.NormalEquations;
import hemline.numerics.Robust;
import java.util.Arrays;
import java.util.Optional;

/**
 * Fits a {@link GrowingArc} to points of all times at once, robustly: one short arc cannot tell its own radius, its
 * growth through a loop can. Damped Gauss–Newton with Cauchy weights and weak priors on what points may not tell:
 * drift, change of growth and shape.
 *
 * <p>Points need not be evenly spread. Neighbours share their errors, so {@code effectiveShare} of the points count
 * as independent in the covariance.
 */
public final class GrowingArcFit {
    /** Prior standard deviations: drift, m s⁻¹; change of growth, m s⁻¹ per 1000 s; shape for m = 2, 3, 4. */
    private static final double DRIFT_MS = 3;
    private static final double GROWTH_CHANGE = 1.5;
    private static final double[] SHAPE = {0.07, 0.05, 0.03};
    private static final int ROUNDS = 40;

    private final double[] x;
    private final double[] y;
    private final double[] tau;
    private final double[] weight;
    private final double noiseKm;
    private final double effectiveShare;
    private final boolean lobes;

    /**
     * @param x              km
     * @param y              km
     * @param tau            time, 1000 s, best centred on the record
     * @param noiseKm        standard deviation of a point across the arc, km
     * @param effectiveShare share of the points that count as independent, in (0, 1]
     * @param lobes          whether the shape may depart from a circle
     */
    public GrowingArcFit(double[] x, double[] y, double[] tau, double noiseKm, double effectiveShare, boolean lobes) {
        if (y.length != x.length || tau.length != x.length) {
            throw new IllegalArgumentException("coordinates and times must be as many: " + x.length + ", " + y.length
                    + ", " + tau.length);
        }
        if (!(noiseKm > 0) || !(effectiveShare > 0 && effectiveShare <= 1)) {
            throw new IllegalArgumentException("noise must be above 0 and the share within 0..1, got " + noiseKm
                    + " and " + effectiveShare);
        }
        this.x = x;
        this.y = y;
        this.tau = tau;
        this.noiseKm = noiseKm;
        this.effectiveShare = effectiveShare;
        this.lobes = lobes;
        weight = new double[x.length];
        Arrays.fill(weight, 1);
    }

    /**
     * The best arc from several starts on the side the line comes from.
     *
     * @param normalX unit normals toward which each point moves
     * @param normalY likewise
     * @param speedMs a first guess of the growth, m s⁻¹
     * @return empty with fewer than 8 points or when no start converges
     */
    public Optional<GrowingArc> fit(double[] normalX, double[] normalY, double speedMs) {
        if (x.length < 8) {
            return Optional.empty();
        }
        GrowingArc best = null;
        double[] crossing = crossing(normalX, normalY);
        for (double stretch : new double[] {1, 2.5, 8}) {
            double[] start = start(crossing, normalX, normalY, stretch, speedMs);
            GrowingArc found = descend(start);
            if (found != null && (best == null || found.cost() < best.cost() - 1e-9)) {
                best = found;
            }
        }
        return Optional.ofNullable(best);
    }

    /** Mean place, mean normal and distance back along it at which the normals cross best. */
    private double[] crossing(double[] nx, double[] ny) {
        int n = x.length;
        double mx = 0;
        double my = 0;
        double ux = 0;
        double uy = 0;
        for (int i = 0; i < n; i++) {
            mx += x[i] / n;
            my += y[i] / n;
            ux += nx[i] / n;
            uy += ny[i] / n;
        }
        NormalEquations equations = new NormalEquations(2);
        for (int i = 0; i < n; i++) {
            double[] row = {-ny[i], nx[i]};
            equations.add(row, -ny[i] * (x[i] - mx) + nx[i] * (y[i] - my), 1);
        }
        double ridge = 1e-4 * n;
        equations.prior(0, 0, ridge);
        equations.prior(1, 0, ridge);
        double[] c = new double[2];
        equations.solve(c, null);
        return new double[] {mx, my, ux, uy, c[0], c[1]};
    }

    private double[] start(double[] crossing, double[] nx, double[] ny, double stretch, double speedMs) {
        double[] p = new double[GrowingArc.UNKNOWNS];
        double away = Math.hypot(crossing[4], crossing[5]);
        double mean = Math.hypot(crossing[2], crossing[3]);
        double backX = crossing[4];
        double backY = crossing[5];
        // A ring's mean normal says nothing; an arc's centre must lie behind it.
        if (mean > 0.5 && (away < 3 || backX * crossing[2] + backY * crossing[3] > 0)) {
            away = Math.max(away, 30);
            backX = -crossing[2] / mean * away;
            backY = -crossing[3] / mean * away;
        }
        double factor = mean > 0.5 ? stretch : 1;
        p[0] = crossing[0] + backX * factor;
        p[1] = crossing[1] + backY * factor;
        double radius = 0;
        for (int i = 0; i < x.length; i++) {
            radius += Math.hypot(x[i] - p[0], y[i] - p[1]) / x.length;
        }
        p[4] = radius;
        p[5] = speedMs;
        return p;
    }

    private GrowingArc descend(double[] start) {
        double[] p = start.clone();
        NormalEquations equations = new NormalEquations(GrowingArc.UNKNOWNS);
        double[] step = new double[GrowingArc.UNKNOWNS];
        double[] trial = new double[GrowingArc.UNKNOWNS];
        double damping = 1e-3;
        double cost = cost(p);
        for (int round = 0; round < ROUNDS; round++) {
            boolean better = false;
            for (int attempt = 0; attempt < 8 && !better; attempt++) {
                assemble(p, equations, damping);
                if (!equations.solve(step, null)) {
                    return null;
                }
                for (int j = 0; j < p.length; j++) {
                    trial[j] = p[j] + step[j];
                }
                double trialCost = trial[4] > 0 ? cost(trial) : Double.POSITIVE_INFINITY;
                if (trialCost < cost) {
                    better = true;
                    double gain = cost - trialCost;
                    System.arraycopy(trial, 0, p, 0, p.length);
                    cost = trialCost;
                    damping = Math.max(1e-9, damping * 0.2);
                    if (gain < 1e-6 * cost + 1e-9) {
                        round = ROUNDS;
                    }
                } else {
                    damping = Math.max(1e-9, damping * 6);
                }
            }
            if (!better) {
                break;
            }
        }
        assemble(p, equations, 0);
        double[][] covariance = new double[p.length][p.length];
        if (!equations.solve(step, covariance)) {
            return null;
        }
        return new GrowingArc(p, covariance, rms(p), cost);
    }

    private double scale() {
        return 2 * noiseKm;
    }

    private double cost(double[] p) {
        double c2 = scale() * scale() / (noiseKm * noiseKm);
        double sum = 0;
        for (int i = 0; i < x.length; i++) {
            double r = residual(p, i);
            // Cauchy's loss, whose weight is 1 / (1 + (r/c)²).
            sum += weight[i] * c2 * Math.log1p(r * r / (scale() * scale()));
        }
        sum *= effectiveShare;
        sum += square(p[2] / DRIFT_MS) + square(p[3] / DRIFT_MS) + square(p[6] / GROWTH_CHANGE);
        for (int m = 0; m < GrowingArc.HARMONICS; m++) {
            sum += square(p[7 + 2 * m] / shapeSd(m)) + square(p[8 + 2 * m] / shapeSd(m));
        }
        return sum;
    }

    private double shapeSd(int m) {
        return lobes ? SHAPE[m] : 1e-6;
    }

    private static double square(double value) {
        return value * value;
    }

    private double residual(double[] p, int i) {
        double dx = x[i] - p[0] - p[2] * tau[i];
        double dy = y[i] - p[1] - p[3] * tau[i];
        double radius = p[4] + p[5] * tau[i] + 0.5 * p[6] * tau[i] * tau[i];
        return Math.hypot(dx, dy) - radius * GrowingArc.shape(p, Math.atan2(dy, dx));
    }

    private void assemble(double[] p, NormalEquations equations, double damping) {
        equations.clear();
        double[] row = new double[GrowingArc.UNKNOWNS];
        double[] diagonal = new double[GrowingArc.UNKNOWNS];
        double unit = effectiveShare / (noiseKm * noiseKm);
        for (int i = 0; i < x.length; i++) {
            double r = gradient(p, i, row);
            double w = weight[i] * unit * Robust.cauchy(r, scale());
            equations.add(row, -r, w);
            for (int j = 0; j < row.length; j++) {
                diagonal[j] += w * row[j] * row[j];
            }
        }
        prior(equations, p, 2, DRIFT_MS);
        prior(equations, p, 3, DRIFT_MS);
        prior(equations, p, 6, GROWTH_CHANGE);
        for (int m = 0; m < GrowingArc.HARMONICS; m++) {
            prior(equations, p, 7 + 2 * m, shapeSd(m));
            prior(equations, p, 8 + 2 * m, shapeSd(m));
        }
        for (int j = 0; j < diagonal.length; j++) {
            equations.prior(j, 0, damping * diagonal[j] + 1e-12);
        }
    }

    private static void prior(NormalEquations equations, double[] p, int index, double sd) {
        equations.prior(index, -p[index], 1 / (sd * sd));
    }

    /** Fills the derivatives of a residual and gives the residual, km. */
    private double gradient(double[] p, int i, double[] row) {
        double t = tau[i];
        double dx = x[i] - p[0] - p[2] * t;
        double dy = y[i] - p[1] - p[3] * t;
        double r = Math.max(1e-6, Math.hypot(dx, dy));
        double radius = p[4] + p[5] * t + 0.5 * p[6] * t * t;
        double angle = Math.atan2(dy, dx);
        double s = 1;
        double turn = 0;
        for (int m = 0; m < GrowingArc.HARMONICS; m++) {
            double cos = Math.cos((m + 2) * angle);
            double sin = Math.sin((m + 2) * angle);
            s += p[7 + 2 * m] * cos + p[8 + 2 * m] * sin;
            turn += (m + 2) * (p[8 + 2 * m] * cos - p[7 + 2 * m] * sin);
            row[7 + 2 * m] = -radius * cos;
            row[8 + 2 * m] = -radius * sin;
        }
        // dφ/dx₀ = dy/r², dφ/dy₀ = −dx/r²
        row[0] = -dx / r - radius * turn * dy / (r * r);
        row[1] = -dy / r + radius * turn * dx / (r * r);
        row[2] = t * row[0];
        row[3] = t * row[1];
        row[4] = -s;
        row[5] = -s * t;
        row[6] = -s * 0.5 * t * t;
        return r - radius * s;
    }

    private double rms(double[] p) {
        double sum = 0;
        double weights = 0;
        for (int i = 0; i < x.length; i++) {
            double r = residual(p, i);
            double w = weight[i] * Robust.cauchy(r, scale());
            sum += w * r * r;
            weights += w;
        }
        return Math.sqrt(sum / weights);
    }
}
