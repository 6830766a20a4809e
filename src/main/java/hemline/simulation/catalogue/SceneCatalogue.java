package hemline.simulation.catalogue;

import hemline.simulation.radar.RadarSpec.Timing;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.UnaryOperator;

/** Every kind of scene by its name. */
public final class SceneCatalogue {
    private static final int USUAL_SWEEPS = 14;
    private static final Map<String, Entry> ENTRIES = entries();

    /**
     * One kind of scene.
     *
     * @param kind   makes it
     * @param sweeps sweeps of a loop of it
     * @param timing turns a radar's usual timing into the one of this kind
     * @param group  what it is there for
     */
    public record Entry(SceneKind kind, int sweeps, UnaryOperator<Timing> timing, Group group) {
    }

    /** What a kind of scene is there for. */
    public enum Group { OUTFLOW, NULL, ROOST }

    private SceneCatalogue() {
    }

    private static Map<String, Entry> entries() {
        Map<String, Entry> all = new LinkedHashMap<>();
        all.put("sample", new Entry(SampleScene::build, SampleScene.SWEEPS, UnaryOperator.identity(), Group.OUTFLOW));
        outflow(all, "straight-line", OutflowScenes::straightLine);
        outflow(all, "fast-bow", OutflowScenes::fastBow);
        outflow(all, "single-ring", OutflowScenes::singleRing);
        outflow(all, "slowing-ring", OutflowScenes::slowingRing);
        outflow(all, "two-thirds-ring", OutflowScenes::twoThirdsRing);
        outflow(all, "wind-ring", OutflowScenes::windRing);
        outflow(all, "colliding-rings", OutflowScenes::collidingRings);
        outflow(all, "merging-pools", OutflowScenes::mergingPools);
        outflow(all, "births", OutflowScenes::births);
        outflow(all, "line-and-ring", OutflowScenes::lineAndRing);
        outflow(all, "weak-rings", OutflowScenes::weakRings);
        outflow(all, "weak-line", HardScenes::weakLine);
        outflow(all, "far-line", HardScenes::farLine);
        outflow(all, "cluttered-line", HardScenes::clutteredLine);
        outflow(all, "rain-hidden", HardScenes::rainHidden);
        outflow(all, "clear-air-arc", HardScenes::clearAirArc);
        outflow(all, "sea-breeze", HardScenes::seaBreeze);
        outflow(all, "dense-insects", HardScenes::denseInsects);
        outflow(all, "busy", HardScenes::busy);
        all.put("uneven-times", new Entry(OutflowScenes::collidingRings, USUAL_SWEEPS,
                usual -> new Timing(usual.intervalS(), 0.18 * usual.intervalS(), 0.28), Group.OUTFLOW));
        none(all, "null-noise", NullScenes::noise, Group.NULL);
        none(all, "null-clear-air", NullScenes::clearAir, Group.NULL);
        none(all, "null-rolls", NullScenes::rolls, Group.NULL);
        none(all, "null-bright-band", NullScenes::brightBand, Group.NULL);
        none(all, "null-rain-bands", NullScenes::rainBands, Group.NULL);
        none(all, "null-ragged-rain", NullScenes::raggedRain, Group.NULL);
        none(all, "null-receiver", NullScenes::receiverFaults, Group.NULL);
        none(all, "null-everything", NullScenes::everything, Group.NULL);
        none(all, "roost-dawn", NullScenes::dawnRoosts, Group.ROOST);
        none(all, "roost-dusk", NullScenes::duskRoosts, Group.ROOST);
        none(all, "roost-many", NullScenes::manyRoosts, Group.ROOST);
        return all;
    }

    private static void outflow(Map<String, Entry> all, String name, SceneKind kind) {
        none(all, name, kind, Group.OUTFLOW);
    }

    private static void none(Map<String, Entry> all, String name, SceneKind kind, Group group) {
        all.put(name, new Entry(kind, USUAL_SWEEPS, UnaryOperator.identity(), group));
    }

    public static List<String> names() {
        return List.copyOf(ENTRIES.keySet());
    }

    /** @throws IllegalArgumentException when there is none of that name */
    public static Entry named(String name) {
        Entry entry = ENTRIES.get(name);
        if (entry == null) {
            throw new IllegalArgumentException("no scene is named " + name + "; there are " + String.join(", ", names()));
        }
        return entry;
    }
}
