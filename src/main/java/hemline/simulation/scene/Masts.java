package hemline.simulation.scene;

import hemline.geometry.Point;
import java.util.List;

/**
 * Turbines of a wind farm: point echoes that flicker from ray to ray.
 *
 * @param places    where they stand
 * @param dbz       mean reflectivity of a gate that holds one, dBZ
 * @param flickerDb standard deviation of the flicker, dB
 * @param number    tells farms apart
 */
public record Masts(List<Point> places, double dbz, double flickerDb, long number) implements EchoSpec {
    public Masts {
        places = List.copyOf(places);
    }
}
