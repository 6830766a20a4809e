package hemline.scoring;

import java.util.Arrays;

/**
 * Signed errors with their stated standard deviations and weights.
 */
final class ErrorSamples {
    private final double[] error;
    private final double[] sd;
    private final double[] weight;

    private ErrorSamples(double[] error, double[] sd, double[] weight) {
        this.error = error;
        this.sd = sd;
        this.weight = weight;
    }

    int size() {
        return error.length;
    }

    double error(int i) {
        return error[i];
    }

    /** NaN when none was stated. */
    double sd(int i) {
        return sd[i];
    }

    double weight(int i) {
        return weight[i];
    }

    /** Collects samples one by one. */
    static final class Collector {
        private double[] error = new double[64];
        private double[] sd = new double[64];
        private double[] weight = new double[64];
        private int size;

        void add(double sampleError, double statedSd, double sampleWeight) {
            if (size == error.length) {
                error = Arrays.copyOf(error, 2 * size);
                sd = Arrays.copyOf(sd, 2 * size);
                weight = Arrays.copyOf(weight, 2 * size);
            }
            error[size] = sampleError;
            sd[size] = statedSd;
            weight[size++] = sampleWeight;
        }

        ErrorSamples collected() {
            return new ErrorSamples(Arrays.copyOf(error, size), Arrays.copyOf(sd, size), Arrays.copyOf(weight, size));
        }
    }
}
