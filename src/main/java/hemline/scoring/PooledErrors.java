package hemline.scoring;

import java.util.Arrays;
import java.util.List;

/**
 * Errors of many scenes. Sums are kept per scene, so that a bootstrap replicate costs a pass over the scenes, not over
 * the errors; quantiles of replicates are read from 1024 classes of about equal weight, those of the scenes themselves
 * from the errors.
 */
final class PooledErrors {
    private static final int CLASSES = 1024;

    private final double[] size;
    private final double[] weight;
    private final int scenes;
    private final double[] sceneWeight;
    private final double[] sceneError;
    private final double[] sceneSquare;
    private final double[] sceneStated;
    private final double[][] sceneWithin;
    /** {@code [class][scene]}: weight of all errors of the scene up to the end of the class. */
    private final double[][] upTo;
    /** Largest error of each class. */
    private final double[] classSize;

    /** {@code perScene.get(i)} are the errors of scene {@code i}. */
    PooledErrors(List<ErrorSamples> perScene) {
        scenes = perScene.size();
        sceneWeight = new double[scenes];
        sceneError = new double[scenes];
        sceneSquare = new double[scenes];
        sceneStated = new double[scenes];
        sceneWithin = new double[2][scenes];
        int n = perScene.stream().mapToInt(ErrorSamples::size).sum();
        double[][] rows = new double[n][];
        int k = 0;
        for (int s = 0; s < scenes; s++) {
            ErrorSamples samples = perScene.get(s);
            for (int i = 0; i < samples.size(); i++) {
                rows[k++] = new double[] {Math.abs(samples.error(i)), samples.weight(i), s};
                add(s, samples.error(i), samples.sd(i), samples.weight(i));
            }
        }
        Arrays.sort(rows, (a, b) -> Double.compare(a[0], b[0]));
        size = Arrays.stream(rows).mapToDouble(row -> row[0]).toArray();
        weight = Arrays.stream(rows).mapToDouble(row -> row[1]).toArray();
        int classes = Math.min(CLASSES, n);
        upTo = new double[classes][];
        classSize = new double[classes];
        double[] sum = new double[scenes];
        for (int c = 0, i = 0; c < classes; c++) {
            int end = (int) ((long) n * (c + 1) / classes);
            for (; i < end; i++) {
                sum[(int) rows[i][2]] += rows[i][1];
            }
            upTo[c] = sum.clone();
            classSize[c] = size[end - 1];
        }
    }

    private void add(int scene, double error, double sd, double w) {
        sceneWeight[scene] += w;
        sceneError[scene] += w * error;
        sceneSquare[scene] += w * error * error;
        if (!Double.isNaN(sd)) {
            sceneStated[scene] += w;
            sceneWithin[0][scene] += Math.abs(error) <= sd ? w : 0;
            sceneWithin[1][scene] += Math.abs(error) <= 2 * sd ? w : 0;
        }
    }

    private static double dot(double[] perScene, int[] times) {
        double sum = 0;
        for (int s = 0; s < times.length; s++) {
            sum += perScene[s] * times[s];
        }
        return sum;
    }

    /** Weighted mean of the signed errors, scene {@code s} taken {@code times[s]} times; NaN for none. */
    double bias(int[] times) {
        return dot(sceneError, times) / dot(sceneWeight, times);
    }

    /** Root of the weighted mean square; NaN for none. */
    double rmse(int[] times) {
        return Math.sqrt(dot(sceneSquare, times) / dot(sceneWeight, times));
    }

    /** The least size of error that at least a share {@code p} of the weight does not exceed; NaN for none. */
    double quantileAbs(double p, int[] times) {
        double total = dot(sceneWeight, times);
        if (!(total > 0)) {
            return Double.NaN;
        }
        double wanted = p * total * (1 - 1e-12);
        if (Arrays.stream(times).allMatch(t -> t == 1)) {
            double sum = 0;
            int i = 0;
            while (i < size.length - 1 && sum + weight[i] < wanted) {
                sum += weight[i++];
            }
            return size[i];
        }
        int low = 0;
        int high = upTo.length - 1;
        while (low < high) {
            int middle = (low + high) / 2;
            if (dot(upTo[middle], times) >= wanted) {
                high = middle;
            } else {
                low = middle + 1;
            }
        }
        return classSize[low];
    }

    /** Share of the weight whose error is within 1 or 2 stated standard deviations; NaN when none is stated. */
    double shareWithin(int sds, int[] times) {
        return dot(sceneWithin[sds - 1], times) / dot(sceneStated, times);
    }
}
