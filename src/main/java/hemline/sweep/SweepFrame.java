package hemline.sweep;

import hemline.geodesy.BeamGeometry;
import hemline.geometry.Point;

/**
 * Where and when one sweep looked, without its gates: all that linking and measuring need of it.
 *
 * @param index its place in the loop, 0 the earliest
 * @param rays  direction and time of each ray
 * @param beam  height of the beam
 */
public record SweepFrame(int index, RayGeometry rays, BeamGeometry beam) {

    public static SweepFrame of(int index, Sweep sweep) {
        return new SweepFrame(index, sweep.rays(), sweep.beam());
    }

    /** Time at which the ray over a place passed, ms since 1970-01-01T00:00Z. */
    public long timeAtMs(Point place) {
        return rays.timeMs(rays.nearestRay(place.bearingDeg()));
    }

    /** Height of the beam centre above mean sea level over a place, m. */
    public double beamHeightM(Point place) {
        return beam.heightAboveSeaM(beam.slantRangeM(1000 * place.lengthKm()));
    }

    /** Mean of the rays' times, ms since 1970-01-01T00:00Z. */
    public long meanTimeMs() {
        long first = rays.timeMs(0);
        double sum = 0;
        for (int i = 0; i < rays.rays(); i++) {
            sum += rays.timeMs(i) - first;
        }
        return first + Math.round(sum / rays.rays());
    }
}
