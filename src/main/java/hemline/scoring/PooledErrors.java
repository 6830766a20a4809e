package hemline.scoring;

import java.util.List;
import java.util.stream.IntStream;

/** Errors of many scenes, sorted once by size, so that a bootstrap replicate costs one pass. */
final class PooledErrors {
    private final double[] error;
    private final double[] sd;
    private final double[] weight;
    private final int[] scene;

    /** {@code perScene[i]} are the errors of scene {@code i}. */
    PooledErrors(List<ErrorSamples> perScene) {
        int n = perScene.stream().mapToInt(ErrorSamples::size).sum();
        double[] rawError = new double[n];
        double[] rawSd = new double[n];
        double[] rawWeight = new double[n];
        int[] rawScene = new int[n];
        int k = 0;
        for (int s = 0; s < perScene.size(); s++) {
            ErrorSamples samples = perScene.get(s);
            for (int i = 0; i < samples.size(); i++, k++) {
                rawError[k] = samples.error(i);
                rawSd[k] = samples.sd(i);
                rawWeight[k] = samples.weight(i);
                rawScene[k] = s;
            }
        }
        int[] order = IntStream.range(0, n).boxed()
                .sorted((a, b) -> Double.compare(Math.abs(rawError[a]), Math.abs(rawError[b])))
                .mapToInt(Integer::intValue).toArray();
        error = IntStream.of(order).mapToDouble(i -> rawError[i]).toArray();
        sd = IntStream.of(order).mapToDouble(i -> rawSd[i]).toArray();
        weight = IntStream.of(order).mapToDouble(i -> rawWeight[i]).toArray();
        scene = IntStream.of(order).map(i -> rawScene[i]).toArray();
    }

    /** Weight of all, each scene taken {@code times[scene]} times. */
    double weight(int[] times) {
        double sum = 0;
        for (int i = 0; i < error.length; i++) {
            sum += weight[i] * times[scene[i]];
        }
        return sum;
    }

    /** Weighted mean of the signed errors; NaN for none. */
    double bias(int[] times) {
        double sum = 0;
        double total = 0;
        for (int i = 0; i < error.length; i++) {
            double w = weight[i] * times[scene[i]];
            sum += w * error[i];
            total += w;
        }
        return sum / total;
    }

    /** Root of the weighted mean square; NaN for none. */
    double rmse(int[] times) {
        double sum = 0;
        double total = 0;
        for (int i = 0; i < error.length; i++) {
            double w = weight[i] * times[scene[i]];
            sum += w * error[i] * error[i];
            total += w;
        }
        return Math.sqrt(sum / total);
    }

    /** The least size of error that at least a share {@code p} of the weight does not exceed; NaN for none. */
    double quantileAbs(double p, int[] times) {
        double wanted = p * weight(times) * (1 - 1e-12);
        double sum = 0;
        for (int i = 0; i < error.length; i++) {
            sum += weight[i] * times[scene[i]];
            if (sum >= wanted && sum > 0) {
                return Math.abs(error[i]);
            }
        }
        return Double.NaN;
    }

    /** Share of the weight whose error is within {@code k} stated standard deviations; NaN when none is stated. */
    double shareWithin(double k, int[] times) {
        double inside = 0;
        double total = 0;
        for (int i = 0; i < error.length; i++) {
            if (!Double.isNaN(sd[i])) {
                double w = weight[i] * times[scene[i]];
                total += w;
                inside += Math.abs(error[i]) <= k * sd[i] ? w : 0;
            }
        }
        return inside / total;
    }
}
