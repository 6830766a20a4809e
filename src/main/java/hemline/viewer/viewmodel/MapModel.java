package hemline.viewer.viewmodel;

import hemline.geodesy.GeoPoint;
import hemline.geodesy.LocalPlane;
import hemline.sweep.RadarSite;
import hemline.workflow.MapLayer;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Executor;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;

/** The lines drawn under the boundaries: coasts and borders, and layers from the user's own files. */
public final class MapModel {
    /** Further out no sweep reaches. */
    private static final double REACH_KM = 600;

    private final Executor background;
    private final Executor ui;
    private final JobModel job;
    private final List<MapLayer> layers = new ArrayList<>();
    private final ReadOnlyObjectWrapper<List<MapLine>> lines = new ReadOnlyObjectWrapper<>(this, "lines", List.of());
    private Optional<GeoPoint> radar = Optional.empty();

    MapModel(Executor background, Executor ui, JobModel job) {
        this.background = background;
        this.ui = ui;
        this.job = job;
    }

    /** Draws round this radar; a radar without a position has no map. */
    void open(RadarSite site) {
        if (!site.position().equals(radar)) {
            radar = site.position();
            lines.set(List.of());
            draw();
        }
    }

    /** Adds a GeoJSON file's lines and outlines (RFC 7946). */
    public void add(Path file) {
        background.execute(() -> {
            try {
                MapLayer layer = MapLayer.read(file);
                ui.execute(() -> {
                    layers.add(layer);
                    draw();
                });
            } catch (IOException e) {
                ui.execute(() -> job.say("Adding the map layer failed: " + e.getMessage()));
            }
        });
    }

    /** Takes all layers of the user's away. */
    public void clearLayers() {
        layers.clear();
        draw();
    }

    private void draw() {
        if (radar.isEmpty()) {
            return;
        }
        GeoPoint centre = radar.get();
        List<MapLayer> own = List.copyOf(layers);
        background.execute(() -> {
            try {
                List<MapLine> found = new ArrayList<>(BaseMap.near(centre, REACH_KM));
                LocalPlane plane = new LocalPlane(centre);
                for (MapLayer layer : own) {
                    for (List<GeoPoint> line : layer.lines()) {
                        BaseMap.take(found, MapLine.Kind.OWN, plane,
                                line.stream().mapToDouble(GeoPoint::latitudeDeg).toArray(),
                                line.stream().mapToDouble(GeoPoint::longitudeDeg).toArray(), REACH_KM);
                    }
                }
                List<MapLine> drawn = List.copyOf(found);
                ui.execute(() -> {
                    if (radar.isPresent() && radar.get().equals(centre) && own.equals(layers)) {
                        lines.set(drawn);
                    }
                });
            } catch (IOException e) {
                ui.execute(() -> job.say("The map could not be drawn: " + e.getMessage()));
            }
        });
    }

    public ReadOnlyObjectProperty<List<MapLine>> linesProperty() {
        return lines.getReadOnlyProperty();
    }
}
