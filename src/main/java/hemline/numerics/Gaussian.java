package hemline.numerics;

/**
 * A Gaussian state: mean and covariance. Both arrays are handed over and must not be changed afterwards.
 *
 * @param mean       {@code [n]}
 * @param covariance {@code [n][n]}, symmetric
 */
public record Gaussian(double[] mean, double[][] covariance) {
    public Gaussian {
        if (covariance.length != mean.length) {
            throw new IllegalArgumentException("mean has " + mean.length + " values, covariance "
                    + covariance.length + " rows");
        }
        for (double[] row : covariance) {
            if (row.length != mean.length) {
                throw new IllegalArgumentException("covariance must be square with " + mean.length
                        + " columns, a row has " + row.length);
            }
        }
    }

    public int size() {
        return mean.length;
    }
}
