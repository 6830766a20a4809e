package hemline.viewer.view;

import hemline.viewer.viewmodel.StatusModel;
import hemline.viewer.viewmodel.ViewerModel;
import javafx.css.PseudoClass;
import javafx.geometry.Pos;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;

/** What must always be in view: that this is guidance, how far the beam can be trusted, how old the data are. */
final class StatusLine extends HBox {
    private static final PseudoClass OLD = PseudoClass.getPseudoClass("old");

    StatusLine(ViewerModel model) {
        super(14);
        getStyleClass().add("status-line");
        setAlignment(Pos.CENTER_LEFT);
        Label guidance = new Label(StatusModel.GUIDANCE);
        guidance.setId("guidance");
        guidance.getStyleClass().add("guidance");
        guidance.setMinWidth(USE_PREF_SIZE);
        guidance.setTooltip(new Tooltip("The national weather service, local procedures and licensed forecasters"
                + " decide."));
        Label reach = new Label();
        reach.setId("reach");
        reach.textProperty().bind(model.status().reachProperty());
        Label cautions = new Label();
        cautions.setId("cautions");
        cautions.getStyleClass().add("cautions");
        new Redraw(() -> caution(model, cautions)).on(model.sessionProperty());
        Region gap = new Region();
        setHgrow(gap, Priority.ALWAYS);
        Label age = new Label();
        age.setId("age");
        age.getStyleClass().add("age");
        age.setMinWidth(USE_PREF_SIZE);
        age.textProperty().bind(model.status().ageProperty());
        model.status().oldProperty().addListener((o, was, now) -> age.pseudoClassStateChanged(OLD, now));
        getChildren().addAll(guidance, reach, cautions, gap, age);
    }

    private static void caution(ViewerModel model, Label label) {
        int count = model.session() == null ? 0 : model.session().cautions().size();
        label.setVisible(count > 0);
        label.setManaged(count > 0);
        if (count > 0) {
            label.setText(count == 1 ? model.session().cautions().get(0) : count + " cautions");
            label.setTooltip(new Tooltip(String.join("\n", model.session().cautions())));
        }
    }
}
