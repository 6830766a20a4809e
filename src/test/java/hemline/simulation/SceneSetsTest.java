package hemline.simulation;

import static org.assertj.core.api.Assertions.assertThat;

import hemline.simulation.SceneSets.Member;
import hemline.simulation.catalogue.SceneCatalogue;
import hemline.simulation.catalogue.SceneKit;
import hemline.simulation.scene.SceneSpec;
import java.util.List;
import java.util.Set;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;

class SceneSetsTest {

    private static <T> Set<T> all(List<Member> set, Function<Member, T> what) {
        return set.stream().map(what).collect(Collectors.toSet());
    }

    @Test
    void eachSetHasAtLeastFortyLoopsWithNullsAndRoosts() {
        for (List<Member> set : List.of(SceneSets.tuning(), SceneSets.reporting())) {
            assertThat(set).hasSizeGreaterThanOrEqualTo(40).doesNotHaveDuplicates();
            assertThat(set.stream().filter(m -> Scenes.isNull(m.scene()) && !Scenes.isRoost(m.scene())).count())
                    .isGreaterThanOrEqualTo(6);
            assertThat(set.stream().filter(m -> Scenes.isRoost(m.scene())).count()).isGreaterThanOrEqualTo(3);
        }
    }

    @Test
    void theSetsShareNoRadarNoNoiseLevelAndNoSeed() {
        List<Member> tuning = SceneSets.tuning();
        List<Member> reporting = SceneSets.reporting();
        assertThat(all(tuning, Member::radar)).doesNotContainAnyElementsOf(all(reporting, Member::radar));
        assertThat(all(tuning, Member::seed)).doesNotContainAnyElementsOf(all(reporting, Member::seed));
        Function<Member, Double> noise = m -> Radars.named(m.radar()).receiver().noiseAtOneKmDbz();
        assertThat(all(tuning, noise)).doesNotContainAnyElementsOf(all(reporting, noise));
        assertThat(all(tuning, Member::scene)).isEqualTo(all(reporting, Member::scene));
    }

    @Test
    void everyKindOfSceneCanBeLaidOutUnderEveryRadarAndNullScenesHaveNoFront() {
        for (String name : Scenes.names()) {
            for (String radar : Radars.names()) {
                SceneSpec scene = SceneCatalogue.named(name).kind().build(new SceneKit(name, Radars.named(radar), 4000, 5));
                assertThat(scene.fronts().isEmpty()).as(name).isEqualTo(Scenes.isNull(name));
                assertThat(scene.fronts()).extracting(f -> f.id()).doesNotHaveDuplicates();
            }
        }
    }

    @Test
    void radarsSpanBeamsGatesElevationsIntervalsAndPackings() {
        List<String> names = Radars.names();
        assertThat(names).doesNotHaveDuplicates();
        assertThat(names.stream().map(n -> Radars.named(n).gates().spacingM()).collect(Collectors.toSet()))
                .contains(250.0, 500.0, 1000.0);
        assertThat(names.stream().map(n -> Radars.named(n).receiver().packing().name()).collect(Collectors.toSet()))
                .containsExactlyInAnyOrder("uint8", "int16");
        assertThat(names).allSatisfy(n -> {
            assertThat(Radars.named(n).dish().beamWidthDeg()).isBetween(0.89, 1.51);
            assertThat(Radars.named(n).dish().elevationDeg()).isBetween(0.29, 1.21);
            assertThat(Radars.named(n).timing().intervalS()).isBetween(240.0, 600.0);
        });
    }

    @Test
    void unevenTimesHaveHoles() {
        double[] starts = new double[14];
        SimulatedLoop loop = Simulation.of("uneven-times", "cawdrie", 2);
        double beat = loop.radar().timing().intervalS();
        double longest = 0;
        for (int i = 0; i < starts.length; i++) {
            starts[i] = Simulation.sweepStartsS(loop.radar(), starts.length, 2)[i];
            longest = i > 0 ? Math.max(longest, starts[i] - starts[i - 1]) : 0;
        }
        assertThat(longest).isGreaterThan(1.5 * beat);
    }
}
