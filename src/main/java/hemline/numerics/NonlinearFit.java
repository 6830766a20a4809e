package hemline.numerics;

import java.util.Optional;
import org.apache.commons.math3.exception.ConvergenceException;
import org.apache.commons.math3.exception.TooManyEvaluationsException;
import org.apache.commons.math3.exception.TooManyIterationsException;
import org.apache.commons.math3.fitting.leastsquares.LeastSquaresBuilder;
import org.apache.commons.math3.fitting.leastsquares.LeastSquaresOptimizer;
import org.apache.commons.math3.fitting.leastsquares.LevenbergMarquardtOptimizer;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.RealMatrix;
import org.apache.commons.math3.linear.SingularMatrixException;
import org.apache.commons.math3.util.Pair;

/**
 * Nonlinear least squares by Levenberg and Marquardt (Moré 1978, Lecture Notes in Mathematics 630:105–116), as
 * implemented by Apache Commons Math.
 *
 * @param parameters       {@code [p]}
 * @param covariance       {@code [p][p]}, with the residual variance of {@code n − p} degrees of freedom
 * @param sumOfSquares     of the residuals
 * @param degreesOfFreedom {@code n − p}
 */
public record NonlinearFit(double[] parameters, double[][] covariance, double sumOfSquares, int degreesOfFreedom) {

    /** A model of residuals. */
    public interface Residuals {
        /**
         * @param at       {@code [p]} parameters
         * @param residual {@code [n]} receives model less observation
         * @param jacobian {@code [n][p]} receives its derivatives
         */
        void evaluate(double[] at, double[] residual, double[][] jacobian);
    }

    /**
     * Minimises the sum of squared residuals.
     *
     * @param start        {@code [p]}
     * @param observations {@code n}, at least {@code p}
     * @return empty if the minimum is not found or does not determine the parameters
     */
    public static Optional<NonlinearFit> of(double[] start, int observations, Residuals model) {
        int p = start.length;
        if (observations < p) {
            throw new IllegalArgumentException("need at least as many observations as unknowns: " + observations
                    + " for " + p);
        }
        try {
            LeastSquaresOptimizer.Optimum optimum = new LevenbergMarquardtOptimizer()
                    .withCostRelativeTolerance(1e-14).withParameterRelativeTolerance(1e-12)
                    .optimize(new LeastSquaresBuilder().start(start).target(new double[observations])
                            .lazyEvaluation(false).maxEvaluations(2000).maxIterations(1000)
                            .model(point -> {
                                double[] residual = new double[observations];
                                double[][] jacobian = new double[observations][p];
                                model.evaluate(point.toArray(), residual, jacobian);
                                return new Pair<>(new ArrayRealVector(residual, false),
                                        (RealMatrix) new Array2DRowRealMatrix(jacobian, false));
                            }).build());
            double rss = optimum.getCost() * optimum.getCost();
            int free = observations - p;
            double[][] covariance = optimum.getCovariances(1e-18).scalarMultiply(free > 0 ? rss / free : Double.NaN)
                    .getData();
            return Optional.of(new NonlinearFit(optimum.getPoint().toArray(), covariance, rss, free));
        } catch (TooManyEvaluationsException | TooManyIterationsException | ConvergenceException
                | SingularMatrixException noMinimum) {
            return Optional.empty();
        }
    }
}
