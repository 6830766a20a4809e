package hemline.geometry;

/**
 * An arc through time: {@code ρ(t, φ) = R(t) [1 + Σ (aₘ cos mφ + bₘ sin mφ)]}, m = 2, 3, 4, about a centre that
 * drifts, with {@code R(t) = R₀ + R₁ τ + ½ R₂ τ²}. Time {@code τ} is in 1000 s, so that km per 1000 s is m s⁻¹.
 *
 * @param parameters {@code x₀, y₀, u, v, R₀, R₁, R₂, a₂, b₂, a₃, b₃, a₄, b₄}: centre at τ = 0, km; its drift, m s⁻¹;
 *                   radius, km; its growth, m s⁻¹; the change of growth, m s⁻¹ per 1000 s; shape, without unit
 * @param covariance of the parameters, {@code [13][13]}
 * @param rmsKm      robust root mean square distance of the points, km
 * @param cost       robust cost at the minimum, priors included, in units of the noise variance
 */
public record GrowingArc(double[] parameters, double[][] covariance, double rmsKm, double cost) {
    static final int UNKNOWNS = 13;
    static final int HARMONICS = 3;

    /** Centre at a time, km. */
    public Point centreAt(double tau) {
        return new Point(parameters[0] + parameters[2] * tau, parameters[1] + parameters[3] * tau);
    }

    /** Mean radius at a time, km. */
    public double radiusAtKm(double tau) {
        return parameters[4] + parameters[5] * tau + 0.5 * parameters[6] * tau * tau;
    }

    /** Standard deviation of the radius at a time, km. */
    public double radiusSdKm(double tau) {
        return sd(new double[] {1, tau, 0.5 * tau * tau});
    }

    /** Rate of growth at a time, m s⁻¹. */
    public double growthAtMs(double tau) {
        return parameters[5] + parameters[6] * tau;
    }

    /** Standard deviation of the rate of growth at a time, m s⁻¹. */
    public double growthSdMs(double tau) {
        return sd(new double[] {0, 1, tau});
    }

    private double sd(double[] row) {
        double variance = 0;
        for (int i = 0; i < 3; i++) {
            for (int j = 0; j < 3; j++) {
                variance += row[i] * row[j] * covariance[4 + i][4 + j];
            }
        }
        return Math.sqrt(Math.max(0, variance));
    }

    /** Signed distance of a place from the arc at a time, km, positive outside; measured along the radius. */
    public double offsetKm(double x, double y, double tau) {
        double dx = x - parameters[0] - parameters[2] * tau;
        double dy = y - parameters[1] - parameters[3] * tau;
        return Math.hypot(dx, dy) - radiusAtKm(tau) * shape(parameters, Math.atan2(dy, dx));
    }

    /** Speed of the arc along its radius at a place and time, m s⁻¹: drift along the radius plus growth. */
    public double radialSpeedMs(double x, double y, double tau) {
        double dx = x - parameters[0] - parameters[2] * tau;
        double dy = y - parameters[1] - parameters[3] * tau;
        double r = Math.max(1e-9, Math.hypot(dx, dy));
        return (dx * parameters[2] + dy * parameters[3]) / r
                + growthAtMs(tau) * shape(parameters, Math.atan2(dy, dx));
    }

    static double shape(double[] p, double angle) {
        double sum = 1;
        for (int m = 0; m < HARMONICS; m++) {
            sum += p[7 + 2 * m] * Math.cos((m + 2) * angle) + p[8 + 2 * m] * Math.sin((m + 2) * angle);
        }
        return sum;
    }
}
