package hemline.simulation;

import hemline.simulation.catalogue.SceneCatalogue;
import hemline.simulation.catalogue.SceneKit;
import hemline.simulation.radar.RadarSpec;
import java.util.List;

/** The kinds of scene, by name. */
public final class Scenes {
    private Scenes() {
    }

    public static List<String> names() {
        return SceneCatalogue.names();
    }

    /** True for a kind without any boundary, roosts among them. */
    public static boolean isNull(String name) {
        return SceneCatalogue.named(name).group() != SceneCatalogue.Group.OUTFLOW;
    }

    /** True for a kind with animals leaving roosts and no boundary. */
    public static boolean isRoost(String name) {
        return SceneCatalogue.named(name).group() == SceneCatalogue.Group.ROOST;
    }

    /**
     * One loop of a kind.
     *
     * @throws IllegalArgumentException when there is no such kind
     */
    public static SimulatedLoop build(String name, RadarSpec radar, long seed) {
        SceneCatalogue.Entry entry = SceneCatalogue.named(name);
        RadarSpec timed = new RadarSpec(radar.site(), radar.dish(), radar.gates(), radar.receiver(),
                entry.timing().apply(radar.timing()));
        double[] starts = Simulation.sweepStartsS(timed, entry.sweeps(), seed);
        double spanS = starts[starts.length - 1] - starts[0];
        return Simulation.of(entry.kind().build(new SceneKit(name, timed, spanS, seed)), timed, entry.sweeps(), seed);
    }
}
