package hemline.screening;

import hemline.sweep.Field;
import hemline.sweep.NoiseFloor;
import hemline.sweep.Sweep;
import java.util.Arrays;

/**
 * A sweep on one polar grid that is the same for every geometry: 1° of azimuth by 500 m of slant range, mean dBZ, gates
 * below detection at the noise floor. Half decibels in bytes; {@link #NONE} where nothing was measured.
 */
final class PolarMap {
    static final int AZIMUTHS = 360;
    static final double BIN_M = 500;
    static final byte NONE = Byte.MIN_VALUE;
    /** Farther than this nothing is looked for, bins. */
    private static final int MOST_BINS = 600;

    final int bins;
    private final byte[] halfDb;

    private PolarMap(int bins, byte[] halfDb) {
        this.bins = bins;
        this.halfDb = halfDb;
    }

    static PolarMap of(Sweep sweep, NoiseFloor floor) {
        int gates = sweep.gateCount();
        double far = sweep.slantRangeM(gates - 1) + sweep.gateSpacingM() / 2;
        int bins = (int) Math.max(1, Math.min(MOST_BINS, Math.ceil(far / BIN_M)));
        float[] sum = new float[AZIMUTHS * bins];
        int[] count = new int[AZIMUTHS * bins];
        int[] binOf = binOfGates(sweep, bins);
        int spill = (int) Math.max(0, Math.ceil(sweep.gateSpacingM() / BIN_M) - 1);
        float[] ray = new float[gates];
        for (int r = 0; r < sweep.rayCount(); r++) {
            sweep.reflectivity().copyRay(r, ray);
            int row = Math.min(AZIMUTHS - 1, (int) sweep.rays().azimuthDeg(r)) * bins;
            for (int g = 0; g < gates; g++) {
                if (binOf[g] < 0 || !Field.isMeasured(ray[g])) {
                    continue;
                }
                float least = (float) floor.dbzAt(sweep.slantRangeM(g));
                float value = Math.max(least, Math.min(60, ray[g]));
                for (int b = binOf[g]; b <= Math.min(bins - 1, binOf[g] + spill); b++) {
                    sum[row + b] += value;
                    count[row + b]++;
                }
            }
        }
        byte[] halfDb = new byte[sum.length];
        Arrays.fill(halfDb, NONE);
        for (int i = 0; i < sum.length; i++) {
            if (count[i] > 0) {
                halfDb[i] = (byte) Math.max(-120, Math.min(120, Math.round(2 * sum[i] / count[i])));
            }
        }
        fillLostRays(halfDb, bins, sweep);
        return new PolarMap(bins, halfDb);
    }

    private static int[] binOfGates(Sweep sweep, int bins) {
        int[] binOf = new int[sweep.gateCount()];
        for (int g = 0; g < binOf.length; g++) {
            double near = sweep.slantRangeM(g) - Math.max(0, sweep.gateSpacingM() - BIN_M) / 2;
            int bin = (int) Math.floor(near / BIN_M);
            binOf[g] = bin >= 0 && bin < bins ? bin : -1;
        }
        return binOf;
    }

    /** Rays 1.1° apart leave a whole degree empty now and then: the degree before stands in. */
    private static void fillLostRays(byte[] halfDb, int bins, Sweep sweep) {
        byte[] before = halfDb.clone();
        for (int a = 0; a < AZIMUTHS; a++) {
            int nearest = sweep.rays().nearestRay(a + 0.5);
            double gap = hemline.sweep.RayGeometry.gapDeg(sweep.rays().azimuthDeg(nearest), a + 0.5);
            if (gap > 0.5 && gap <= 1.2) {
                int from = Math.min(AZIMUTHS - 1, (int) sweep.rays().azimuthDeg(nearest)) * bins;
                System.arraycopy(before, from, halfDb, a * bins, bins);
            }
        }
    }

    /** Half decibels of a cell, {@link #NONE} where nothing was measured or beyond the last bin. */
    byte halfDb(int azimuth, int bin) {
        return bin < bins ? halfDb[azimuth * bins + bin] : NONE;
    }
}
