package hemline.kinematics;

import hemline.numerics.NormalEquations;

/**
 * How fast the shape of a line slides along itself: a bow carried by a wind does, a ring that grows does not. Around
 * each vertex the one velocity {@code u} is sought whose normal components are the speeds found, {@code v = u · n};
 * where the line is bent, that tells the component along the line too.
 */
final class Sliding {
    private static final double WITHIN_KM = 25;
    /** Expected before anything is seen, m s⁻¹. */
    private static final double PRIOR_MS = 12;
    private static final double NOISE_MS = 1;
    /** Neighbouring vertices that share one error. */
    private static final double CORRELATED = 8;

    private final TrackPoints points;
    private final LocalMotion.Local[] found;

    Sliding(TrackPoints points, LocalMotion.Local[] found) {
        this.points = points;
        this.found = found;
    }

    /** Along the tangent 90 degrees to the left of each vertex's normal, m s⁻¹; 0 where nothing tells. */
    double[] alongMs() {
        double[] along = new double[points.size];
        NormalEquations equations = new NormalEquations(2);
        double[] solved = new double[2];
        double[] row = new double[2];
        for (int g = 0; g < points.gridCount(); g++) {
            for (int i = points.gridStart(g); i < points.gridStart(g + 1); i++) {
                equations.clear();
                double nx = points.normalX[i];
                double ny = points.normalY[i];
                for (int near = Math.max(0, g - 1); near <= Math.min(points.gridCount() - 1, g + 1); near++) {
                    points.grid(near).within(points.x[i], points.y[i], WITHIN_KM, j -> {
                        if (found[j] != null && (j & 1) == 0) {
                            row[0] = points.normalX[j] * nx + points.normalY[j] * ny;
                            row[1] = -points.normalX[j] * ny + points.normalY[j] * nx;
                            double variance = NOISE_MS * NOISE_MS + found[j].sdMs() * found[j].sdMs();
                            equations.add(row, found[j].speedMs(), row[0] > 0 ? 2 / (CORRELATED * variance) : 0);
                        }
                    });
                }
                equations.prior(0, 0, 1e-6);
                equations.prior(1, 0, 1 / (PRIOR_MS * PRIOR_MS));
                along[i] = equations.solve(solved, null) ? Math.max(-30, Math.min(30, solved[1])) : 0;
            }
        }
        return along;
    }
}
