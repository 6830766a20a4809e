package hemline.numerics;

import org.ejml.simple.SimpleMatrix;

/**
 * The linear Kalman filter: one prediction, one update.
 *
 * <p>Kalman (1960), J. Basic Eng. 82:35–45. The covariance is updated in Joseph's form, which stays symmetric and
 * positive for any gain: Bucy and Joseph (1968), Filtering for Stochastic Processes with Applications to Guidance.
 * Symbols: {@code F} transition, {@code Q} its noise, {@code H} observation, {@code R} its noise.
 */
public final class KalmanFilter {
    private KalmanFilter() {
    }

    /** The state after a transition: mean {@code F x}, covariance {@code F P Fᵀ + Q}. */
    public static Gaussian predict(Gaussian state, double[][] transition, double[][] noise) {
        SimpleMatrix f = new SimpleMatrix(transition);
        SimpleMatrix p = f.mult(new SimpleMatrix(state.covariance())).mult(f.transpose()).plus(new SimpleMatrix(noise));
        return gaussian(f.mult(column(state.mean())), p);
    }

    /**
     * The state after an observation {@code z = H x + noise}.
     *
     * @param observation {@code [m][n]}
     * @param noise       {@code [m][m]}, positive definite together with {@code H P Hᵀ}
     * @param observed    {@code [m]}
     */
    public static Update update(Gaussian state, double[][] observation, double[][] noise, double[] observed) {
        SimpleMatrix h = new SimpleMatrix(observation);
        SimpleMatrix r = new SimpleMatrix(noise);
        SimpleMatrix p = new SimpleMatrix(state.covariance());
        SimpleMatrix x = column(state.mean());
        SimpleMatrix innovation = column(observed).minus(h.mult(x));
        SimpleMatrix s = h.mult(p).mult(h.transpose()).plus(r);
        SimpleMatrix inverse = s.invert();
        SimpleMatrix gain = p.mult(h.transpose()).mult(inverse);
        SimpleMatrix keep = SimpleMatrix.identity(state.size()).minus(gain.mult(h));
        SimpleMatrix joseph = keep.mult(p).mult(keep.transpose()).plus(gain.mult(r).mult(gain.transpose()));
        double nis = innovation.transpose().mult(inverse).mult(innovation).get(0, 0);
        double logLikelihood = -0.5 * (observed.length * Math.log(2 * Math.PI) + Math.log(s.determinant()) + nis);
        return new Update(gaussian(x.plus(gain.mult(innovation)), joseph), nis, logLikelihood);
    }

    /**
     * @param state         after the observation
     * @param nis           normalised innovation squared, {@code νᵀ S⁻¹ ν}: chi-squared with {@code m} degrees of
     *                      freedom when the model holds
     * @param logLikelihood of the observation given all before it
     */
    public record Update(Gaussian state, double nis, double logLikelihood) {
    }

    static SimpleMatrix column(double[] values) {
        return new SimpleMatrix(values.length, 1, true, values);
    }

    static Gaussian gaussian(SimpleMatrix mean, SimpleMatrix covariance) {
        int n = mean.getNumRows();
        double[] x = new double[n];
        double[][] p = new double[n][n];
        for (int i = 0; i < n; i++) {
            x[i] = mean.get(i, 0);
            for (int j = 0; j < n; j++) {
                p[i][j] = 0.5 * (covariance.get(i, j) + covariance.get(j, i));
            }
        }
        return new Gaussian(x, p);
    }
}
