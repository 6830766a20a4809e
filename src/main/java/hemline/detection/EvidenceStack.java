package hemline.detection;

import java.util.Arrays;
import java.util.List;

/**
 * Evidence of one sweep and its neighbours, each moved along the normal by what a line of some speed would have gone:
 * a line that moves coherently adds up, chance does not (Reed, Gagliardi and Stotts 1988, IEEE Trans. Aerosp. Electron.
 * Syst. 24:327, velocity filters).
 */
final class EvidenceStack {
    private static final double STEP_KM = 1.2;
    private static final double LEAST_STEP_MS = 0.8;
    private static final double MOST_STEP_MS = 2.5;
    /** Packed pixel: evidence + OFFSET where something can be said, 0 where not; a sum then tells how many said. */
    private static final int OFFSET = 512;
    private static final int HALF = OFFSET / 2;

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
        int[] sums = new int[grid.size()];
        for (int d = 0; d < Orientations.SIGNED; d++) {
            for (int j = 0; j < padded.length; j++) {
                padded[j].fill(rest.less(layers.get(j).evidence, d), layers.get(j).evidence.grid.width());
            }
            for (int v = 0; v < speeds; v++) {
                stack(layers, padded, d, v * step, sums);
                keepBest(sums, layers.size(), d, v * step);
            }
        }
    }

    private void stack(List<Layer> layers, Padded[] padded, int d, double speed, int[] sums) {
        Arrays.fill(sums, 0);
        for (int j = 0; j < padded.length; j++) {
            double pixels = speed * layers.get(j).afterS / 1000 / grid.spacingKm();
            int dx = (int) Math.rint(pixels * Orientations.normalEast(d));
            int dy = (int) Math.rint(pixels * Orientations.normalNorth(d));
            padded[j].addShifted(sums, dx, dy);
        }
    }

    private void keepBest(int[] sums, int layers, int d, double speed) {
        int least = (layers + 1) / 2;
        for (int i = 0; i < sums.length; i++) {
            int count = (sums[i] + HALF) / OFFSET;
            if (count >= least) {
                float mean = (sums[i] - count * OFFSET) / (SweepEvidence.UNITS * (count + 0.5f));
                if (mean > evidence[i]) {
                    evidence[i] = mean;
                    normal[i] = (byte) d;
                    speedMs[i] = (float) speed;
                }
            }
        }
    }

    /** A plane with a margin of nothing, wide enough for every shift. */
    private static final class Padded {
        private final int width;
        private final int reach;
        private final int stride;
        private final int[] pixels;

        Padded(int width, int reach) {
            this.width = width;
            this.reach = reach;
            stride = width + 2 * reach;
            pixels = new int[stride * stride];
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

        void addShifted(int[] sums, int dx, int dy) {
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
