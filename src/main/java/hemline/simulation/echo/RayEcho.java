package hemline.simulation.echo;

import hemline.simulation.radar.RangeGrid;
import org.apache.commons.math3.util.FastMath;

/**
 * One direction of the beam at one time: where its bins lie and what comes back from them, in linear reflectivity
 * (mm⁶ m⁻³). Reused from ray to ray.
 */
public final class RayEcho {
    final RangeGrid grid;
    final double[] xKm;
    final double[] yKm;
    /** Clear air, thinned behind fronts. */
    final double[] air;
    /** Clear air as if no front had thinned it. */
    final double[] fullAir;
    /** The fronts' own lines. */
    final double[] lines;
    /** All else. */
    final double[] rest;
    /** Sum of echo times radial velocity. */
    final double[] moment;
    double timeS;
    double azimuthDeg;
    double sin;
    double cos;

    public RayEcho(RangeGrid grid) {
        this.grid = grid;
        int n = grid.bins();
        xKm = new double[n];
        yKm = new double[n];
        air = new double[n];
        fullAir = new double[n];
        lines = new double[n];
        rest = new double[n];
        moment = new double[n];
    }

    void pointAt(double newAzimuthDeg, double newTimeS) {
        azimuthDeg = newAzimuthDeg;
        timeS = newTimeS;
        sin = FastMath.sin(FastMath.toRadians(azimuthDeg));
        cos = FastMath.cos(FastMath.toRadians(azimuthDeg));
        for (int i = 0; i < xKm.length; i++) {
            xKm[i] = grid.groundKm(i) * sin;
            yKm[i] = grid.groundKm(i) * cos;
            air[i] = 0;
            fullAir[i] = 0;
            lines[i] = 0;
            rest[i] = 0;
            moment[i] = 0;
        }
    }

    void addRest(int bin, double linear, double radialMs) {
        rest[bin] += linear;
        moment[bin] += linear * radialMs;
    }

    /** Everything. */
    public double total(int bin) {
        return air[bin] + lines[bin] + rest[bin];
    }

    /** Everything but the fronts' lines. */
    public double withoutLines(int bin) {
        return air[bin] + rest[bin];
    }

    /** Everything, with clear air that no front has thinned. */
    public double withoutClearing(int bin) {
        return fullAir[bin] + lines[bin] + rest[bin];
    }

    /** Echo times radial velocity, summed over everything. */
    public double moment(int bin) {
        return moment[bin];
    }

    public int bins() {
        return xKm.length;
    }
}
