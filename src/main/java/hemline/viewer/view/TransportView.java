package hemline.viewer.view;

import hemline.viewer.viewmodel.LoopModel;
import hemline.viewer.viewmodel.Motion;
import hemline.viewer.viewmodel.ViewerActions;
import hemline.viewer.viewmodel.ViewerModel;
import hemline.viewer.viewmodel.Words;
import java.time.ZoneId;
import javafx.geometry.Pos;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.Slider;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import javafx.scene.layout.VBox;
import org.kordamp.ikonli.feather.Feather;
import org.kordamp.ikonli.javafx.FontIcon;

/** The time of the sweep shown, large, and the buttons that move it. */
final class TransportView extends VBox {
    private final ViewerModel model;
    private final Label time = new Label("\u2013");
    private final Label date = new Label("");
    private final Label place = new Label("");

    TransportView(ViewerModel model, ViewerActions actions) {
        this.model = model;
        getStyleClass().add("transport");
        time.setId("time");
        time.getStyleClass().add("big-time");
        date.setId("date");
        date.getStyleClass().add("muted");
        place.setId("place");
        place.getStyleClass().add("muted");
        place.setMinWidth(USE_PREF_SIZE);
        HBox when = new HBox(8, time, new VBox(date, place));
        when.setAlignment(Pos.CENTER_LEFT);
        HBox buttons = new HBox(2,
                Buttons.icon(actions.get("first"), Feather.CHEVRONS_LEFT),
                Buttons.icon(actions.get("previous"), Feather.CHEVRON_LEFT),
                playing(Buttons.icon(actions.get("back"), Feather.PLAY), Motion.BACK, true),
                playing(Buttons.icon(actions.get("play"), Feather.PLAY), Motion.FORWARD, false),
                Buttons.icon(actions.get("next"), Feather.CHEVRON_RIGHT),
                Buttons.icon(actions.get("last"), Feather.CHEVRONS_RIGHT),
                playing(Buttons.icon(actions.get("rock"), Feather.REPEAT), Motion.ROCK, false));
        buttons.setAlignment(Pos.CENTER_LEFT);
        getChildren().addAll(when, buttons, speed());
        setSpacing(2);
        new Redraw(this::say).on(model.sessionProperty(), model.loop().indexProperty(), model.loop().sizeProperty(),
                model.settings().localTimeProperty());
    }

    private Button playing(Button button, Motion motion, boolean mirrored) {
        FontIcon icon = (FontIcon) button.getGraphic();
        Feather still = (Feather) icon.getIconCode();
        icon.setScaleX(mirrored ? -1 : 1);
        model.loop().motionProperty().addListener((o, was, now) -> icon.setIconCode(now == motion ? Feather.PAUSE
                : still));
        return button;
    }

    private HBox speed() {
        Slider slider = new Slider(Math.log(LoopModel.MIN_SWEEPS_PER_SECOND), Math.log(LoopModel.MAX_SWEEPS_PER_SECOND),
                Math.log(model.loop().sweepsPerSecondProperty().get()));
        slider.setId("speed");
        slider.setAccessibleText("Sweeps a second");
        slider.setTooltip(new Tooltip("How many sweeps a second are shown while playing"));
        slider.setPrefWidth(104);
        Label value = new Label();
        value.getStyleClass().add("muted");
        Runnable say = () -> value.setText(Words.number(model.loop().sweepsPerSecondProperty().get(), 1) + " sweeps/s");
        slider.valueProperty().addListener((o, was, now) ->
                model.loop().sweepsPerSecondProperty().set(Math.exp(now.doubleValue())));
        model.loop().sweepsPerSecondProperty().addListener((o, was, now) -> {
            slider.setValue(Math.log(now.doubleValue()));
            say.run();
        });
        say.run();
        HBox box = new HBox(6, slider, value);
        box.setAlignment(Pos.CENTER_LEFT);
        return box;
    }

    private void say() {
        if (model.session() == null) {
            return;
        }
        long ms = model.session().frames().get(model.loop().index()).meanTimeMs();
        time.setText(Words.clock(ms));
        date.setText(Words.date(ms) + " UTC");
        place.setText(model.settings().localTimeProperty().get() ? Words.localClock(ms, ZoneId.systemDefault())
                : "sweep " + (model.loop().index() + 1) + " of " + model.loop().sizeProperty().get());
    }
}
