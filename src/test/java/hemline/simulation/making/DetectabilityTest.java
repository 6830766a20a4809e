package hemline.simulation.making;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import hemline.boundary.truth.Truth.TruthVertex;
import hemline.geometry.Point;
import hemline.simulation.radar.RadarSpec;
import hemline.simulation.scene.Front;
import hemline.simulation.scene.Life;
import hemline.simulation.scene.Sheet;
import java.util.ArrayList;
import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.junit.jupiter.api.Test;

class DetectabilityTest {

    @Property(tries = 300)
    void neverFallsWithContrastNorRisesWithNoise(@ForAll @DoubleRange(min = 0, max = 20) double contrast,
                                                 @ForAll @DoubleRange(min = 0, max = 5) double more,
                                                 @ForAll @DoubleRange(min = 0.2, max = 4) double noise) {
        double one = Detectability.of(contrast, noise, 500, false);
        assertThat(one).isBetween(0.0, 1.0);
        assertThat(Detectability.of(contrast + more, noise, 500, false)).isGreaterThanOrEqualTo(one);
        assertThat(Detectability.of(contrast, noise + more, 500, false)).isLessThanOrEqualTo(one);
        assertThat(Detectability.of(contrast, noise, 1500, false)).isZero();
        assertThat(Detectability.of(contrast, noise, 500, true)).isZero();
    }

    private static List<TruthVertex> vertices(Front front, RadarSpec radar, Sheet... rain) {
        LoopMaker maker = new LoopMaker(SmallScenes.scene(SmallScenes.air(0, 1.3), List.of(front), List.of(rain), List.of()),
                radar, new double[] {0}, 3);
        List<TruthVertex> all = new ArrayList<>();
        maker.make(0).fronts().get(0).forEach(line -> all.addAll(line.vertices()));
        return all;
    }

    private static double mean(List<TruthVertex> vertices) {
        return vertices.stream().mapToDouble(TruthVertex::detectability).average().orElseThrow();
    }

    @Test
    void strongerLinesAreSeenBetterAndRainHidesThem() {
        RadarSpec radar = SmallScenes.radar(16, 200);
        double faint = mean(vertices(SmallScenes.circle("c", new Point(40, 0), 20, 8, -3), radar));
        double middling = mean(vertices(SmallScenes.circle("c", new Point(40, 0), 20, 8, 3), radar));
        double strong = mean(vertices(SmallScenes.circle("c", new Point(40, 0), 20, 8, 14), radar));
        assertThat(faint).isLessThan(0.3);
        assertThat(middling).isBetween(faint, strong);
        assertThat(strong).isGreaterThan(0.95);
        Sheet rain = new Sheet(new Point(40, 0), new Point(0, 0), Life.ALWAYS, 32, 0, 60, 1, 0, Double.POSITIVE_INFINITY, 0, 1);
        assertThat(mean(vertices(SmallScenes.circle("c", new Point(40, 0), 20, 8, 14), radar, rain))).isLessThan(0.02);
    }

    /** Beam centre at 0.5° passes 1.5 km at 101.9 km under 4/3 earth radius (height formula of Doviak and Zrnić 1993). */
    @Test
    void nothingIsSeenWhereTheBeamIsFifteenHundredMetresUp() {
        RadarSpec radar = SmallScenes.radar(16, 240);
        List<TruthVertex> vertices = vertices(SmallScenes.circle("c", new Point(0, 0), 102.5, 8, 25), radar);
        assertThat(vertices).isNotEmpty().allMatch(v -> v.detectability() == 0);
        List<TruthVertex> nearer = vertices(SmallScenes.circle("c", new Point(0, 0), 95, 8, 25), radar);
        assertThat(mean(nearer)).isGreaterThan(0.9);
    }

    @Test
    void peakIsTheLinesOwnEchoWithinTheBeam() {
        RadarSpec radar = SmallScenes.radar(16, 120);
        for (TruthVertex vertex : vertices(SmallScenes.circle("c", new Point(0, 0), 30, 8, 12), radar)) {
            // The line (2.35 · 0.6 km wide) is seen through gates of 500 m: a little is lost at the crest.
            assertThat(vertex.peakDbz()).isCloseTo(11.6, within(0.5));
            assertThat(vertex.speedMs()).isCloseTo(8, within(1e-3));
        }
    }
}
