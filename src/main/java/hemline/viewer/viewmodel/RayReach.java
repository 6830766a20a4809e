package hemline.viewer.viewmodel;

import hemline.sweep.RayGeometry;
import hemline.sweep.Sweep;

/** How far to either side a ray stands for the air around it. */
public final class RayReach {
    private RayReach() {
    }

    /**
     * Half the usual step between rays and a tenth more, so that small irregularities leave no seams and a lost ray
     * leaves a visible gap; never under half a beam width. Degrees.
     */
    public static double reachDeg(Sweep sweep) {
        RayGeometry rays = sweep.rays();
        double[] steps = new double[rays.rays()];
        for (int i = 0; i < steps.length; i++) {
            steps[i] = RayGeometry.gapDeg(rays.azimuthDeg(i), rays.azimuthDeg((i + 1) % steps.length));
        }
        java.util.Arrays.sort(steps);
        return Math.max(0.5 * sweep.beamWidthDeg(), 0.55 * steps[steps.length / 2]);
    }
}
