package hemline.detection;

import hemline.sweep.Field;
import hemline.sweep.MaskReason;
import hemline.sweep.NoiseFloor;
import hemline.sweep.ScreenedSweep;
import hemline.sweep.Sweep;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;

/** Puts screened sweeps on the plane. Tables are kept for each size of grid; safe for several threads. */
final class Rasteriser {
    private static final int REFUSED = MaskReason.CLUTTER.bit() | MaskReason.SPIKE.bit() | MaskReason.SPECKLE.bit()
            | MaskReason.SECOND_TRIP.bit() | MaskReason.BLOCKED.bit() | MaskReason.ABOVE_CEILING.bit();

    private final double pixelKm;
    private final double maxRangeKm;
    private final Map<Integer, RasterTable> tables = new ConcurrentHashMap<>();

    Rasteriser(double pixelKm, double maxRangeKm) {
        this.pixelKm = pixelKm;
        this.maxRangeKm = maxRangeKm;
    }

    /** A raster that just holds the gates that are not above the ceiling, up to the farthest range. */
    SweepRaster raster(ScreenedSweep screened) {
        Sweep sweep = screened.raw();
        int usable = usableGates(screened);
        double reachKm = usable == 0 ? 0
                : sweep.beam().groundRangeM(sweep.slantRangeM(usable - 1) + sweep.gateSpacingM() / 2) / 1000;
        PlaneGrid grid = PlaneGrid.reaching(Math.min(maxRangeKm, reachKm), pixelKm);
        RasterTable table = tables.computeIfAbsent(grid.width(), width -> new RasterTable(grid));
        RangeBins bins = new RangeBins(sweep, table.bins, pixelKm);
        PolarBins polar = PolarBins.of(screened, bins, NoiseFloor.of(sweep));
        return polar.onPlane(table, new RayLookup(sweep.rays(), sweep.beamWidthDeg()));
    }

    private static int usableGates(ScreenedSweep screened) {
        int gate = screened.raw().gateCount();
        while (gate > 0 && screened.mask().is(0, gate - 1, MaskReason.ABOVE_CEILING)) {
            gate--;
        }
        return gate;
    }

    /** Values and weights per ray and range bin. */
    private record PolarBins(int bins, float[] value, float[] weight, float[] undetect) {

        static PolarBins of(ScreenedSweep screened, RangeBins shape, NoiseFloor floor) {
            Sweep sweep = screened.raw();
            int rays = sweep.rayCount();
            int gates = sweep.gateCount();
            PolarBins polar = new PolarBins(shape.bins, new float[rays * shape.bins], new float[rays * shape.bins],
                    new float[rays * shape.bins]);
            float[] floorDbz = new float[gates];
            for (int g = 0; g < gates; g++) {
                floorDbz[g] = (float) floor.dbzAt(sweep.slantRangeM(g));
            }
            float[] ray = new float[gates];
            for (int r = 0; r < rays; r++) {
                sweep.reflectivity().copyRay(r, ray);
                for (int b = 0; b < shape.bins; b++) {
                    polar.gather(screened, r, ray, floorDbz, shape, b);
                }
            }
            return polar;
        }

        private void gather(ScreenedSweep screened, int r, float[] ray, float[] floorDbz, RangeBins shape, int b) {
            float sum = 0;
            float total = 0;
            float silent = 0;
            float[] share = shape.share[b];
            int from = shape.firstGate[b];
            for (int k = 0; k < share.length; k++) {
                int g = from + k;
                float dbz = ray[g];
                if (Field.isMeasured(dbz) && (screened.mask().bitsAt(r, g) & REFUSED) == 0) {
                    sum += share[k] * Math.max(dbz, floorDbz[g]);
                    total += share[k];
                    silent += Field.isEcho(dbz) ? 0 : share[k];
                }
            }
            value[r * bins + b] = sum;
            weight[r * bins + b] = total;
            undetect[r * bins + b] = silent;
        }

        SweepRaster onPlane(RasterTable table, RayLookup rays) {
            int size = table.grid.size();
            float[] dbz = new float[size];
            float[] certainty = new float[size];
            float[] silent = new float[size];
            for (int i = 0; i < size; i++) {
                int near = (int) table.bin[i];
                if (near + 1 >= bins) {
                    continue;
                }
                float far = table.bin[i] - near;
                int step = table.azimuthStep[i];
                int a = rays.before[step] * bins + near;
                int b = rays.after[step] * bins + near;
                float wa = rays.weightBefore[step];
                float wb = rays.weightAfter[step];
                float a0 = wa * (1 - far);
                float a1 = wa * far;
                float b0 = wb * (1 - far);
                float b1 = wb * far;
                float w = a0 * weight[a] + a1 * weight[a + 1] + b0 * weight[b] + b1 * weight[b + 1];
                if (w > 0.01f) {
                    float v = a0 * value[a] + a1 * value[a + 1] + b0 * value[b] + b1 * value[b + 1];
                    float u = a0 * undetect[a] + a1 * undetect[a + 1] + b0 * undetect[b] + b1 * undetect[b + 1];
                    dbz[i] = v / w;
                    certainty[i] = Math.min(1, w);
                    silent[i] = u / w;
                }
            }
            return new SweepRaster(table.grid, dbz, certainty, silent);
        }
    }
}
