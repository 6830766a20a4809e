package hemline.viewer.view;

import hemline.viewer.viewmodel.Action;
import hemline.viewer.viewmodel.ViewerActions;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import javafx.geometry.Orientation;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.input.KeyCode;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;

/** All keys, by group. */
final class ShortcutSheet extends VBox {
    private final Button done = new Button("Close");

    ShortcutSheet(ViewerActions actions, Runnable close) {
        getStyleClass().add("sheet");
        setId("shortcut-sheet");
        Map<String, List<Action>> groups = new LinkedHashMap<>();
        actions.all().stream().filter(a -> !a.keys().isEmpty())
                .forEach(a -> groups.computeIfAbsent(a.group(), g -> new ArrayList<>()).add(a));
        FlowPane columns = new FlowPane(Orientation.HORIZONTAL, 26, 14);
        groups.forEach((name, members) -> columns.getChildren().add(group(name, members)));
        columns.setPrefWrapLength(1120);
        ScrollPane scroll = new ScrollPane(columns);
        scroll.setFitToWidth(true);
        VBox.setVgrow(scroll, Priority.ALWAYS);
        Label note = new Label("On the rail, Left and Right step. In tables, the arrow keys move between rows."
                + " Tab and F6 move the keyboard on.");
        note.setWrapText(true);
        note.getStyleClass().add("muted");
        done.setOnAction(e -> close.run());
        done.setId("shortcuts-close");
        done.setCancelButton(true);
        getChildren().addAll(scroll, note, done);
        setSpacing(8);
        setMaxSize(1200, 640);
        setOnKeyPressed(e -> {
            if (e.getCode() == KeyCode.ESCAPE || e.getCode() == KeyCode.F1) {
                close.run();
                e.consume();
            }
        });
    }

    void begin() {
        done.requestFocus();
    }

    private static VBox group(String name, List<Action> members) {
        GridPane grid = new GridPane();
        grid.setHgap(10);
        grid.setVgap(3);
        for (int i = 0; i < members.size(); i++) {
            Label key = new Label(members.get(i).keyWords());
            key.getStyleClass().add("key");
            key.setMinWidth(USE_PREF_SIZE);
            grid.addRow(i, key, new Label(members.get(i).words()));
        }
        Label heading = new Label(name);
        heading.getStyleClass().add("group-title");
        return new VBox(4, heading, grid);
    }
}
