package hemline.detection;

import hemline.numerics.PlaneBlur;
import java.util.Arrays;

/**
 * One sweep's evidence for a boundary with each signed normal at each pixel of the coarse grid, in sixteenths of the
 * background's standard deviation, {@link #VOID} where nothing can be said.
 */
final class SweepEvidence {
    static final byte VOID = Byte.MIN_VALUE;
    /** Units in a standard deviation. */
    static final int UNITS = 16;
    private static final float LEAST = -2;
    private static final float MOST = 5;
    /** Background of the quietest air, dB: finer than this no radar is the same twice. */
    private static final float LEAST_NOISE_DB = 0.35f;
    private static final double NOISE_KM = 8;
    private static final double RAIN_MARGIN_KM = 2;

    final PlaneGrid grid;
    /** {@code [signed normal][coarse pixel]}. */
    final byte[][] planes = new byte[Orientations.SIGNED][];
    private final float[] evenNoiseDb;
    private final float[] oddNoiseDb;

    SweepEvidence(StripResponses strips, RainMap rain) {
        grid = strips.grid;
        boolean[] inRain = inRain(rain);
        evenNoiseDb = localNoise(strips.evenNoise, inRain);
        oddNoiseDb = localNoise(strips.oddNoise, inRain);
        for (int d = 0; d < Orientations.SIGNED; d++) {
            planes[d] = plane(strips.ridge[d % Orientations.COUNT], strips.step[d], inRain);
        }
    }

    private boolean[] inRain(RainMap rain) {
        boolean[] within = new boolean[grid.size()];
        int fine = 2 * grid.width();
        for (int y = 0; y < grid.width(); y++) {
            for (int x = 0; x < grid.width(); x++) {
                int p = 2 * y * fine + 2 * x;
                float nearest = Math.min(Math.min(rain.distanceKm(p), rain.distanceKm(p + 1)),
                        Math.min(rain.distanceKm(p + fine), rain.distanceKm(p + fine + 1)));
                within[y * grid.width() + x] = nearest < RAIN_MARGIN_KM;
            }
        }
        return within;
    }

    private float[] localNoise(float[] squared, boolean[] inRain) {
        float[] sum = new float[grid.size()];
        float[] count = new float[grid.size()];
        for (int i = 0; i < sum.length; i++) {
            if (!inRain[i] && !Float.isNaN(squared[i])) {
                sum[i] = squared[i];
                count[i] = 1;
            }
        }
        PlaneBlur.gaussian(sum, grid.width(), grid.width(), NOISE_KM / grid.spacingKm());
        PlaneBlur.gaussian(count, grid.width(), grid.width(), NOISE_KM / grid.spacingKm());
        float[] noise = new float[grid.size()];
        for (int i = 0; i < noise.length; i++) {
            double variance = count[i] > 1e-3 ? Math.max(0, sum[i] / count[i]) : 1;
            noise[i] = (float) Math.max(LEAST_NOISE_DB, Math.sqrt(variance));
        }
        return noise;
    }

    private byte[] plane(float[] ridge, float[] step, boolean[] inRain) {
        byte[] plane = new byte[grid.size()];
        Arrays.fill(plane, VOID);
        for (int i = 0; i < plane.length; i++) {
            if (inRain[i] || Float.isNaN(ridge[i])) {
                continue;
            }
            float r = ridge[i] / evenNoiseDb[i];
            float s = Float.isNaN(step[i]) ? 0 : step[i] / oddNoiseDb[i];
            float line = r + 0.25f * Math.max(-2, Math.min(2.5f, s));
            float arc = 0.6f * (s - 1.2f);
            float e = Math.max(LEAST, Math.min(MOST, Math.max(line, arc)));
            plane[i] = (byte) Math.round(UNITS * e);
        }
        return plane;
    }
}
