package hemline.sweep;

import hemline.geodesy.BeamGeometry;
import java.util.Objects;
import java.util.Optional;

/**
 * One turn of the antenna at a low elevation, as measured.
 *
 * @param site             the radar
 * @param source           where it came from, for people: file name and sweep number
 * @param elevationDeg     nominal elevation, degrees
 * @param beamWidthDeg     half-power beam width, degrees (1 when the file does not say)
 * @param firstGateCentreM slant range of the centre of gate 0, m
 * @param gateSpacingM     gate length, m
 * @param rays             direction and time of each ray, by rising azimuth
 * @param reflectivity     dBZ
 * @param velocity         radial velocity, m s⁻¹, positive away from the radar; same shape; where present
 * @param nyquistMs        unambiguous velocity, m s⁻¹; NaN when unknown
 */
public record Sweep(RadarSite site, String source, double elevationDeg, double beamWidthDeg, double firstGateCentreM,
                    double gateSpacingM, RayGeometry rays, Field reflectivity, Optional<Field> velocity,
                    double nyquistMs) {
    public Sweep {
        Objects.requireNonNull(site);
        Objects.requireNonNull(source);
        if (!(gateSpacingM > 0 && gateSpacingM < 1e5)) {
            throw new IllegalArgumentException(source + ": gate spacing must be within 0..100 km, got " + gateSpacingM + " m");
        }
        if (!(Math.abs(firstGateCentreM) < 1e6)) {
            throw new IllegalArgumentException(source + ": first gate centre is " + firstGateCentreM + " m");
        }
        if (!(beamWidthDeg > 0 && beamWidthDeg <= 20)) {
            throw new IllegalArgumentException(source + ": beam width must be within 0..20 degrees, got " + beamWidthDeg);
        }
        requireShape(source, rays, reflectivity);
        velocity.ifPresent(v -> {
            requireShape(source, rays, v);
            if (v.gates() != reflectivity.gates()) {
                throw new IllegalArgumentException(source + ": velocity has " + v.gates() + " gates, reflectivity "
                        + reflectivity.gates());
            }
        });
    }

    private static void requireShape(String source, RayGeometry rays, Field field) {
        if (field.rays() != rays.rays()) {
            throw new IllegalArgumentException(source + ": field " + field.name() + " has " + field.rays()
                    + " rays, the geometry " + rays.rays());
        }
    }

    public int rayCount() {
        return rays.rays();
    }

    public int gateCount() {
        return reflectivity.gates();
    }

    /** Slant range of a gate's centre, m. */
    public double slantRangeM(int gate) {
        return firstGateCentreM + gate * gateSpacingM;
    }

    /** Beam geometry at the nominal elevation; an unknown antenna height counts as 0 m. */
    public BeamGeometry beam() {
        return new BeamGeometry(elevationDeg, Double.isNaN(site.altitudeM()) ? 0 : site.altitudeM());
    }

    /** Time of the earliest ray, ms since 1970-01-01T00:00Z. */
    public long startMs() {
        return rays.firstMs();
    }

    /** Time of the latest ray, ms since 1970-01-01T00:00Z. */
    public long endMs() {
        return rays.lastMs();
    }

    /** Half way between the earliest and the latest ray, ms since 1970-01-01T00:00Z. */
    public long middleMs() {
        long start = startMs();
        return start + (endMs() - start) / 2;
    }
}
