package hemline.viewer.view;

import hemline.viewer.viewmodel.ViewerActions;
import hemline.viewer.viewmodel.ViewerModel;
import javafx.beans.binding.Bindings;
import javafx.geometry.Pos;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ProgressBar;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;

/** Long work: what, how far, how long still, stop. And why the last work ended without a result. */
final class JobStrip extends VBox {
    JobStrip(ViewerModel model, ViewerActions actions) {
        ProgressBar bar = new ProgressBar();
        bar.setId("job-progress");
        bar.setPrefWidth(220);
        bar.progressProperty().bind(model.job().fractionProperty());
        Label words = new Label();
        words.setId("job-words");
        words.textProperty().bind(model.job().wordsProperty());
        Button cancel = new Button("Cancel");
        cancel.setId("job-cancel");
        cancel.setMinWidth(USE_PREF_SIZE);
        cancel.setTooltip(new Tooltip("Stops at the next step; what is shown stays   "
                + actions.get("cancel").keyWords()));
        cancel.setOnAction(e -> model.job().cancel());
        HBox running = new HBox(10, bar, words, cancel);
        HBox.setHgrow(words, Priority.ALWAYS);
        words.setMaxWidth(Double.MAX_VALUE);
        shownWhile(running, "job-running", model.job().runningProperty());

        Label trouble = new Label();
        trouble.setId("job-trouble");
        trouble.setWrapText(true);
        trouble.setMaxWidth(Double.MAX_VALUE);
        trouble.textProperty().bind(model.job().troubleProperty());
        Button dismiss = new Button("Dismiss");
        dismiss.setId("job-dismiss");
        dismiss.setMinWidth(USE_PREF_SIZE);
        dismiss.setOnAction(e -> model.job().dismissTrouble());
        HBox failed = new HBox(10, trouble, dismiss);
        HBox.setHgrow(trouble, Priority.ALWAYS);
        shownWhile(failed, "job-failed", model.job().troubleProperty().isNotEmpty());
        getChildren().addAll(running, failed);
    }

    private static void shownWhile(HBox row, String style, javafx.beans.value.ObservableBooleanValue when) {
        row.getStyleClass().addAll("job-row", style);
        row.setAlignment(Pos.CENTER_LEFT);
        row.visibleProperty().bind(Bindings.createBooleanBinding(when::get, when));
        row.managedProperty().bind(row.visibleProperty());
    }
}
