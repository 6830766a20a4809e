package hemline.viewer.view;

import hemline.viewer.viewmodel.PlaneField;
import hemline.viewer.viewmodel.ViewerActions;
import hemline.viewer.viewmodel.ViewerModel;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import javafx.beans.binding.Bindings;
import javafx.collections.ListChangeListener;
import javafx.geometry.Pos;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.MenuButton;
import javafx.scene.control.MenuItem;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import org.kordamp.ikonli.feather.Feather;
import org.kordamp.ikonli.javafx.FontIcon;

/** What is open, which field is shown, and the way to everything else. */
final class TopBar extends HBox {
    TopBar(ViewerModel model, ViewerActions actions) {
        super(8);
        getStyleClass().add("top-bar");
        setAlignment(Pos.CENTER_LEFT);
        Label title = new Label("No loop is open");
        title.setId("title");
        title.getStyleClass().add("loop-title");
        model.sessionProperty().addListener((o, was, now) -> title.setText(now == null ? "No loop is open"
                : now.title()));
        HBox.setHgrow(title, Priority.ALWAYS);
        title.setMaxWidth(Double.MAX_VALUE);
        HBox fields = new HBox();
        fields.setAlignment(Pos.CENTER);
        for (PlaneField field : PlaneField.values()) {
            ToggleButton button = Buttons.toggle(actions.get("field-" + field.name().toLowerCase(Locale.ROOT)),
                    field.words());
            button.setTooltip(new Tooltip(field.explained() + "   " + (1 + field.ordinal())));
            button.getStyleClass().add(field.ordinal() == 0 ? "left-pill"
                    : field.ordinal() == PlaneField.values().length - 1 ? "right-pill" : "center-pill");
            button.setMinWidth(Region.USE_PREF_SIZE);
            fields.getChildren().add(button);
        }
        ToggleButton measure = Buttons.toggle(actions.get("measure"), "Measure");
        measure.setMinWidth(Region.USE_PREF_SIZE);
        Button commands = Buttons.words(actions.get("commands"), "Find a command  Ctrl+K", Feather.SEARCH);
        commands.setMinWidth(Region.USE_PREF_SIZE);
        getChildren().addAll(Buttons.icon(actions.get("open-files"), Feather.FILE_PLUS),
                Buttons.icon(actions.get("open-folder"), Feather.FOLDER_PLUS), recent(model), title, fields, measure,
                Buttons.icon(actions.get("fit"), Feather.MAXIMIZE_2),
                Buttons.icon(actions.get("copy-picture"), Feather.COPY), commands,
                Buttons.icon(actions.get("side"), Feather.SIDEBAR),
                Buttons.icon(actions.get("theme"), Feather.SUN),
                Buttons.icon(actions.get("shortcuts"), Feather.HELP_CIRCLE));
    }

    private static MenuButton recent(ViewerModel model) {
        MenuButton button = new MenuButton(null, new FontIcon(Feather.CLOCK));
        button.setId("recent");
        button.getStyleClass().addAll("flat", "button-icon", "no-arrow");
        button.setAccessibleText("Open again what was open before");
        button.setTooltip(new Tooltip("Open again what was open before"));
        button.disableProperty().bind(Bindings.isEmpty(model.settings().recent()));
        Runnable fill = () -> button.getItems().setAll(model.settings().recent().stream().map(path -> {
            MenuItem item = new MenuItem(path.toString());
            item.setMnemonicParsing(false);
            item.setOnAction(e -> model.open(List.of(path)));
            return item;
        }).toList());
        model.settings().recent().addListener((ListChangeListener<Path>) change -> fill.run());
        fill.run();
        return button;
    }
}
