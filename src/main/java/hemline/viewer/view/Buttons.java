package hemline.viewer.view;

import hemline.viewer.viewmodel.Action;
import javafx.beans.value.ObservableBooleanValue;
import javafx.scene.control.Button;
import javafx.scene.control.ButtonBase;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.Tooltip;
import org.kordamp.ikonli.feather.Feather;
import org.kordamp.ikonli.javafx.FontIcon;

/** Buttons that do an action and say what it is and which key does it too. */
final class Buttons {
    private Buttons() {
    }

    static Button icon(Action action, Feather icon) {
        Button button = new Button(null, new FontIcon(icon));
        button.getStyleClass().addAll("flat", "button-icon");
        return described(button, action);
    }

    static Button words(Action action, String words, Feather icon) {
        return described(new Button(words, new FontIcon(icon)), action);
    }

    /** A button that stays down while its switch is on. */
    static ToggleButton toggle(Action action, String words) {
        ToggleButton button = described(new ToggleButton(words), action);
        ObservableBooleanValue on = action.on().orElseThrow();
        button.setSelected(on.get());
        on.addListener((o, was, now) -> button.setSelected(now));
        button.addEventHandler(javafx.event.ActionEvent.ACTION, e -> button.setSelected(on.get()));
        return button;
    }

    private static <B extends ButtonBase> B described(B button, Action action) {
        button.setId("do-" + action.id());
        button.setAccessibleText(action.words());
        button.setTooltip(new Tooltip(action.words() + (action.keyWords().isEmpty() ? "" : "   " + action.keyWords())));
        button.disableProperty().bind(javafx.beans.binding.Bindings.not(action.enabled()));
        button.setOnAction(e -> action.perform());
        return button;
    }
}
