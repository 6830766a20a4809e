package hemline.numerics;

import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.QRDecomposition;
import org.apache.commons.math3.linear.RealMatrix;

/**
 * Ordinary linear least squares by Householder QR, columns scaled to unit length first.
 *
 * @param coefficients {@code [p]}
 * @param covariance   {@code [p][p]}, with the residual variance of {@code n − p} degrees of freedom
 * @param residualSd   residual standard deviation; NaN without degrees of freedom
 * @param rSquared     share of the variance about the mean that is explained
 */
public record LinearFit(double[] coefficients, double[][] covariance, double residualSd, double rSquared) {

    /**
     * @param design {@code [n][p]}, with a column of ones if an intercept is wanted
     * @param y      {@code [n]}
     * @throws IllegalArgumentException with fewer observations than unknowns or dependent columns
     */
    public static LinearFit of(double[][] design, double[] y) {
        int n = y.length;
        int p = n == 0 ? 0 : design[0].length;
        if (p == 0 || n < p || design.length != n) {
            throw new IllegalArgumentException("need at least as many observations as unknowns: " + n + " for " + p);
        }
        double[] scale = new double[p];
        for (double[] row : design) {
            for (int j = 0; j < p; j++) {
                scale[j] = Math.hypot(scale[j], row[j]);
            }
        }
        RealMatrix scaled = new Array2DRowRealMatrix(n, p);
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < p; j++) {
                scaled.setEntry(i, j, design[i][j] / scale[j]);
            }
        }
        QRDecomposition qr = new QRDecomposition(scaled, 1e-13);
        if (!qr.getSolver().isNonSingular()) {
            throw new IllegalArgumentException("the columns of the design depend on each other");
        }
        double[] solved = qr.getSolver().solve(new ArrayRealVector(y, false)).toArray();
        double rss = 0;
        double mean = 0;
        for (double value : y) {
            mean += value / n;
        }
        double tss = 0;
        for (int i = 0; i < n; i++) {
            double fitted = 0;
            for (int j = 0; j < p; j++) {
                fitted += scaled.getEntry(i, j) * solved[j];
            }
            rss += (y[i] - fitted) * (y[i] - fitted);
            tss += (y[i] - mean) * (y[i] - mean);
        }
        double variance = n > p ? rss / (n - p) : Double.NaN;
        RealMatrix r = qr.getR().getSubMatrix(0, p - 1, 0, p - 1);
        RealMatrix inverse = new QRDecomposition(r).getSolver().getInverse();
        RealMatrix cofactor = inverse.multiply(inverse.transpose());
        double[] coefficients = new double[p];
        double[][] covariance = new double[p][p];
        for (int j = 0; j < p; j++) {
            coefficients[j] = solved[j] / scale[j];
            for (int k = 0; k < p; k++) {
                covariance[j][k] = variance * cofactor.getEntry(j, k) / (scale[j] * scale[k]);
            }
        }
        return new LinearFit(coefficients, covariance, Math.sqrt(variance), 1 - rss / tss);
    }

    /** Standard error of coefficient {@code index}. */
    public double standardError(int index) {
        return Math.sqrt(covariance[index][index]);
    }
}
