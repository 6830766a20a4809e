package hemline.screening;

import hemline.sweep.NoiseFloor;
import hemline.sweep.Sweep;
import java.util.Arrays;

/** One sweep's reflectivity as flat floats {@code [ray][gate]}: below detection at the noise floor, NaN not measured. */
final class PolarGates {
    final Sweep sweep;
    final int rays;
    final int gates;
    final float[] dbz;
    /** Noise floor of each gate, dBZ. */
    final float[] floorDbz;

    private PolarGates(Sweep sweep, float[] dbz, float[] floorDbz) {
        this.sweep = sweep;
        this.rays = sweep.rayCount();
        this.gates = sweep.gateCount();
        this.dbz = dbz;
        this.floorDbz = floorDbz;
    }

    static PolarGates of(Sweep sweep, NoiseFloor floor) {
        float[] dbz = sweep.reflectivity().toArray();
        float[] floorDbz = new float[sweep.gateCount()];
        for (int g = 0; g < floorDbz.length; g++) {
            floorDbz[g] = (float) floor.dbzAt(sweep.slantRangeM(g));
        }
        int gates = floorDbz.length;
        for (int i = 0, g = 0; i < dbz.length; i++) {
            // Math.max keeps NaN
            dbz[i] = Math.max(dbz[i], floorDbz[g]);
            g = g + 1 == gates ? 0 : g + 1;
        }
        return new PolarGates(sweep, dbz, floorDbz);
    }

    /** Usual angle between rays, degrees. */
    double raySpacingDeg() {
        double[] steps = new double[Math.max(1, rays - 1)];
        Arrays.fill(steps, 1);
        for (int r = 0; r + 1 < rays; r++) {
            steps[r] = sweep.rays().azimuthDeg(r + 1) - sweep.rays().azimuthDeg(r);
        }
        return Math.max(0.05, hemline.numerics.Robust.median(steps));
    }

    /** Rays in a whole turn at the usual spacing; neighbours across north count only when the sweep closes it. */
    boolean closesTheTurn() {
        double gap = sweep.rays().azimuthDeg(0) + 360 - sweep.rays().azimuthDeg(rays - 1);
        return gap < 3 * raySpacingDeg();
    }
}
