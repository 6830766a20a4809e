package hemline.numerics;

/**
 * Gaussian derivatives of a profile across a line: how strong a bright line is at a scale, and where its centre lies
 * between samples.
 *
 * <p>Strength is scale-normalised, {@code −t^γ f″} with {@code t = σ²} and γ = 3/4, so that a line of Gaussian profile of
 * variance t₀ answers most at t = t₀ (Lindeberg 1998, Edge detection and ridge detection with automatic scale
 * selection, IJCV 30:117–154, section 4). The centre is that of Steger (1998, An unbiased detector of curvilinear
 * structures, IEEE PAMI 20:113–125, eq. 11 in one dimension): {@code −f′/f″}.
 */
public final class LineProfile {
    /** Lindeberg's exponent for ridges. */
    public static final double GAMMA = 0.75;

    private LineProfile() {
    }

    /**
     * Derivatives of a sampled profile smoothed by a Gaussian.
     *
     * @param profile values; NaN counts as unknown and is left out of the sums
     * @param at      index of the sample looked at
     * @param sigma   standard deviation in samples, above 0
     * @param order   0, 1 or 2
     * @return the derivative per sample^order; NaN when less than half of the kernel's weight is known
     */
    public static double derivative(double[] profile, int at, double sigma, int order) {
        if (!(sigma > 0)) {
            throw new IllegalArgumentException("the scale must be above 0, got " + sigma);
        }
        if (order < 0 || order > 2) {
            throw new IllegalArgumentException("the order must be 0, 1 or 2, got " + order);
        }
        int reach = (int) Math.ceil(4.5 * sigma);
        double known = 0;
        double mean = 0;
        double total = 0;
        for (int k = -reach; k <= reach; k++) {
            double g = Math.exp(-0.5 * k * k / (sigma * sigma));
            total += g;
            int i = at + k;
            if (i >= 0 && i < profile.length && !Double.isNaN(profile[i])) {
                known += g;
                mean += g * profile[i];
            }
        }
        if (known < 0.5 * total) {
            return Double.NaN;
        }
        mean /= known;
        if (order == 0) {
            return mean;
        }
        double sum = 0;
        for (int k = -reach; k <= reach; k++) {
            int i = at + k;
            if (i >= 0 && i < profile.length && !Double.isNaN(profile[i])) {
                double g = Math.exp(-0.5 * k * k / (sigma * sigma)) / (sigma * Math.sqrt(2 * Math.PI));
                double kernel = order == 1 ? k / (sigma * sigma) * g
                        : (k * k / (sigma * sigma) - 1) / (sigma * sigma) * g;
                // about the mean, so that unknown samples pull toward nothing
                sum += kernel * (profile[i] - mean);
            }
        }
        return sum;
    }

    /** Strength of a bright line at a scale, scale-normalised; negative in a valley, NaN when unknown. */
    public static double strength(double[] profile, int at, double sigma) {
        return -Math.pow(sigma * sigma, GAMMA) * derivative(profile, at, sigma, 2);
    }

    /**
     * Distance in samples from a sample to the centre of the line about it.
     *
     * @return NaN where there is no bright line or the centre is more than half a sample off
     */
    public static double centreOffset(double[] profile, int at, double sigma) {
        double slope = derivative(profile, at, sigma, 1);
        double bend = derivative(profile, at, sigma, 2);
        double offset = -slope / bend;
        return bend < 0 && Math.abs(offset) <= 0.5 + 1e-9 ? offset : Double.NaN;
    }
}
