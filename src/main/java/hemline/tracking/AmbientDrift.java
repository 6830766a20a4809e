package hemline.tracking;

import hemline.numerics.NormalEquations;
import hemline.numerics.Robust;
import java.util.List;

/**
 * The one velocity with which the litter of the loop drifts: lumps of air, rolls, rain edges all share a wind, so that
 * their normal speeds are its components, {@code v = u · n}. A boundary advances through that air.
 *
 * @param eastMs  m s⁻¹
 * @param northMs m s⁻¹
 */
record AmbientDrift(double eastMs, double northMs) {
    static final AmbientDrift NONE = new AmbientDrift(0, 0);
    /** Vertices' worth of belief that nothing drifts. */
    private static final double PRIOR_VERTICES = 60;
    private static final double SCALE_MS = 1.5;
    private static final int ROUNDS = 12;

    /** @param litter vertices of groups that are too weak to be boundaries whatever their motion */
    static AmbientDrift of(List<int[]> litter, VertexCloud cloud, MotionLattice.Motion motion) {
        NormalEquations equations = new NormalEquations(2);
        double[] u = new double[2];
        double[] row = new double[2];
        for (int round = 0; round < ROUNDS; round++) {
            equations.clear();
            for (int[] group : litter) {
                for (int i : group) {
                    row[0] = cloud.normalX[i];
                    row[1] = cloud.normalY[i];
                    double r = motion.speedMs()[i] - u[0] * row[0] - u[1] * row[1];
                    equations.add(row, motion.speedMs()[i], round == 0 ? 1 : Robust.cauchy(r, SCALE_MS));
                }
            }
            equations.prior(0, 0, PRIOR_VERTICES);
            equations.prior(1, 0, PRIOR_VERTICES);
            equations.solve(u, null);
        }
        return new AmbientDrift(u[0], u[1]);
    }

    /** Speed through the air of a line that moves at a signed speed along a normal, toward where it moves, m s⁻¹. */
    double advanceMs(double normalX, double normalY, double speedMs) {
        double sign = speedMs < 0 ? -1 : 1;
        return Math.abs(speedMs) - sign * (eastMs * normalX + northMs * normalY);
    }
}
