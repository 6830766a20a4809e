package hemline.kinematics;

import hemline.boundary.ArcHistory;
import hemline.boundary.Speed;
import hemline.geometry.GrowingArc;
import hemline.geometry.GrowingArcFit;
import hemline.geometry.Point;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The growing arc of a track, or why there is none. */
final class Arcs {
    private static final int MOST_POINTS = 600;
    private static final double NOISE_KM = 0.5;
    /** Vertices 1 km apart share their error over some 5 km. */
    private static final double EFFECTIVE_SHARE = 0.2;
    private static final double LEAST_COVERAGE_DEG = 50;
    /** Under this a moving line and a growing arc with a drifting centre look alike (common practice, no source). */
    private static final double COVERAGE_TO_PART_DRIFT_DEG = 150;
    private static final double LARGEST_RMS_SHARE = 0.25;

    private Arcs() {
    }

    /** One of the two is present. */
    record Outcome(Optional<ArcHistory> arc, String refusal) {
        static Outcome refused(String why) {
            return new Outcome(Optional.empty(), why);
        }
    }

    static Outcome of(TrackPoints points, long originMs, double typicalSpeedMs, double maxRelativeSd) {
        if (points.sweepsHeld.length < 3) {
            return Outcome.refused("seen in fewer than 3 sweeps");
        }
        int stride = Math.max(1, points.size / MOST_POINTS);
        int n = (points.size + stride - 1) / stride;
        double middle = 0.5 * (points.timeS[0] + points.timeS[points.size - 1]);
        double[] x = new double[n];
        double[] y = new double[n];
        double[] tau = new double[n];
        double[] nx = new double[n];
        double[] ny = new double[n];
        for (int k = 0; k < n; k++) {
            int i = k * stride;
            x[k] = points.x[i];
            y[k] = points.y[i];
            tau[k] = (points.timeS[i] - middle) / 1000;
            nx[k] = points.normalX[i];
            ny[k] = points.normalY[i];
        }
        double share = Math.min(1, EFFECTIVE_SHARE * stride);
        Optional<GrowingArc> fitted = new GrowingArcFit(x, y, tau, NOISE_KM, share, true).fit(nx, ny, typicalSpeedMs);
        if (fitted.isEmpty()) {
            return Outcome.refused("no arc fits");
        }
        double coverage = coverageDeg(fitted.get(), x, y, tau);
        double driftMs = Math.hypot(fitted.get().parameters()[2], fitted.get().parameters()[3]);
        if (coverage < COVERAGE_TO_PART_DRIFT_DEG && driftMs > 0.6 * Math.abs(typicalSpeedMs)) {
            return Outcome.refused(String.format(java.util.Locale.ROOT,
                    "growth not told apart from drift of the centre: only %.0f degrees seen", coverage));
        }
        return judge(fitted.get(), points, coverage, originMs + Math.round(1000 * middle), maxRelativeSd);
    }

    private static Outcome judge(GrowingArc arc, TrackPoints points, double coverage, long referenceMs,
                                 double maxRelativeSd) {
        double radius = arc.radiusAtKm(0);
        double relative = arc.radiusSdKm(0) / radius;
        if (!(relative <= maxRelativeSd)) {
            return Outcome.refused(String.format(java.util.Locale.ROOT,
                    "too short an arc to tell its radius: standard deviation is %.0f %% of it", 100 * relative));
        }
        if (coverage < LEAST_COVERAGE_DEG) {
            return Outcome.refused(String.format(java.util.Locale.ROOT,
                    "too short an arc to tell its radius: %.0f degrees seen", coverage));
        }
        if (arc.rmsKm() > LARGEST_RMS_SHARE * radius || arc.rmsKm() > 3) {
            return Outcome.refused(String.format(java.util.Locale.ROOT,
                    "no arc: vertices lie %.1f km off the best one", arc.rmsKm()));
        }
        List<ArcHistory.RadiusAt> radii = new ArrayList<>();
        for (int g = 0; g < points.sweepsHeld.length; g++) {
            double at = points.gridTimeS(g) - 0.5 * (points.timeS[0] + points.timeS[points.size - 1]);
            radii.add(new ArcHistory.RadiusAt(points.sweepsHeld[g], referenceMs + Math.round(1000 * at),
                    arc.radiusAtKm(at / 1000), arc.radiusSdKm(at / 1000)));
        }
        double[][] c = arc.covariance();
        Speed expansion = new Speed(arc.growthAtMs(0), Math.hypot(0.15, arc.growthSdMs(0)));
        return new Outcome(Optional.of(new ArcHistory(new Point(arc.parameters()[0], arc.parameters()[1]),
                Math.sqrt(Math.max(c[0][0], c[1][1])), referenceMs, arc.parameters()[2], arc.parameters()[3],
                Math.sqrt(Math.max(c[2][2], c[3][3])), radii, expansion, coverage, arc.rmsKm())), "");
    }

    /** Degrees of bearing about the centre in which a point lies, in steps of 5. */
    private static double coverageDeg(GrowingArc arc, double[] x, double[] y, double[] tau) {
        boolean[] held = new boolean[72];
        for (int i = 0; i < x.length; i++) {
            Point from = new Point(x[i], y[i]).minus(arc.centreAt(tau[i]));
            held[(int) (from.bearingDeg() / 5) % 72] = true;
        }
        int count = 0;
        for (boolean one : held) {
            count += one ? 1 : 0;
        }
        return 5.0 * count;
    }
}
