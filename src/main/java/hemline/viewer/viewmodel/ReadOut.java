package hemline.viewer.viewmodel;

import hemline.geodesy.BeamGeometry;
import hemline.geodesy.GeoPoint;
import hemline.geodesy.LocalPlane;
import hemline.geometry.Point;
import hemline.sweep.Field;
import hemline.sweep.MaskReason;
import hemline.sweep.RayGeometry;
import hemline.sweep.Sweep;
import java.util.Optional;
import java.util.stream.Collectors;

/**
 * All that a sweep says of one place.
 *
 * @param place        km east and north of the radar
 * @param rangeKm      along the ground, km
 * @param azimuthDeg   degrees clockwise from north
 * @param geo          latitude and longitude; empty when the radar's position is unknown
 * @param beamHeightM  beam centre above mean sea level, m
 * @param beamWidthM   half-power width of the beam across, m
 * @param gate         whether the sweep has a gate there
 * @param dbz          reflectivity: NaN not measured, −∞ below detection
 * @param velocityMs   radial velocity, m s⁻¹, positive away; NaN when there is none
 * @param masked       the reasons in words, empty when taken at face value
 * @param rayMs        time of the ray, ms since 1970-01-01T00:00Z
 */
public record ReadOut(Point place, double rangeKm, double azimuthDeg, Optional<GeoPoint> geo, double beamHeightM,
                      double beamWidthM, boolean gate, float dbz, double velocityMs, String masked, long rayMs) {

    /** What {@code held} says of a place. */
    public static ReadOut at(Point place, HeldSweep held) {
        Sweep sweep = held.raw();
        BeamGeometry beam = sweep.beam();
        double slantM = beam.slantRangeM(1000 * place.lengthKm());
        int gate = (int) Math.floor((slantM - sweep.firstGateCentreM()) / sweep.gateSpacingM() + 0.5);
        int ray = sweep.rays().nearestRay(place.bearingDeg());
        double off = RayGeometry.gapDeg(sweep.rays().azimuthDeg(ray), place.bearingDeg());
        boolean covered = gate >= 0 && gate < sweep.gateCount() && off <= RayReach.reachDeg(sweep);
        float dbz = covered ? sweep.reflectivity().at(ray, gate) : Field.NOT_MEASURED;
        double velocity = covered ? sweep.velocity().map(v -> v.at(ray, gate)).orElse(Float.NaN) : Double.NaN;
        String masked = covered ? held.mask().map(mask -> mask.reasonsAt(ray, gate).stream().map(MaskReason::words)
                .collect(Collectors.joining(", "))).orElse("") : "";
        return new ReadOut(place, place.lengthKm(), place.bearingDeg(),
                sweep.site().position().map(p -> new LocalPlane(p).toGeo(place)), beam.heightAboveSeaM(slantM),
                slantM * Math.toRadians(sweep.beamWidthDeg()), covered, dbz, velocity, masked,
                sweep.rays().timeMs(ray));
    }

    /** The reflectivity in words. */
    public String reflectivityWords() {
        if (!gate) {
            return "no gate";
        }
        if (!Field.isMeasured(dbz)) {
            return "not measured";
        }
        return Field.isEcho(dbz) ? Words.number(dbz, 1) + " dBZ" : "below detection";
    }

    /** The radial velocity in words. */
    public String velocityWords() {
        if (Double.isNaN(velocityMs)) {
            return Words.NONE;
        }
        return Double.isInfinite(velocityMs) ? "no echo" : Words.number(velocityMs, 1) + " " + Words.METRES_PER_SECOND;
    }

    public String latitudeWords() {
        return geo.map(p -> Words.latitude(p.latitudeDeg())).orElse("no position");
    }

    public String longitudeWords() {
        return geo.map(p -> Words.longitude(p.longitudeDeg())).orElse("no position");
    }
}
