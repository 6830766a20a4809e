package hemline.simulation.echo;

import hemline.simulation.random.Streams;
import hemline.simulation.scene.Band;
import hemline.simulation.scene.Cell;
import hemline.simulation.scene.EchoSpec;
import hemline.simulation.scene.Ground;
import hemline.simulation.scene.Masts;
import hemline.simulation.scene.Roost;
import hemline.simulation.scene.SceneSpec;
import hemline.simulation.scene.Sheet;
import java.util.ArrayList;
import java.util.List;

/** A scene made ready to be looked at. */
public final class SceneEchoes {
    private final List<EchoLayer> layers = new ArrayList<>();

    public SceneEchoes(SceneSpec scene, FrontField fronts, Streams streams) {
        layers.add(new AirLayer(scene, fronts, streams.part("air", 0)));
        for (int i = 0; i < scene.echoes().size(); i++) {
            layers.add(layerOf(scene.echoes().get(i), streams.part("echo", i)));
        }
    }

    private static EchoLayer layerOf(EchoSpec spec, Streams streams) {
        if (spec instanceof Cell cell) {
            return new CellLayer(cell, streams);
        }
        if (spec instanceof Sheet sheet) {
            return new SheetLayer(sheet, streams);
        }
        if (spec instanceof Band band) {
            return new BandLayer(band, streams);
        }
        if (spec instanceof Roost roost) {
            return new RoostLayer(roost, streams);
        }
        if (spec instanceof Masts masts) {
            return new MastLayer(masts, streams);
        }
        return new GroundLayer((Ground) spec, streams);
    }

    /** Fills {@code ray} with what comes back from a direction (degrees clockwise from north) at a time (s). */
    public void look(RayEcho ray, double azimuthDeg, double timeS) {
        ray.pointAt(azimuthDeg, timeS);
        for (EchoLayer layer : layers) {
            layer.addTo(ray);
        }
    }
}
