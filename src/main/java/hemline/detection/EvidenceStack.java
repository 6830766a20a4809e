package hemline.detection;

import java.util.Arrays;
import java.util.List;

/**
 * Evidence of one sweep and its neighbours, each moved along the normal by what a line of some speed would have gone:
 * a line that moves coherently adds up, chance does not (velocity filters; Reed, Gagliardi and Stotts 1988).
 */
final class EvidenceStack {
    private static final double STEP_KM = 1.2;
    private static final double LEAST_STEP_MS = 0.8;
    private static final double MOST_STEP_MS = 2.5;
    /** Packed pixel: evidence + OFFSET where something can be said, 0 where not; a sum then tells how many said. */
    private static final float OFFSET = 1024;
    /** Adding and taking away this rounds a float to a whole number, in a form that is done many at a time. */
    private static final float ROUNDER = 12_582_912;
    /** Steps in a standard deviation to which means are rounded to leave room for the trial's number. */
    private static final float MEAN_STEPS = 256;
    /** More than there are trials; the mean's steps times this stay below 2²⁴ and so exact in a float. */
    private static final float TRIALS = 2048;
    private static final float NOTHING = -Float.MAX_VALUE;

    final PlaneGrid grid;
    /** Best mean evidence of each coarse pixel, standard deviations; −∞ where nothing can be said. */
    final float[] evidence;
    /** Signed normal of the best. */
    final byte[] normal;
    /** Speed along the normal of the best, m s⁻¹. */
    final float[] speedMs;

    /** One sweep of the stack: its time relative to the one looked at and its planes. */
    record Layer(double afterS, SweepEvidence evidence) {
    }

    /**
     * @param layers the sweep looked at and its neighbours, in any order; one of them has {@code afterS} 0
     * @param grid   of the sweep looked at
     */
    EvidenceStack(List<Layer> layers, PlaneGrid grid, RestLevel rest, double maxSpeedMs) {
        this.grid = grid;
        evidence = new float[grid.size()];
        normal = new byte[grid.size()];
        speedMs = new float[grid.size()];
        Arrays.fill(evidence, Float.NEGATIVE_INFINITY);
        double farthest = layers.stream().mapToDouble(l -> Math.abs(l.afterS)).max().orElse(0);
        double step = farthest == 0 ? maxSpeedMs + 1
                : Math.max(LEAST_STEP_MS, Math.min(MOST_STEP_MS, 1000 * STEP_KM / farthest));
        int speeds = (int) (maxSpeedMs / step) + 1;
        int reach = (int) Math.ceil(maxSpeedMs * farthest / 1000 / grid.spacingKm()) + 1;
        Padded[] padded = new Padded[layers.size()];
        for (int j = 0; j < padded.length; j++) {
            padded[j] = new Padded(grid.width(), reach);
        }
        float[] sums = new float[grid.size()];
        float[] best = new float[grid.size()];
        Arrays.fill(best, NOTHING);
        for (int d = 0; d < Orientations.SIGNED; d++) {
            for (int j = 0; j < padded.length; j++) {
                padded[j].fill(rest.less(layers.get(j).evidence, d), layers.get(j).evidence.grid.width());
            }
            for (int v = 0; v < speeds; v++) {
                stack(layers, padded, d, v * step, sums);
                keepBest(sums, (layers.size() + 1) / 2, v * Orientations.SIGNED + d, best);
            }
        }
        decode(best, step);
    }

    private void stack(List<Layer> layers, Padded[] padded, int d, double speed, float[] sums) {
        Arrays.fill(sums, 0);
        for (int j = 0; j < padded.length; j++) {
            double pixels = speed * layers.get(j).afterS / 1000 / grid.spacingKm();
            int dx = (int) Math.rint(pixels * Orientations.normalEast(d));
            int dy = (int) Math.rint(pixels * Orientations.normalNorth(d));
            padded[j].addShifted(sums, dx, dy);
        }
    }

    /** Mean and trial of a pixel go into one float, the mean foremost, so that the larger float is the better trial. */
    private static void keepBest(float[] sums, int least, int trial, float[] best) {
        float number = trial;
        float enough = least;
        for (int i = 0; i < sums.length; i++) {
            float count = (sums[i] * (1 / OFFSET) + ROUNDER) - ROUNDER;
            float mean = (sums[i] - count * OFFSET) / (SweepEvidence.UNITS * (count + 0.5f));
            float steps = (mean * MEAN_STEPS + ROUNDER) - ROUNDER;
            // too few sweeps that say something put the mean far below any other
            float lacking = Math.max(0, enough - count) * 8192;
            best[i] = Math.max(best[i], (steps - lacking) * TRIALS + number);
        }
    }

    private void decode(float[] best, double step) {
        for (int i = 0; i < best.length; i++) {
            double steps = Math.floor(best[i] / TRIALS);
            if (steps > -4096) {
                int trial = (int) Math.round(best[i] - steps * TRIALS);
                evidence[i] = (float) (steps / MEAN_STEPS);
                normal[i] = (byte) (trial % Orientations.SIGNED);
                speedMs[i] = (float) (trial / Orientations.SIGNED * step);
            }
        }
    }

    /** A plane with a margin of nothing, wide enough for every shift. */
    private static final class Padded {
        private final int width;
        private final int reach;
        private final int stride;
        private final float[] pixels;

        Padded(int width, int reach) {
            this.width = width;
            this.reach = reach;
            stride = width + 2 * reach;
            pixels = new float[stride * stride];
        }

        /** Takes a plane about the same radar, of any width. */
        void fill(byte[] plane, int planeWidth) {
            Arrays.fill(pixels, 0);
            int inset = reach + (width - planeWidth) / 2;
            for (int y = Math.max(0, -inset); y < Math.min(planeWidth, stride - inset); y++) {
                for (int x = Math.max(0, -inset); x < Math.min(planeWidth, stride - inset); x++) {
                    byte value = plane[y * planeWidth + x];
                    pixels[(y + inset) * stride + x + inset] = value == SweepEvidence.VOID ? 0 : value + OFFSET;
                }
            }
        }

        void addShifted(float[] sums, int dx, int dy) {
            for (int y = 0; y < width; y++) {
                int from = (y + reach + dy) * stride + reach + dx;
                int to = y * width;
                for (int x = 0; x < width; x++) {
                    sums[to + x] += pixels[from + x];
                }
            }
        }
    }
}
