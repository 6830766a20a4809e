package hemline.detection;

import hemline.numerics.PlaneBlur;
import hemline.numerics.SlantedMean;
import hemline.numerics.Transposition;
import java.util.Arrays;

/**
 * What strips of some 14 km, laid in every direction, say of each pixel of the coarse grid: how far the strip through it
 * stands over both its sides (the even part of the profile across), and how far the air ahead stands over the air behind
 * (the odd part), in dB. NaN where too little was measured.
 *
 * <p>The two-sided minimum of the even part keeps step edges out of it. The odd part is taxed where the profile is a slope
 * or the inner side of a wide band rather than a plateau over clearer air.
 */
final class StripResponses {
    /** Reflectivity is clipped to this before strips are laid: brighter echo is rain and has no say, dBZ. */
    static final float CLIP_DBZ = 24;
    private static final double PRESMOOTH_KM = 0.55;
    /** Each of the two running means along the strip, half length, km. */
    private static final double HALF_STRIP_KM = 3.3;
    private static final double NEAR_KM = 2.5;
    private static final double FAR_KM = 4;
    private static final double BEYOND_KM = 7;
    private static final float LEAST_WEIGHT = 0.35f;
    /** Root mean square of the second and first differences of white strips over their own. */
    private static final float EVEN_GAIN = 1.15f;
    private static final float ODD_GAIN = 1.3f;
    private static final float EVEN_CLIP_DB = 3;
    private static final float ODD_CLIP_DB = 4;

    final PlaneGrid grid;
    /** {@code [orientation][coarse pixel]} even part, dB. */
    final float[][] ridge = new float[Orientations.COUNT][];
    /** {@code [signed normal][coarse pixel]} odd part, dB. */
    final float[][] step = new float[Orientations.SIGNED][];
    /** {@code [coarse pixel]} mean square of the clipped second differences over all directions, as of strips, dB². */
    final float[] evenNoise;
    /** {@code [coarse pixel]} mean square of the clipped first differences over all directions, as of strips, dB². */
    final float[] oddNoise;
    private final float[] noiseCount;

    private final int width;
    private final int pad;
    private final int stride;

    StripResponses(SweepRaster raster) {
        PlaneGrid fine = raster.grid();
        grid = fine.coarse();
        width = fine.width();
        pad = (int) Math.ceil(BEYOND_KM / fine.spacingKm()) + 1;
        stride = width + 2 * pad;
        evenNoise = new float[grid.size()];
        oddNoise = new float[grid.size()];
        noiseCount = new float[grid.size()];
        float[] value = new float[fine.size()];
        float[] weight = raster.weight().clone();
        for (int i = 0; i < value.length; i++) {
            value[i] = weight[i] * Math.min(CLIP_DBZ, raster.dbz()[i]);
        }
        PlaneBlur.gaussian(value, width, width, PRESMOOTH_KM / fine.spacingKm());
        PlaneBlur.gaussian(weight, width, width, PRESMOOTH_KM / fine.spacingKm());
        float[] turnedValue = new float[value.length];
        float[] turnedWeight = new float[value.length];
        Transposition.square(value, turnedValue, width);
        Transposition.square(weight, turnedWeight, width);
        Work work = new Work();
        for (int o = 0; o < Orientations.COUNT; o++) {
            double east = Orientations.normalEast(o);
            double north = Orientations.normalNorth(o);
            // a strip runs across its normal: steep ones go row by row, flat ones on the turned plane
            if (Math.abs(east) >= Math.abs(north)) {
                work.respond(value, weight, east, north, o, false);
            } else {
                work.respond(turnedValue, turnedWeight, north, east, o, true);
            }
        }
        for (int i = 0; i < noiseCount.length; i++) {
            float known = noiseCount[i] > 0 ? noiseCount[i] : Float.NaN;
            evenNoise[i] /= known * EVEN_GAIN * EVEN_GAIN;
            oddNoise[i] /= known * ODD_GAIN * ODD_GAIN;
        }
    }

    /** Buffers that serve all orientations. */
    private final class Work {
        private final float[] once = new float[width * width];
        private final float[] sums = new float[width * width];
        private final float[] weights = new float[width * width];
        private final float[] strip = new float[stride * stride];
        private final float[][] rows = new float[5][width];
        private final float[][] planes = new float[5][grid.size()];

        Work() {
            Arrays.fill(strip, Float.NaN);
        }

        void respond(float[] value, float[] weight, double nx, double ny, int o, boolean turned) {
            layStrips(value, weight, nx, ny);
            for (float[] plane : planes) {
                Arrays.fill(plane, 0);
            }
            for (int y = 0; y < width; y++) {
                respondRow(y, nx, ny);
                int to = y / 2 * (width / 2);
                for (int k = 0; k < planes.length; k++) {
                    float[] row = rows[k];
                    float[] plane = planes[k];
                    for (int x = 0; x < width / 2; x++) {
                        plane[to + x] += 0.25f * (row[2 * x] + row[2 * x + 1]);
                    }
                }
            }
            float[][] upright = new float[planes.length][grid.size()];
            for (int k = 0; k < planes.length; k++) {
                if (turned) {
                    Transposition.square(planes[k], upright[k], width / 2);
                } else {
                    System.arraycopy(planes[k], 0, upright[k], 0, upright[k].length);
                }
            }
            ridge[o] = upright[0];
            step[o] = upright[1];
            step[o + Orientations.COUNT] = upright[2];
            for (int i = 0; i < noiseCount.length; i++) {
                float squared = upright[3][i];
                if (!Float.isNaN(squared)) {
                    evenNoise[i] += squared;
                    oddNoise[i] += upright[4][i];
                    noiseCount[i]++;
                }
            }
        }

        private void layStrips(float[] value, float[] weight, double nx, double ny) {
            SlantedMean lines = new SlantedMean(width, -ny / nx);
            int half = (int) Math.round(HALF_STRIP_KM * Math.abs(nx) * width / (2 * -grid.km(0) + grid.spacingKm()));
            lines.sum(value, once, half);
            lines.sum(once, sums, half);
            lines.sum(weight, once, half);
            lines.sum(once, weights, half);
            float least = LEAST_WEIGHT * (2 * half + 1) * (2 * half + 1);
            for (int y = 0; y < width; y++) {
                int to = (y + pad) * stride + pad;
                int from = y * width;
                for (int x = 0; x < width; x++) {
                    strip[to + x] = weights[from + x] > least ? sums[from + x] / weights[from + x] : Float.NaN;
                }
            }
        }

        private int offset(double km, double nx, double ny) {
            double pixels = 2 * km / grid.spacingKm();
            return (int) Math.rint(pixels * ny) * stride + (int) Math.rint(pixels * nx);
        }

        private void respondRow(int y, double nx, double ny) {
            int centre = (y + pad) * stride + pad;
            int near = offset(NEAR_KM, nx, ny);
            int far = offset(FAR_KM, nx, ny);
            int beyond = offset(BEYOND_KM, nx, ny);
            float[] s = strip;
            float[] even = rows[0];
            float[] ahead = rows[1];
            float[] behind = rows[2];
            float[] evenSquared = rows[3];
            float[] oddSquared = rows[4];
            for (int x = 0; x < width; x++) {
                int p = centre + x;
                float c = s[p];
                float a1 = s[p + near];
                float a2 = s[p + far];
                float b1 = s[p - near];
                float b2 = s[p - far];
                float a = 0.5f * (a1 + a2);
                float b = 0.5f * (b1 + b2);
                float sideA = 0.35f * a + 0.65f * Math.min(a1, a2);
                float sideB = 0.35f * b + 0.65f * Math.min(b1, b2);
                even[x] = c - Math.max(sideA, sideB) - 2 * Math.max(0, c - 19.5f);
                float second = Math.max(-EVEN_CLIP_DB, Math.min(EVEN_CLIP_DB, c - 0.5f * (a + b)));
                float first = Math.max(-ODD_CLIP_DB, Math.min(ODD_CLIP_DB, a - b));
                evenSquared[x] = second * second;
                oddSquared[x] = first * first;
                float a7 = s[p + beyond];
                float b7 = s[p - beyond];
                float riseA = Math.max(0, a7 - a);
                float riseB = Math.max(0, b7 - b);
                float fallA = Math.max(0, a - a7);
                float fallB = Math.max(0, b - b7);
                ahead[x] = a - b - riseA - 0.5f * fallB - 0.7f * Math.max(0, fallA - 0.7f)
                        - 1.5f * Math.max(0, a - 13);
                behind[x] = b - a - riseB - 0.5f * fallA - 0.7f * Math.max(0, fallB - 0.7f)
                        - 1.5f * Math.max(0, b - 13);
            }
        }
    }
}
