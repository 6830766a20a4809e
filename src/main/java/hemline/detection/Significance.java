package hemline.detection;

import java.util.Arrays;

/**
 * How many curves as good as one would be expected in a sweep by chance (Desolneux, Moisan and Morel 2000, Meaningful
 * alignments, IJCV 40:7–23): places to start from, times the background's tail at the curve's mean evidence to the power of
 * its independent strips. The background is the sweep's own stacked evidence, most of which is no boundary: the law of a
 * maximum (Gumbel) through its quartiles.
 */
final class Significance {
    /** Strips closer than this along the line see the same gates, km. */
    private static final double INDEPENDENT_KM = 7;
    private static final double PLACE_KM2 = 20;

    private final double mode;
    private final double scale;
    private final double places;

    Significance(EvidenceStack stack) {
        float[] known = new float[stack.evidence.length];
        int n = 0;
        for (float one : stack.evidence) {
            if (one != Float.NEGATIVE_INFINITY) {
                known[n++] = one;
            }
        }
        Arrays.sort(known, 0, n);
        double low = n == 0 ? 0 : known[n / 4];
        double high = n == 0 ? 1 : known[(int) (0.75 * n)];
        // quartiles of Gumbel's law: mode - scale ln(-ln p)
        double span = Math.log(Math.log(4)) - Math.log(Math.log(4.0 / 3));
        scale = Math.max(0.05, (high - low) / span);
        mode = low + scale * Math.log(Math.log(4));
        places = Math.max(1, n * stack.grid.spacingKm() * stack.grid.spacingKm() / PLACE_KM2);
    }

    /** log₁₀ of the curves expected by chance of at least this mean evidence and length. */
    double logExpectedFalse(double meanEvidence, double lengthKm) {
        double u = (meanEvidence - mode) / scale;
        // 1 - exp(-exp(-u)), kept from vanishing for large u
        double logTail = u > 20 ? -u / Math.log(10) : Math.log10(-Math.expm1(-Math.exp(-u)));
        return Math.log10(places) + Math.max(1, lengthKm / INDEPENDENT_KM) * logTail;
    }
}
