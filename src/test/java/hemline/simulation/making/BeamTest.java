package hemline.simulation.making;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import hemline.geometry.Point;
import hemline.simulation.radar.RadarSpec;
import hemline.simulation.radar.RangeGrid;
import hemline.simulation.scene.FaultSpec;
import hemline.simulation.scene.Masts;
import java.util.List;
import org.junit.jupiter.api.Test;

class BeamTest {

    /** Doviak and Zrnić (1993), section 5.2: a Gaussian beam of half-power width θ has two-way variance θ²/(16 ln 2). */
    @Test
    void aPointEchoSpreadsOverAzimuthAsTheTwoWayBeamAndTheTurn() {
        RadarSpec radar = SmallScenes.radar(16, 90, 720);
        Masts mast = new Masts(List.of(Point.towards(120.3).times(40)), 40, 0, 1);
        CleanSweep clean = SmallScenes.clean(
                SmallScenes.scene(SmallScenes.air(SmallScenes.NO_AIR, 1), List.of(), List.of(mast), List.of()), radar);
        double sum = 0;
        double first = 0;
        double second = 0;
        int gate = (int) Math.rint((radar.beam().slantRangeM(40_000) - 250) / 500);
        for (int r = 0; r < clean.rays; r++) {
            double z = clean.total[r * clean.gates + gate];
            double off = clean.azimuthDeg(r) - 120.3;
            sum += z;
            first += z * off;
            second += z * off * off;
        }
        double beam = 1 / Math.sqrt(16 * Math.log(2));
        double mastDeg = Math.toDegrees(0.22 / 40);
        double expected = Math.sqrt(beam * beam + 0.5 * 0.5 / 12 + mastDeg * mastDeg);
        assertThat(first / sum).isCloseTo(0, within(0.06));
        assertThat(Math.sqrt(second / sum)).isCloseTo(expected, within(0.05 * expected));
    }

    /** A shallow layer fills less and less of a rising beam: its echo falls with range by the share within the layer. */
    @Test
    void aShallowLayerFadesAsTheBeamRisesOutOfIt() {
        RadarSpec radar = SmallScenes.radar(16, 240);
        RangeGrid grid = new RangeGrid(radar);
        CleanSweep clean = SmallScenes.clean(
                SmallScenes.scene(SmallScenes.air(10, 1.2), List.of(), List.of(), List.of()), radar);
        double before = Double.POSITIVE_INFINITY;
        for (int g = 120; g < clean.gates; g += 20) {
            double dbz = 10 * Math.log10(clean.total[5 * clean.gates + g]);
            int bin = g * grid.partsPerGate();
            double share = 0.5 * (grid.layerShare(bin, 0, 1.2) + grid.layerShare(bin + 1, 0, 1.2));
            assertThat(dbz).isCloseTo(10 + 10 * Math.log10(share), within(0.05)).isLessThan(before);
            before = dbz;
        }
        // Beam centre 1.46 km above the antenna at 100 km and 0.5°, spread 0.52 km: about a third is within 1.2 km.
        assertThat(grid.layerShareBelow(1.2)[2 * 200]).isBetween(0.25, 0.4);
    }

    @Test
    void anObstacleTakesItsLossBeyondItsRangeOnly() {
        RadarSpec radar = SmallScenes.radar(16, 100);
        CleanSweep clean = SmallScenes.clean(SmallScenes.scene(SmallScenes.air(10, 50), List.of(), List.of(),
                List.of(new FaultSpec.Obstacle(80, 20, 20, 12, false))), radar);
        int behind = clean.nearestRay(90) * clean.gates;
        int beside = clean.nearestRay(60) * clean.gates;
        assertThat(10 * Math.log10(clean.total[behind + 30] / clean.total[beside + 30])).isCloseTo(0, within(0.01));
        assertThat(10 * Math.log10(clean.total[behind + 60] / clean.total[beside + 60])).isCloseTo(-12, within(0.01));
    }
}
