package hemline.numerics;

import java.util.Arrays;

/**
 * Weighted linear least squares of few unknowns by accumulated normal equations, for inner loops: no allocation per
 * observation. Columns should be scaled to like sizes; for ill-conditioned designs use {@link LinearFit}.
 */
public final class NormalEquations {
    private final int n;
    private final double[] a;
    private final double[] b;
    private final double[] work;

    public NormalEquations(int unknowns) {
        n = unknowns;
        a = new double[n * n];
        b = new double[n];
        work = new double[n * n];
    }

    public void clear() {
        Arrays.fill(a, 0);
        Arrays.fill(b, 0);
    }

    /** Adds the observation {@code row · x = value} with a weight (inverse variance). */
    public void add(double[] row, double value, double weight) {
        for (int i = 0; i < n; i++) {
            double wi = weight * row[i];
            if (wi != 0) {
                for (int j = i; j < n; j++) {
                    a[i * n + j] += wi * row[j];
                }
                b[i] += wi * value;
            }
        }
    }

    /** Adds a prior {@code x[index] = mean} with a precision (inverse variance). */
    public void prior(int index, double mean, double precision) {
        a[index * n + index] += precision;
        b[index] += precision * mean;
    }

    /**
     * Solves for the unknowns.
     *
     * @param into       {@code [n]} receives the solution
     * @param covariance {@code [n][n]} receives the inverse of the normal matrix; may be null
     * @return false, with nothing written, if the equations do not determine all unknowns
     */
    public boolean solve(double[] into, double[][] covariance) {
        double largest = 0;
        for (int i = 0; i < n; i++) {
            largest = Math.max(largest, a[i * n + i]);
        }
        // Cholesky: lower triangle of work.
        for (int i = 0; i < n; i++) {
            for (int j = 0; j <= i; j++) {
                double sum = a[j * n + i];
                for (int k = 0; k < j; k++) {
                    sum -= work[i * n + k] * work[j * n + k];
                }
                if (i == j) {
                    if (!(sum > 1e-12 * Math.max(a[i * n + i], 1e-12 * largest))) {
                        return false;
                    }
                    work[i * n + i] = Math.sqrt(sum);
                } else {
                    work[i * n + j] = sum / work[j * n + j];
                }
            }
        }
        substitute(b, into);
        if (covariance != null) {
            double[] unit = new double[n];
            double[] column = new double[n];
            for (int c = 0; c < n; c++) {
                Arrays.fill(unit, 0);
                unit[c] = 1;
                substitute(unit, column);
                for (int r = 0; r < n; r++) {
                    covariance[r][c] = column[r];
                }
            }
        }
        return true;
    }

    private void substitute(double[] right, double[] into) {
        for (int i = 0; i < n; i++) {
            double sum = right[i];
            for (int k = 0; k < i; k++) {
                sum -= work[i * n + k] * into[k];
            }
            into[i] = sum / work[i * n + i];
        }
        for (int i = n - 1; i >= 0; i--) {
            double sum = into[i];
            for (int k = i + 1; k < n; k++) {
                sum -= work[k * n + i] * into[k];
            }
            into[i] = sum / work[i * n + i];
        }
    }
}
