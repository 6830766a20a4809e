package hemline.detection;

import hemline.numerics.LineProfile;
import hemline.numerics.Robust;

/**
 * Moves the vertices of a curve onto the line or step of the sweep itself, to a fraction of a pixel: the strongest
 * bright line of some width across (or, where there is none, the steepest rise toward the side ahead), near the crest
 * of the evidence, agreed with the neighbours along the curve.
 */
final class CurveCentre {
    private static final double[] SCALES_KM = {0.6, 0.9, 1.3};
    private static final LineProfile[] SCALES = new LineProfile[SCALES_KM.length];
    /** The scale at which steps are located. */
    private static final int STEP_SCALE = 1;
    private static final double SEARCH_KM = 1.6;
    /** Offsets beyond this are seldom right: weight of a Gaussian prior, km. */
    private static final double PRIOR_KM = 1.2;
    private static final double LEAST_LINE = 0.8;
    private static final double AGREE_KM = 0.5;
    private static final double ALONG_KM = 2;

    static {
        for (int k = 0; k < SCALES.length; k++) {
            SCALES[k] = new LineProfile(SCALES_KM[k] / CurveProfiles.STEP_KM);
        }
    }

    private CurveCentre() {
    }

    static TracedCurve refined(TracedCurve curve, CurveProfiles profiles) {
        int n = curve.size();
        double[] offset = new double[n];
        double[] weight = new double[n];
        for (int i = 0; i < n; i++) {
            locate(profiles.dbz[i], i, offset, weight);
        }
        double[] agreed = agree(offset, weight);
        double[] x = new double[n];
        double[] y = new double[n];
        for (int i = 0; i < n; i++) {
            x[i] = curve.x()[i] + agreed[i] * curve.normalX()[i];
            y[i] = curve.y()[i] + agreed[i] * curve.normalY()[i];
        }
        return new TracedCurve(x, y, curve.normalX(), curve.normalY(), curve.speedMs(), curve.evidence())
                .smoothed();
    }

    private static void locate(double[] profile, int i, double[] offset, double[] weight) {
        double best = 0;
        int at = -1;
        LineProfile scale = null;
        int reach = (int) (SEARCH_KM / CurveProfiles.STEP_KM);
        for (LineProfile one : SCALES) {
            for (int q = CurveProfiles.MIDDLE - reach; q <= CurveProfiles.MIDDLE + reach; q++) {
                double strength = one.strength(profile, q) * prior(q);
                if (strength > best) {
                    best = strength;
                    at = q;
                    scale = one;
                }
            }
        }
        if (scale != null && best > LEAST_LINE) {
            double fine = scale.centreOffset(profile, at);
            offset[i] = (at - CurveProfiles.MIDDLE + (Double.isNaN(fine) ? 0 : fine)) * CurveProfiles.STEP_KM;
            weight[i] = best;
            return;
        }
        double steepest = 0;
        for (int q = CurveProfiles.MIDDLE - reach; q <= CurveProfiles.MIDDLE + reach; q++) {
            double slope = SCALES_KM[STEP_SCALE] / CurveProfiles.STEP_KM * SCALES[STEP_SCALE].slope(profile, q)
                    * prior(q);
            if (slope > steepest) {
                steepest = slope;
                offset[i] = (q - CurveProfiles.MIDDLE) * CurveProfiles.STEP_KM;
                weight[i] = 0.5 * slope;
            }
        }
    }

    private static double prior(int q) {
        double off = (q - CurveProfiles.MIDDLE) * CurveProfiles.STEP_KM;
        return Math.exp(-0.5 * off * off / (PRIOR_KM * PRIOR_KM));
    }

    /** Weighted mean along the curve of what agrees with the running median. */
    private static double[] agree(double[] offset, double[] weight) {
        int n = offset.length;
        double[] agreed = new double[n];
        for (int i = 0; i < n; i++) {
            int from = Math.max(0, i - 3);
            int to = Math.min(n - 1, i + 3);
            double[] near = new double[to - from + 1];
            for (int j = from; j <= to; j++) {
                near[j - from] = weight[j] > 0 ? offset[j] : Double.NaN;
            }
            double middle = Robust.median(near);
            if (Double.isNaN(middle)) {
                continue;
            }
            double sum = 0;
            double total = 1e-9;
            int reach = (int) Math.ceil(2.5 * ALONG_KM);
            for (int j = Math.max(0, i - reach); j <= Math.min(n - 1, i + reach); j++) {
                double g = weight[j] * Math.exp(-0.5 * (i - j) * (i - j) / (ALONG_KM * ALONG_KM))
                        * Robust.cauchy(offset[j] - middle, AGREE_KM);
                sum += g * offset[j];
                total += g;
            }
            agreed[i] = sum / total;
        }
        return agreed;
    }
}
