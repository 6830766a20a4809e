package hemline.simulation;

import hemline.simulation.catalogue.SceneCatalogue;
import hemline.simulation.catalogue.SceneKind;
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

    /**
     * One loop of a kind.
     *
     * @throws IllegalArgumentException when there is no such kind
     */
    public static SimulatedLoop build(String name, RadarSpec radar, long seed) {
        SceneKind kind = SceneCatalogue.named(name);
        int sweeps = SceneCatalogue.sweeps(name);
        double[] starts = Simulation.sweepStartsS(radar, sweeps, seed);
        double spanS = starts[starts.length - 1] - starts[0];
        return Simulation.of(kind.build(new SceneKit(name, radar, spanS, seed)), radar, sweeps, seed);
    }
}
