package hemline.simulation.random;

import java.util.Arrays;
import org.apache.commons.math3.random.RandomGenerator;
import org.apache.commons.math3.util.FastMath;

/**
 * Fluctuation of a measured echo, dB, when the logarithms of {@code M} independent samples are averaged.
 *
 * <p>One sample's power is exponentially distributed; its logarithm has mean −2.507 dB and standard deviation 5.570 dB,
 * so the mean of M has 5.570/√M (Marshall and Hitschfeld 1953, Can. J. Phys. 31:962-994). The bias is taken out, as a
 * receiver's calibration does. The distribution (skewed to low values) is tabulated from 2¹⁶ drawn means and then
 * brought to exactly these two moments.
 */
public final class Speckle {
    /** (10/ln 10) π/√6, dB. */
    public static final double ONE_SAMPLE_SD_DB = 10 / 2.302585092994046 * Math.PI / Math.sqrt(6);
    private static final int TABLE = 1 << 16;
    private final float[] sorted = new float[TABLE];

    public Speckle(int samples) {
        if (samples < 1) {
            throw new IllegalArgumentException("at least one independent sample is needed, got " + samples);
        }
        RandomGenerator random = new Streams(0).stream("speckle", samples, 0);
        double[] means = new double[TABLE];
        double sum = 0;
        double squares = 0;
        for (int i = 0; i < TABLE; i++) {
            double product = 0;
            for (int k = 0; k < samples; k++) {
                product += FastMath.log10(-FastMath.log(1 - random.nextDouble()));
            }
            means[i] = 10 * product / samples;
            sum += means[i];
            squares += means[i] * means[i];
        }
        double mean = sum / TABLE;
        double sd = Math.sqrt(squares / TABLE - mean * mean);
        double wanted = ONE_SAMPLE_SD_DB / Math.sqrt(samples);
        Arrays.sort(means);
        for (int i = 0; i < TABLE; i++) {
            sorted[i] = (float) ((means[i] - mean) / sd * wanted);
        }
    }

    /** One fluctuation, dB. */
    public double drawDb(RandomGenerator random) {
        double place = random.nextDouble() * (TABLE - 1);
        int below = (int) place;
        return sorted[below] + (place - below) * (sorted[below + 1] - sorted[below]);
    }
}
