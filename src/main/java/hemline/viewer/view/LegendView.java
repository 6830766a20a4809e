package hemline.viewer.view;

import hemline.viewer.render.LegendPainter;
import hemline.viewer.viewmodel.Overlay;
import hemline.viewer.viewmodel.ViewerModel;
import javafx.scene.canvas.Canvas;
import javafx.scene.control.CheckBox;
import javafx.scene.control.TitledPane;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.VBox;

/** Says how each overlay is drawn, and shows or hides it: legend and switches in one. */
final class LegendView extends TitledPane {
    LegendView(ViewerModel model) {
        setText("Shown");
        setId("legend");
        getStyleClass().add("legend");
        VBox rows = new VBox(3);
        for (Overlay overlay : Overlay.values()) {
            Canvas sample = new Canvas(LegendPainter.WIDTH_PX, LegendPainter.HEIGHT_PX);
            LegendPainter.paint(sample.getGraphicsContext2D(), overlay);
            CheckBox row = new CheckBox(overlay.words());
            row.setId("show-" + overlay.name().toLowerCase(java.util.Locale.ROOT));
            row.setGraphic(sample);
            row.selectedProperty().bindBidirectional(model.overlays().shown(overlay));
            row.setTooltip(new Tooltip(overlay.explained() + "   " + overlay.key()));
            row.setAccessibleHelp(overlay.explained());
            rows.getChildren().add(row);
        }
        setContent(rows);
        setMaxSize(USE_PREF_SIZE, USE_PREF_SIZE);
        setAnimated(false);
        setExpanded(false);
    }
}
