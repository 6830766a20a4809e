package hemline.numerics;

/**
 * Smoothing of values that are certain to different degrees: {@code (a * (c f)) / (a * c)} with certainty c and
 * applicability a (Knutsson and Westin 1993, Proc. CVPR, 515–523). A constant stays that constant wherever anything
 * certain is in reach.
 */
public final class NormalisedConvolution {
    private NormalisedConvolution() {
    }

    /**
     * Gaussian applicability.
     *
     * @param values    {@code [height][width]}; anything, NaN too, where the certainty is 0
     * @param certainty {@code [height][width]}, 0 to 1
     * @param least     smoothed certainty under which the result is NaN, 0 to 1
     */
    public static float[] gaussian(float[] values, float[] certainty, int width, int height, double sigmaPixels,
                                   double least) {
        if (values.length != certainty.length) {
            throw new IllegalArgumentException(values.length + " values do not match " + certainty.length + " certainties");
        }
        float[] weighted = new float[values.length];
        for (int i = 0; i < values.length; i++) {
            weighted[i] = certainty[i] > 0 ? certainty[i] * values[i] : 0;
        }
        float[] weight = certainty.clone();
        PlaneBlur.gaussian(weighted, width, height, sigmaPixels);
        PlaneBlur.gaussian(weight, width, height, sigmaPixels);
        float limit = (float) Math.max(least, 1e-6);
        for (int i = 0; i < weighted.length; i++) {
            weighted[i] = weight[i] > limit ? weighted[i] / weight[i] : Float.NaN;
        }
        return weighted;
    }
}
