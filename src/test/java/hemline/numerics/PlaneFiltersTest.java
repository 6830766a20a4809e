package hemline.numerics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.LongRange;
import org.junit.jupiter.api.Test;

class PlaneFiltersTest {

    @Property(tries = 20)
    void normalisedConvolutionOfAMaskedConstantIsThatConstant(@ForAll @DoubleRange(min = -30, max = 60) double constant,
                                                              @ForAll @DoubleRange(min = 0.4, max = 9) double sigma,
                                                              @ForAll @LongRange(min = 1, max = 1000) long seed) {
        Random random = new Random(seed);
        int width = 41;
        int height = 30;
        float[] values = new float[width * height];
        float[] certainty = new float[values.length];
        for (int i = 0; i < values.length; i++) {
            certainty[i] = random.nextInt(3) == 0 ? 0 : random.nextFloat();
            values[i] = certainty[i] == 0 ? Float.NaN : (float) constant;
        }
        float[] smooth = NormalisedConvolution.gaussian(values, certainty, width, height, sigma, 0.02);
        int known = 0;
        for (float one : smooth) {
            if (!Float.isNaN(one)) {
                known++;
                assertThat(one).isCloseTo((float) constant, within(2e-4f * (1 + (float) Math.abs(constant))));
            }
        }
        assertThat(known).isGreaterThan(values.length / 2);
    }

    @Test
    void whatNothingCertainReachesIsUnknown() {
        float[] certainty = new float[100];
        certainty[0] = 1;
        float[] smooth = NormalisedConvolution.gaussian(new float[100], certainty, 10, 10, 1, 0.01);
        assertThat(smooth[0]).isZero();
        assertThat(smooth[99]).isNaN();
    }

    /** Laws of a Gaussian: sum kept, variance that of the kernel, both for the sampled and for the box form. */
    @Test
    void blurKeepsTheSumAndSpreadsByItsVariance() {
        for (double sigma : new double[] {0.8, 2, 3, 6.5, 12}) {
            int width = 161;
            float[] plane = new float[width * width];
            plane[80 * width + 80] = 1;
            PlaneBlur.gaussian(plane, width, width, sigma);
            double sum = 0;
            double variance = 0;
            for (int y = 0; y < width; y++) {
                for (int x = 0; x < width; x++) {
                    sum += plane[y * width + x];
                    variance += plane[y * width + x] * (x - 80) * (x - 80);
                }
            }
            assertThat(sum).isCloseTo(1, within(1e-4));
            assertThat(Math.sqrt(variance)).isCloseTo(sigma, within(0.05 * sigma));
        }
    }

    @Test
    void distancesAreThoseOfTheNearestSetPixel() {
        int width = 37;
        int height = 23;
        boolean[] set = new boolean[width * height];
        Random random = new Random(7);
        for (int k = 0; k < 9; k++) {
            set[random.nextInt(set.length)] = true;
        }
        float[] distance = DistanceMap.of(set, width, height);
        for (int i = 0; i < set.length; i++) {
            double nearest = Double.POSITIVE_INFINITY;
            for (int j = 0; j < set.length; j++) {
                if (set[j]) {
                    nearest = Math.min(nearest, Math.hypot(i % width - j % width, i / width - j / width));
                }
            }
            assertThat((double) distance[i]).isCloseTo(nearest, within(1e-4));
        }
    }

    @Test
    void distancesFromNothingAreFar() {
        for (float one : DistanceMap.of(new boolean[12], 4, 3)) {
            assertThat(one).isGreaterThan(1e5f);
        }
    }

    @Test
    void slantedSumsAreThoseAddedOneByOne() {
        int width = 24;
        Random random = new Random(3);
        float[] plane = new float[width * width];
        for (int i = 0; i < plane.length; i++) {
            plane[i] = random.nextInt(10);
        }
        for (double slope : new double[] {-1, -0.41, 0, 0.2, 0.83, 1}) {
            float[] sums = new float[plane.length];
            new SlantedMean(width, slope).sum(plane, sums, 4);
            for (int y = 0; y < width; y++) {
                for (int x = 0; x < width; x++) {
                    float expected = 0;
                    for (int k = Math.max(0, y - 4); k <= Math.min(width - 1, y + 4); k++) {
                        int at = x + (int) Math.rint(slope * (k - 11.5)) - (int) Math.rint(slope * (y - 11.5));
                        expected += at >= 0 && at < width ? plane[k * width + at] : 0;
                    }
                    assertThat(sums[y * width + x]).isEqualTo(expected);
                }
            }
        }
    }

    @Test
    void wrongShapesAreRefusedWithTheirNumbers() {
        assertThatThrownBy(() -> PlaneBlur.gaussian(new float[5], 2, 3, 1)).hasMessageContaining("2 x 3");
        assertThatThrownBy(() -> new SlantedMean(10, 1.5)).hasMessageContaining("1.5");
        assertThatThrownBy(() -> DistanceMap.of(new boolean[5], 2, 3)).hasMessageContaining("2 x 3");
    }
}
