package hemline.simulation.scene;

import hemline.geometry.Point;
import java.util.List;

/**
 * An invented scene: all that is there, and the faults of the receiver in it.
 *
 * @param name       kind of scene
 * @param startMs    time of its start, ms since 1970-01-01T00:00Z
 * @param windMs     mean wind of the lowest kilometre, m s⁻¹ east and north
 * @param air        clear air
 * @param fronts     boundaries
 * @param echoes     rain, ground and decoys
 * @param faults     obstacles and faults of the receiver
 * @param velocity   whether radial velocity is recorded
 */
public record SceneSpec(String name, long startMs, Point windMs, Air air, List<Front> fronts, List<EchoSpec> echoes,
                        List<FaultSpec> faults, boolean velocity) {
    public SceneSpec {
        fronts = List.copyOf(fronts);
        echoes = List.copyOf(echoes);
        faults = List.copyOf(faults);
    }
}
