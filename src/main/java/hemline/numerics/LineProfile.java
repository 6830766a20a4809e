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
    private static final double REACH = 4.5;

    private final double sigma;
    private final int reach;
    /** Gaussian and its first two derivatives at −reach…reach, turned about so that they are summed, not convolved. */
    private final double[] smooth;
    private final double[] first;
    private final double[] second;
    private final double total;

    /** @param sigma standard deviation in samples, above 0 */
    public LineProfile(double sigma) {
        if (!(sigma > 0)) {
            throw new IllegalArgumentException("the scale must be above 0, got " + sigma);
        }
        this.sigma = sigma;
        reach = (int) Math.ceil(REACH * sigma);
        smooth = new double[2 * reach + 1];
        first = new double[smooth.length];
        second = new double[smooth.length];
        double sum = 0;
        for (int k = -reach; k <= reach; k++) {
            double g = Math.exp(-0.5 * k * k / (sigma * sigma)) / (sigma * Math.sqrt(2 * Math.PI));
            smooth[k + reach] = g;
            first[k + reach] = k / (sigma * sigma) * g;
            second[k + reach] = (k * k / (sigma * sigma) - 1) / (sigma * sigma) * g;
            sum += g;
        }
        total = sum;
    }

    /**
     * Mean of the profile about a sample; NaN when less than half of the kernel's weight is known. Unknown samples (NaN)
     * are left out.
     */
    public double mean(double[] profile, int at) {
        double sum = 0;
        double known = 0;
        int from = Math.max(0, at - reach);
        int to = Math.min(profile.length - 1, at + reach);
        for (int i = from; i <= to; i++) {
            double value = profile[i];
            if (!Double.isNaN(value)) {
                sum += smooth[i - at + reach] * value;
                known += smooth[i - at + reach];
            }
        }
        return known < 0.5 * total ? Double.NaN : sum / known;
    }

    /** First derivative per sample; NaN when less than half of the kernel's weight is known. */
    public double slope(double[] profile, int at) {
        return about(profile, at, first);
    }

    /** Second derivative per sample squared; NaN when less than half of the kernel's weight is known. */
    public double bend(double[] profile, int at) {
        return about(profile, at, second);
    }

    /** The sum is taken about the mean, so that unknown samples pull toward nothing. */
    private double about(double[] profile, int at, double[] kernel) {
        double mean = mean(profile, at);
        double sum = 0;
        int from = Math.max(0, at - reach);
        int to = Math.min(profile.length - 1, at + reach);
        for (int i = from; i <= to; i++) {
            double value = profile[i];
            if (!Double.isNaN(value)) {
                sum += kernel[i - at + reach] * (value - mean);
            }
        }
        return Double.isNaN(mean) ? Double.NaN : sum;
    }

    /** Strength of a bright line, scale-normalised; negative in a valley, NaN when unknown. */
    public double strength(double[] profile, int at) {
        return -Math.pow(sigma * sigma, GAMMA) * bend(profile, at);
    }

    /**
     * Distance in samples from a sample to the centre of the line about it.
     *
     * @return NaN where there is no bright line or the centre is more than half a sample off
     */
    public double centreOffset(double[] profile, int at) {
        double bend = bend(profile, at);
        double offset = -slope(profile, at) / bend;
        return bend < 0 && Math.abs(offset) <= 0.5 + 1e-9 ? offset : Double.NaN;
    }
}
