package hemline.simulation.random;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.apache.commons.math3.random.RandomGenerator;
import org.apache.commons.math3.stat.descriptive.SummaryStatistics;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class SpeckleTest {

    /** Marshall and Hitschfeld (1953), Can. J. Phys. 31:962-994: 5.57 dB for one logarithmic sample, over √M for M. */
    @ParameterizedTest
    @ValueSource(ints = {1, 8, 30})
    void standardDeviationIsThatOfLogDetectedSamples(int samples) {
        Speckle speckle = new Speckle(samples);
        RandomGenerator random = new Streams(5).stream("test");
        SummaryStatistics drawn = new SummaryStatistics();
        for (int i = 0; i < 40_000; i++) {
            drawn.addValue(speckle.drawDb(random));
        }
        double expected = 5.57 / Math.sqrt(samples);
        assertThat(drawn.getStandardDeviation()).isCloseTo(expected, within(0.03 * expected));
        assertThat(drawn.getMean()).isCloseTo(0, within(0.03 * expected));
    }
}
