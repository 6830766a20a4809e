package hemline.simulation.making;

import hemline.simulation.echo.Decibels;
import hemline.simulation.radar.RadarSpec;
import hemline.simulation.radar.ScanPlan;
import hemline.sweep.RayGeometry;

/**
 * A sweep as a receiver without noise would measure it, {@code [ray by rising azimuth][gate]}, in linear reflectivity
 * (mm⁶ m⁻³): everything; the same without the fronts' lines; the same with air that no front has thinned.
 */
final class CleanSweep {
    final RadarSpec radar;
    final ScanPlan plan;
    final int rays;
    final int gates;
    final float[] total;
    final float[] withoutLines;
    final float[] withoutClearing;
    /** m s⁻¹, weighted by echo; empty when the scene has no velocity. */
    final float[] velocity;
    final boolean[] lost;
    private final double[] noise;
    private final RayGeometry directions;

    CleanSweep(RadarSpec radar, ScanPlan plan, boolean withVelocity) {
        this.radar = radar;
        this.plan = plan;
        rays = plan.rays();
        gates = radar.gates().count();
        total = new float[rays * gates];
        withoutLines = new float[rays * gates];
        withoutClearing = new float[rays * gates];
        velocity = new float[withVelocity ? rays * gates : 0];
        lost = new boolean[rays];
        noise = new double[gates];
        directions = plan.geometry(0, radar.dish().elevationDeg());
        for (int g = 0; g < gates; g++) {
            double rangeKm = Math.max(0.05, radar.slantRangeM(g) / 1000);
            noise[g] = Decibels.toLinear(radar.receiver().noiseAtOneKmDbz()) * rangeKm * rangeKm;
        }
    }

    /** The receiver's noise at a gate, as linear reflectivity. */
    double noise(int gate) {
        return noise[gate];
    }

    int nearestRay(double azimuthDeg) {
        return directions.nearestRay(azimuthDeg);
    }

    double azimuthDeg(int rank) {
        return plan.azimuthDeg(plan.scannedAt(rank));
    }
}
