package hemline.simulation;

import java.util.ArrayList;
import java.util.List;

/**
 * Two fixed sets of loops on which methods are compared: one to tune on, one to report on. They share no radar, no noise
 * level and no seed; every kind of scene is in both.
 */
public final class SceneSets {
    private static final List<String> TUNING_RADARS =
            List.of("harrowmere", "tolvane", "sennick", "quillmar", "brackfold", "pellow");
    private static final List<String> REPORTING_RADARS =
            List.of("velmark", "cawdrie", "istrel", "gannevar", "fenhythe", "marlby");
    /** Kinds that occur twice in each set. */
    private static final List<String> TWICE = List.of("fast-bow", "slowing-ring", "colliding-rings", "merging-pools",
            "births", "line-and-ring", "weak-rings", "weak-line", "rain-hidden", "clear-air-arc", "null-everything");

    private SceneSets() {
    }

    /**
     * One loop of a set.
     *
     * @param scene a kind of {@link Scenes}
     * @param radar a radar of {@link Radars}
     * @param seed  its seed
     */
    public record Member(String scene, String radar, long seed) {
        public SimulatedLoop loop() {
            return Simulation.of(scene, radar, seed);
        }

        /** For example {@code fast-bow/velmark/9007}. */
        public String name() {
            return scene + "/" + radar + "/" + seed;
        }
    }

    /** Loops to tune on. */
    public static List<Member> tuning() {
        return members(TUNING_RADARS, 1000);
    }

    /** Loops to report on; nothing may be chosen by looking at them. */
    public static List<Member> reporting() {
        return members(REPORTING_RADARS, 9000);
    }

    private static List<Member> members(List<String> radars, long firstSeed) {
        List<Member> members = new ArrayList<>();
        for (String scene : Scenes.names()) {
            if (!scene.equals("sample")) {
                for (int i = 0; i < (TWICE.contains(scene) ? 2 : 1); i++) {
                    int number = members.size();
                    members.add(new Member(scene, radars.get((number + number / radars.size()) % radars.size()),
                            firstSeed + number));
                }
            }
        }
        return members;
    }
}
