package hemline.numerics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.junit.jupiter.api.Test;

class LineProfileTest {
    /** Samples a unit: fine enough that sums stand for integrals. */
    private static final int FINE = 40;
    private static final int MIDDLE = 40 * FINE;

    private static double[] sampled(java.util.function.DoubleUnaryOperator f) {
        double[] profile = new double[2 * MIDDLE + 1];
        for (int i = 0; i < profile.length; i++) {
            profile[i] = f.applyAsDouble((i - MIDDLE) / (double) FINE);
        }
        return profile;
    }

    /** Lindeberg 1998, IJCV 30:117: a Gaussian line of variance t0 answers most at t = 2γ t0 / (3 − 2γ), t0 for γ = 3/4. */
    @Test
    void aGaussianLineAnswersMostAtItsOwnScale() {
        double[] line = sampled(x -> Math.exp(-x * x / (2 * 4)));
        double best = 0;
        double bestT = 0;
        for (double t = 3.5; t <= 4.5; t += 0.0025) {
            double strength = new LineProfile(Math.sqrt(t) * FINE).strength(line, MIDDLE);
            if (strength > best) {
                best = strength;
                bestT = t;
            }
        }
        assertThat(bestT).isCloseTo(4, within(0.01));
    }

    /** Steger 1998, PAMI 20:113: a bar of half-width w answers most at σ = w/√3; for w = 2 there |f″| is 0.231270. */
    @Test
    void aBarAnswersMostAtItsHalfWidthOverTheRootOfThree() {
        // the bar's edge falls half way between two samples
        double[] bar = sampled(x -> Math.abs(x) < 2 + 0.25 / FINE ? 1 : 0);
        double best = 0;
        double bestSigma = 0;
        for (double sigma = 1.05; sigma <= 1.25; sigma += 0.0005) {
            double bend = -new LineProfile(sigma * FINE).bend(bar, MIDDLE) * FINE * FINE;
            if (bend > best) {
                best = bend;
                bestSigma = sigma;
            }
        }
        assertThat(bestSigma).isCloseTo(2 / Math.sqrt(3), within(0.015));
        assertThat(best).isCloseTo(0.231270, within(0.006));
    }

    /** Var f″ of the plane operator on white noise, σ 2 and unit pixels: 3/(16πσ⁶) = 9.32548e-4 (integral of the kernel). */
    @Test
    void theOperatorsNoiseIsThatOfItsKernel() {
        double sigma = 2;
        double sum = 0;
        double[] impulse = new double[121];
        impulse[60] = 1;
        for (int at = 40; at <= 80; at++) {
            double second = new LineProfile(sigma).bend(impulse, at)
                    + meanPart(impulse, at, sigma);
            sum += second * second;
        }
        // across the line: sum of the smoothing kernel's squares is 1/(2σ√π)
        double plane = sum / (2 * sigma * Math.sqrt(Math.PI));
        assertThat(plane).isCloseTo(9.32548e-4, within(2e-6));
    }

    /** The derivative is taken about the kernel's mean; on a lone impulse that adds a multiple of the kernel's sum. */
    private static double meanPart(double[] profile, int at, double sigma) {
        double mean = new LineProfile(sigma).mean(profile, at);
        double kernel = 0;
        int reach = (int) Math.ceil(4.5 * sigma);
        for (int k = -reach; k <= reach; k++) {
            double g = Math.exp(-0.5 * k * k / (sigma * sigma)) / (sigma * Math.sqrt(2 * Math.PI));
            kernel += (k * k / (sigma * sigma) - 1) / (sigma * sigma) * g;
        }
        return mean * kernel;
    }

    @Test
    void theCentreIsFoundBetweenSamples() {
        Random random = new Random(5);
        for (int k = 0; k < 50; k++) {
            double centre = 0.9 * random.nextDouble() - 0.45;
            double[] profile = new double[61];
            for (int i = 0; i < profile.length; i++) {
                profile[i] = 3 + 8 * Math.exp(-(i - 30 - centre) * (i - 30 - centre) / 8);
            }
            assertThat(new LineProfile(2).centreOffset(profile, 30)).isCloseTo(centre, within(0.03));
        }
    }

    @Test
    void valleysAndFlatsHaveNoCentre() {
        double[] valley = new double[61];
        for (int i = 0; i < valley.length; i++) {
            valley[i] = (i - 30) * (i - 30);
        }
        assertThat(new LineProfile(2).centreOffset(valley, 30)).isNaN();
        assertThat(new LineProfile(2).centreOffset(new double[61], 30)).isNaN();
    }

    @Test
    void unknownSamplesAreLeftOut() {
        double[] profile = new double[61];
        java.util.Arrays.fill(profile, 5);
        java.util.Arrays.fill(profile, 33, 36, Double.NaN);
        assertThat(new LineProfile(2).mean(profile, 30)).isCloseTo(5, within(1e-12));
        assertThat(new LineProfile(2).slope(profile, 30)).isCloseTo(0, within(1e-12));
        java.util.Arrays.fill(profile, Double.NaN);
        assertThat(new LineProfile(2).mean(profile, 30)).isNaN();
    }
}
