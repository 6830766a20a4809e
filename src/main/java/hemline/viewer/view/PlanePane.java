package hemline.viewer.view;

import hemline.viewer.render.RasterFeed;
import hemline.viewer.viewmodel.ViewerModel;
import javafx.geometry.Insets;
import javafx.geometry.Pos;
import javafx.scene.control.Label;
import javafx.scene.layout.StackPane;

/** The plane with its scale, its legend and what must be said on it. */
final class PlanePane extends StackPane {
    private final PlaneView plane;
    private final Label trouble = new Label();
    private final Label measure = new Label();

    PlanePane(ViewerModel model, RasterFeed feed) {
        plane = new PlaneView(model, feed);
        ScaleView scale = new ScaleView(model);
        LegendView legend = new LegendView(model);
        Label welcome = new Label("Drop sweep files or a folder of them here, or open them with Ctrl+O.");
        welcome.setId("welcome");
        welcome.getStyleClass().add("on-plane");
        welcome.setWrapText(true);
        welcome.visibleProperty().bind(model.sessionProperty().isNull().and(model.job().runningProperty().not()));
        trouble.setId("sweep-trouble");
        trouble.getStyleClass().addAll("on-plane", "trouble");
        trouble.setWrapText(true);
        trouble.textProperty().bind(model.sweepTroubleProperty());
        trouble.visibleProperty().bind(model.sweepTroubleProperty().isNotEmpty());
        measure.setId("measure-words");
        measure.getStyleClass().add("on-plane");
        measure.visibleProperty().bind(model.measure().onProperty());
        new Redraw(() -> measure.setText(model.measure().words())).on(model.measure().onProperty(),
                model.measure().fromProperty(), model.measure().toProperty());
        getChildren().addAll(plane, scale, legend, welcome, trouble, measure);
        setAlignment(scale, Pos.CENTER_RIGHT);
        setAlignment(legend, Pos.BOTTOM_LEFT);
        setAlignment(measure, Pos.TOP_CENTER);
        setMargin(scale, new Insets(28, 34, 28, 0));
        setMargin(legend, new Insets(0, 0, 26, 12));
        setMargin(measure, new Insets(26, 0, 0, 0));
        for (Label said : new Label[] {welcome, trouble, measure}) {
            said.setMouseTransparent(true);
            said.setMinHeight(USE_PREF_SIZE);
        }
        setMinSize(120, 120);
    }

    PlaneView plane() {
        return plane;
    }
}
