package hemline.viewer.render;

import hemline.geodesy.BeamGeometry;
import hemline.sweep.RayGeometry;
import hemline.sweep.Sweep;
import hemline.viewer.viewmodel.HeldSweep;
import hemline.viewer.viewmodel.PlaneField;
import hemline.viewer.viewmodel.RayReach;

/**
 * One field of a sweep as one byte a gate {@code [ray][gate]}, with the tables that lead from a direction and a
 * ground range to its gate. Small enough to keep for a whole loop.
 */
final class LevelGrid {
    private final int gates;
    private final byte[] levels;
    private final Palette palette;
    private final short[] rayOfAzimuthBin;
    private final short[] gateOfRangeBin;

    private LevelGrid(Sweep sweep, byte[] levels, Palette palette) {
        this.gates = sweep.gateCount();
        this.levels = levels;
        this.palette = palette;
        rayOfAzimuthBin = rayTable(sweep);
        gateOfRangeBin = gateTable(sweep);
    }

    static LevelGrid of(HeldSweep held, PlaneField field) {
        Sweep sweep = held.raw();
        Palette palette = Palette.of(field);
        int gates = sweep.gateCount();
        byte[] levels = new byte[sweep.rayCount() * gates];
        for (int ray = 0; ray < sweep.rayCount(); ray++) {
            for (int gate = 0; gate < gates; gate++) {
                levels[ray * gates + gate] = (byte) level(held, field, ray, gate);
            }
        }
        return new LevelGrid(sweep, levels, palette);
    }

    private static int level(HeldSweep held, PlaneField field, int ray, int gate) {
        int mask = held.mask().isPresent() ? held.mask().get().bitsAt(ray, gate) : 0;
        if (field == PlaneField.VELOCITY) {
            return held.raw().velocity().isPresent()
                    ? Palette.velocityLevel(held.raw().velocity().get().at(ray, gate)) : Palette.NOTHING;
        }
        float dbz = held.raw().reflectivity().at(ray, gate);
        return switch (field) {
            case SCREENED -> (mask & Palette.REMOVING_BITS) != 0 ? Palette.NOTHING : Palette.reflectivityLevel(dbz);
            case REMOVED -> Palette.removedLevel(dbz, mask);
            default -> Palette.reflectivityLevel(dbz);
        };
    }

    private static short[] rayTable(Sweep sweep) {
        RayGeometry rays = sweep.rays();
        double reach = RayReach.reachDeg(sweep);
        short[] table = new short[PolarMap.AZIMUTH_BINS];
        for (int bin = 0; bin < table.length; bin++) {
            double azimuth = (bin + 0.5) * 360 / PolarMap.AZIMUTH_BINS;
            int ray = rays.nearestRay(azimuth);
            table[bin] = RayGeometry.gapDeg(rays.azimuthDeg(ray), azimuth) <= reach ? (short) ray : -1;
        }
        return table;
    }

    private static short[] gateTable(Sweep sweep) {
        BeamGeometry beam = sweep.beam();
        short[] table = new short[PolarMap.RANGE_BINS];
        for (int bin = 0; bin < table.length; bin++) {
            double slantM = beam.slantRangeM((bin + 0.5) * PolarMap.RANGE_BIN_M);
            int gate = (int) Math.floor((slantM - sweep.firstGateCentreM()) / sweep.gateSpacingM() + 0.5);
            table[bin] = gate >= 0 && gate < Math.min(sweep.gateCount(), Short.MAX_VALUE) ? (short) gate : -1;
        }
        table[table.length - 1] = -1;
        return table;
    }

    /** Fills {@code argb}, as many as the map has pixels, with premultiplied colours; 0 where nothing was measured. */
    void paint(PolarMap map, int[] argb) {
        int[] bins = map.bins();
        int[] colours = palette.argb();
        for (int i = 0; i < bins.length; i++) {
            int ray = rayOfAzimuthBin[bins[i] >>> 16];
            int gate = gateOfRangeBin[bins[i] & 0xffff];
            argb[i] = (ray | gate) < 0 ? 0 : colours[levels[ray * gates + gate] & 0xff];
        }
    }

    /** Roughly what it takes of the heap, bytes. */
    long bytes() {
        return levels.length + 2L * (PolarMap.AZIMUTH_BINS + PolarMap.RANGE_BINS);
    }
}
