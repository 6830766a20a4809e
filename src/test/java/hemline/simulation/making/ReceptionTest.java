package hemline.simulation.making;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import hemline.simulation.radar.RadarSpec;
import hemline.simulation.scene.FaultSpec;
import hemline.sweep.Field;
import hemline.sweep.Sweep;
import java.util.List;
import org.apache.commons.math3.stat.descriptive.SummaryStatistics;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class ReceptionTest {

    /** Marshall and Hitschfeld (1953), Can. J. Phys. 31:962-994: 5.57/√M dB, here in the dBZ of a whole even sweep. */
    @ParameterizedTest
    @ValueSource(ints = {4, 16})
    void anEvenStrongEchoFluctuatesByTheSpeckleOfItsSamples(int samples) {
        RadarSpec radar = SmallScenes.radar(samples, 80);
        Sweep sweep = SmallScenes.received(SmallScenes.scene(SmallScenes.air(30, 50), List.of(), List.of(), List.of()), radar);
        SummaryStatistics dbz = new SummaryStatistics();
        for (int r = 0; r < sweep.rayCount(); r++) {
            for (int g = 4; g < sweep.gateCount(); g++) {
                dbz.addValue(sweep.reflectivity().at(r, g));
            }
        }
        double expected = 5.57 / Math.sqrt(samples);
        assertThat(dbz.getStandardDeviation()).isCloseTo(expected, within(0.03 * expected));
        // The lower rim of the beam is in the ground: up to 0.1 dB less than the air holds.
        assertThat(dbz.getMean()).isCloseTo(29.9, within(0.15));
    }

    /** Noise power is the same in all gates, so the reflectivity that equals it rises as 20 log r (radar equation). */
    @Test
    void theLeastReportedEchoRisesByTwentyLogRange() {
        RadarSpec radar = SmallScenes.radar(16, 200);
        Sweep sweep = SmallScenes.received(
                SmallScenes.scene(SmallScenes.air(SmallScenes.NO_AIR, 1), List.of(), List.of(), List.of()), radar);
        int reported = 0;
        for (int g = 10; g < sweep.gateCount(); g++) {
            double least = -42 + 1.5 + 20 * Math.log10(sweep.slantRangeM(g) / 1000);
            for (int r = 0; r < sweep.rayCount(); r++) {
                float value = sweep.reflectivity().at(r, g);
                if (Field.isEcho(value)) {
                    reported++;
                    assertThat((double) value).isBetween(least - 0.006, least + 6);
                } else {
                    assertThat(value).isEqualTo(Field.BELOW_DETECTION);
                }
            }
        }
        assertThat(reported / (180.0 * 190)).as("share of noise gates over the threshold").isBetween(0.0005, 0.06);
    }

    @Test
    void spikesHaveEvenPowerAndLostRaysAreNotMeasured() {
        RadarSpec radar = SmallScenes.radar(40, 160);
        Sweep sweep = SmallScenes.received(SmallScenes.scene(SmallScenes.air(SmallScenes.NO_AIR, 1), List.of(), List.of(),
                List.of(new FaultSpec.SunStrobe(90, 0, 12, -1e9, 1e9), new FaultSpec.LostRays(0.05))), radar);
        int lost = 0;
        int sunny = sweep.rays().nearestRay(90);
        SummaryStatistics overNoise = new SummaryStatistics();
        for (int r = 0; r < sweep.rayCount(); r++) {
            if (Float.isNaN(sweep.reflectivity().at(r, 0))) {
                lost++;
            } else if (r == sunny) {
                for (int g = 20; g < sweep.gateCount(); g++) {
                    overNoise.addValue(sweep.reflectivity().at(r, g) - 20 * Math.log10(sweep.slantRangeM(g) / 1000));
                }
            }
        }
        assertThat(lost).isBetween(2, 40);
        assertThat(overNoise.getN()).as("the sunny ray was not lost").isPositive();
        assertThat(overNoise.getStandardDeviation()).isLessThan(1.3);
        assertThat(overNoise.getMean()).isBetween(-42 + 8.0, -42 + 12.5);
    }
}
