package hemline.simulation.catalogue;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Every kind of scene by its name. */
public final class SceneCatalogue {
    private static final String SAMPLE = "sample";
    private static final int USUAL_SWEEPS = 14;
    private static final Map<String, SceneKind> KINDS = kinds();

    private SceneCatalogue() {
    }

    private static Map<String, SceneKind> kinds() {
        Map<String, SceneKind> kinds = new LinkedHashMap<>();
        kinds.put(SAMPLE, SampleScene::build);
        kinds.put("straight-line", OutflowScenes::straightLine);
        kinds.put("fast-bow", OutflowScenes::fastBow);
        kinds.put("single-ring", OutflowScenes::singleRing);
        kinds.put("colliding-rings", OutflowScenes::collidingRings);
        kinds.put("weak-rings", OutflowScenes::weakRings);
        return kinds;
    }

    public static List<String> names() {
        return List.copyOf(KINDS.keySet());
    }

    /** How many sweeps a loop of a kind has. */
    public static int sweeps(String name) {
        return name.equals(SAMPLE) ? SampleScene.SWEEPS : USUAL_SWEEPS;
    }

    /** @throws IllegalArgumentException when there is none of that name */
    public static SceneKind named(String name) {
        SceneKind kind = KINDS.get(name);
        if (kind == null) {
            throw new IllegalArgumentException("no scene is named " + name + "; there are " + String.join(", ", names()));
        }
        return kind;
    }
}
