package hemline.reader;

import hemline.sweep.Field;
import hemline.sweep.RadarSite;
import hemline.sweep.RayGeometry;
import hemline.sweep.Sweep;
import java.util.Arrays;
import java.util.Optional;

/** Puts a sweep together from what its file stores: rays by azimuth, gates from the antenna outwards. */
final class SweepAssembly {
    private static final double DEFAULT_BEAM_WIDTH_DEG = 1;
    private static final double WIDEST_BEAM_DEG = 20;

    private SweepAssembly() {
    }

    /** Stored values of one field and where they lie. */
    record Stored(FieldHead field, RayTable rays, float[] values) {
    }

    static Sweep assemble(SweepHead head, String source, RadarSite site, Stored reflectivity,
                          Optional<Stored> velocity, double nyquistMs) {
        RayOrder order = RayOrder.of(head.rays(), head.elevationDeg());
        Ranges ranges = reflectivity.field.ranges();
        // Gates behind the antenna hold the transmitted pulse or nothing.
        int skipped = 0;
        while (skipped < ranges.gates() - 1 && ranges.centreM(skipped) < 0) {
            skipped++;
        }
        int gates = ranges.gates() - skipped;
        float[] values = new float[order.stored().length * gates];
        for (int ray = 0; ray < order.stored().length; ray++) {
            int stored = order.stored()[ray];
            int to = ray * gates;
            if (stored < 0) {
                Arrays.fill(values, to, to + gates, Field.NOT_MEASURED);
            } else {
                System.arraycopy(reflectivity.values, stored * ranges.gates() + skipped, values, to, gates);
            }
        }
        if (!reflectivity.field.tellsUndetect()) {
            inferUndetected(values, gates);
        }
        Ranges kept = new Ranges(ranges.centreM(skipped), ranges.spacingM(), gates);
        Optional<Field> speed = velocity.map(v -> new Field(v.field.name(), "m s-1", order.stored().length, gates,
                onto(order.geometry(), kept, v)));
        double width = head.beamWidthDeg() > 0 && head.beamWidthDeg() <= WIDEST_BEAM_DEG ? head.beamWidthDeg()
                : DEFAULT_BEAM_WIDTH_DEG;
        return new Sweep(site, source, head.elevationDeg(), width, kept.firstCentreM(), kept.spacingM(),
                order.geometry(), new Field(reflectivity.field.name(), "dBZ", order.stored().length, gates, values),
                speed, nyquistMs > 0 ? nyquistMs : Double.NaN);
    }

    /**
     * Where a file has one code for "no value", a gate without a value counts as below detection if its ray has an
     * echo somewhere: the ray was measured. A ray without any value stays not measured.
     */
    static void inferUndetected(float[] values, int gates) {
        for (int from = 0; from < values.length; from += gates) {
            boolean seen = false;
            for (int i = from; i < from + gates && !seen; i++) {
                seen = Field.isEcho(values[i]);
            }
            for (int i = from; seen && i < from + gates; i++) {
                if (Float.isNaN(values[i])) {
                    values[i] = Field.BELOW_DETECTION;
                }
            }
        }
    }

    /**
     * Velocities on the reflectivity's rays and gates: of the nearest ray within half a ray spacing (of either
     * field, whichever is wider) and the nearest gate within half a gate; not measured elsewhere.
     */
    private static float[] onto(RayGeometry rays, Ranges ranges, Stored velocity) {
        double sign = FieldChooser.isTowardRadar(velocity.field) ? -1 : 1;
        Ranges own = velocity.field.ranges();
        RayOrder order = RayOrder.of(velocity.rays, 0);
        RayGeometry ownRays = order.geometry();
        double reach = 0.51 * 360 / Math.min(rays.rays(), ownRays.rays());
        double halfGate = 0.5 * Math.max(ranges.spacingM(), own.spacingM()) + 1;
        int[] gate = new int[ranges.gates()];
        for (int g = 0; g < gate.length; g++) {
            long nearest = Math.round((ranges.centreM(g) - own.firstCentreM()) / own.spacingM());
            boolean inside = nearest >= 0 && nearest < own.gates()
                    && Math.abs(own.centreM((int) nearest) - ranges.centreM(g)) <= halfGate;
            gate[g] = inside ? (int) nearest : -1;
        }
        float[] values = new float[rays.rays() * gate.length];
        Arrays.fill(values, Field.NOT_MEASURED);
        for (int ray = 0; ray < rays.rays(); ray++) {
            int nearest = ownRays.nearestRay(rays.azimuthDeg(ray));
            int stored = order.stored()[nearest];
            if (stored < 0 || RayGeometry.gapDeg(ownRays.azimuthDeg(nearest), rays.azimuthDeg(ray)) > reach) {
                continue;
            }
            for (int g = 0; g < gate.length; g++) {
                if (gate[g] >= 0) {
                    float value = velocity.values[stored * own.gates() + gate[g]];
                    values[ray * gate.length + g] = Field.isEcho(value) ? (float) (sign * value) : value;
                }
            }
        }
        return values;
    }
}
