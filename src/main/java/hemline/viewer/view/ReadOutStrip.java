package hemline.viewer.view;

import hemline.viewer.viewmodel.ReadOut;
import hemline.viewer.viewmodel.ViewerModel;
import hemline.viewer.viewmodel.Words;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;

/** What the sweep says of the place under the cursor, always in the same places so that the eye need not search. */
final class ReadOutStrip extends HBox {
    private final Map<Label, Function<ReadOut, String>> cells = new LinkedHashMap<>();
    private final ViewerModel model;

    ReadOutStrip(ViewerModel model) {
        this.model = model;
        getStyleClass().add("read-out");
        setId("read-out");
        cell("echo", "Echo", "Reflectivity of the gate, dBZ", 100, ReadOut::reflectivityWords);
        cell("velocity", "Velocity", "Radial velocity, m s\u207b\u00b9, positive away from the radar", 78,
                ReadOut::velocityWords);
        cell("range", "Range", "Along the ground from the radar, km", 70, r -> Words.number(r.rangeKm(), 1) + " km");
        cell("azimuth", "Azimuth", "From the radar, degrees clockwise from north", 62,
                r -> Words.number(r.azimuthDeg(), 1) + "\u00b0");
        cell("east", "East", "Of the radar, km", 66, r -> Words.number(r.place().xKm(), 1) + " km");
        cell("north", "North", "Of the radar, km", 66, r -> Words.number(r.place().yKm(), 1) + " km");
        cell("latitude", "Latitude", "WGS 84, degrees", 84, ReadOut::latitudeWords);
        cell("longitude", "Longitude", "WGS 84, degrees", 92, ReadOut::longitudeWords);
        cell("beam-height", "Beam centre", "Height above mean sea level under 4/3 effective earth radius, m", 80,
                r -> Words.number(r.beamHeightM(), 0) + " m");
        cell("beam-width", "Beam width", "Half-power width across the beam, m", 74,
                r -> Words.number(r.beamWidthM(), 0) + " m");
        cell("ray-time", "Ray time", "When the ray over this place was measured, UTC", 72, r -> Words.clock(r.rayMs()));
        VBox last = cell("masked", "Set apart as", "Why screening does not take the gate at face value", 120,
                r -> r.masked().isEmpty() ? "nothing" : r.masked());
        setHgrow(last, Priority.ALWAYS);
        new Redraw(this::say).on(model.readOut());
        say();
    }

    private VBox cell(String id, String title, String tooltip, double width, Function<ReadOut, String> value) {
        Label heading = new Label(title);
        heading.getStyleClass().add("cell-title");
        Label text = new Label(Words.NONE);
        text.setId("read-" + id);
        text.getStyleClass().add("cell-value");
        VBox box = new VBox(heading, text);
        box.setMinWidth(width);
        box.setPrefWidth(width);
        Tooltip.install(box, new Tooltip(title + ": " + tooltip));
        cells.put(text, value);
        getChildren().add(box);
        return box;
    }

    private void say() {
        Optional<ReadOut> readOut = model.readOut().get();
        cells.forEach((label, value) -> label.setText(readOut.map(value).orElse(Words.NONE)));
    }
}
