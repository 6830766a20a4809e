package hemline.numerics;

/**
 * Gaussian smoothing of a plane {@code [height][width]} of flat floats; outside counts as zero, so that smoothing
 * values times weights and weights alone and dividing gives a normalised mean.
 *
 * <p>Up to a standard deviation of 4 pixels the kernel is sampled out to three standard deviations and scaled to a
 * sum of one; beyond, three running means whose variances add up to the wanted one stand in (error of the profile
 * under 3 % of its peak).
 */
public final class PlaneBlur {
    private static final double SAMPLED_UP_TO = 4;

    private PlaneBlur() {
    }

    /** Smooths in place. */
    public static void gaussian(float[] plane, int width, int height, double sigmaPixels) {
        if (plane.length != (long) width * height) {
            throw new IllegalArgumentException(width + " x " + height + " pixels do not match " + plane.length);
        }
        if (!(sigmaPixels >= 0)) {
            throw new IllegalArgumentException("a standard deviation is at least 0 pixels, got " + sigmaPixels);
        }
        if (sigmaPixels == 0) {
            return;
        }
        float[] scratch = new float[plane.length];
        if (sigmaPixels <= SAMPLED_UP_TO) {
            float[] kernel = kernel(sigmaPixels);
            alongRows(plane, scratch, width, height, kernel);
            acrossRows(scratch, plane, width, height, kernel);
            return;
        }
        for (int half : boxes(sigmaPixels)) {
            boxAlongRows(plane, scratch, width, height, half);
            boxAcrossRows(scratch, plane, width, height, half);
        }
    }

    /** Half widths of three running means with together about the variance wanted. */
    static int[] boxes(double sigma) {
        double each = Math.sqrt(4 * sigma * sigma + 1);
        int low = (int) Math.floor((each - 1) / 2);
        int[] halves = new int[3];
        double best = Double.POSITIVE_INFINITY;
        for (int wide = 0; wide <= 3; wide++) {
            double variance = 0;
            for (int i = 0; i < 3; i++) {
                int half = i < wide ? low + 1 : low;
                variance += ((2.0 * half + 1) * (2 * half + 1) - 1) / 12;
            }
            if (Math.abs(variance - sigma * sigma) < best) {
                best = Math.abs(variance - sigma * sigma);
                for (int i = 0; i < 3; i++) {
                    halves[i] = i < wide ? low + 1 : low;
                }
            }
        }
        return halves;
    }

    /** Weights at 0, 1, 2… pixels from the centre, of sum one over both sides. */
    static float[] kernel(double sigma) {
        int reach = (int) Math.max(1, Math.ceil(3 * sigma));
        double[] weights = new double[reach + 1];
        double sum = 0;
        for (int k = 0; k <= reach; k++) {
            weights[k] = Math.exp(-0.5 * k * k / (sigma * sigma));
            sum += k == 0 ? weights[k] : 2 * weights[k];
        }
        float[] kernel = new float[reach + 1];
        for (int k = 0; k <= reach; k++) {
            kernel[k] = (float) (weights[k] / sum);
        }
        return kernel;
    }

    private static void alongRows(float[] in, float[] out, int width, int height, float[] kernel) {
        int reach = kernel.length - 1;
        float[] padded = new float[width + 2 * reach];
        for (int y = 0; y < height; y++) {
            int row = y * width;
            System.arraycopy(in, row, padded, reach, width);
            float centre = kernel[0];
            for (int x = 0; x < width; x++) {
                out[row + x] = centre * padded[x + reach];
            }
            for (int k = 1; k <= reach; k++) {
                float weight = kernel[k];
                int left = reach - k;
                int right = reach + k;
                for (int x = 0; x < width; x++) {
                    out[row + x] += weight * (padded[x + left] + padded[x + right]);
                }
            }
        }
    }

    private static void acrossRows(float[] in, float[] out, int width, int height, float[] kernel) {
        for (int y = 0; y < height; y++) {
            int row = y * width;
            float centre = kernel[0];
            for (int x = 0; x < width; x++) {
                out[row + x] = centre * in[row + x];
            }
            for (int k = 1; k < kernel.length; k++) {
                addRow(in, y - k, out, row, width, height, kernel[k]);
                addRow(in, y + k, out, row, width, height, kernel[k]);
            }
        }
    }

    private static void addRow(float[] in, int fromRow, float[] out, int row, int width, int height, float weight) {
        if (fromRow < 0 || fromRow >= height) {
            return;
        }
        int from = fromRow * width;
        for (int x = 0; x < width; x++) {
            out[row + x] += weight * in[from + x];
        }
    }

    private static void boxAlongRows(float[] in, float[] out, int width, int height, int half) {
        double scale = 1.0 / (2 * half + 1);
        for (int y = 0; y < height; y++) {
            int row = y * width;
            double sum = 0;
            for (int x = 0; x < Math.min(half, width); x++) {
                sum += in[row + x];
            }
            for (int x = 0; x < width; x++) {
                sum += x + half < width ? in[row + x + half] : 0;
                sum -= x - half - 1 >= 0 ? in[row + x - half - 1] : 0;
                out[row + x] = (float) (sum * scale);
            }
        }
    }

    private static void boxAcrossRows(float[] in, float[] out, int width, int height, int half) {
        double scale = 1.0 / (2 * half + 1);
        double[] sums = new double[width];
        for (int y = 0; y < Math.min(half, height); y++) {
            for (int x = 0; x < width; x++) {
                sums[x] += in[y * width + x];
            }
        }
        for (int y = 0; y < height; y++) {
            if (y + half < height) {
                int row = (y + half) * width;
                for (int x = 0; x < width; x++) {
                    sums[x] += in[row + x];
                }
            }
            if (y - half - 1 >= 0) {
                int row = (y - half - 1) * width;
                for (int x = 0; x < width; x++) {
                    sums[x] -= in[row + x];
                }
            }
            for (int x = 0; x < width; x++) {
                out[y * width + x] = (float) (sums[x] * scale);
            }
        }
    }
}
