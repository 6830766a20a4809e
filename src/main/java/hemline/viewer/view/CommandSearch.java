package hemline.viewer.view;

import hemline.viewer.viewmodel.Action;
import hemline.viewer.viewmodel.ViewerActions;
import javafx.geometry.Pos;
import javafx.scene.control.Label;
import javafx.scene.control.ListCell;
import javafx.scene.control.ListView;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;

/** Every action by typing a few letters of what it does; Enter does it. */
final class CommandSearch extends VBox {
    private final TextField typed = new TextField();
    private final ListView<Action> found = new ListView<>();
    private final ViewerActions actions;
    private final Runnable close;

    CommandSearch(ViewerActions actions, Runnable close) {
        this.actions = actions;
        this.close = close;
        getStyleClass().add("sheet");
        setId("command-search");
        typed.setId("command-typed");
        typed.setPromptText("What do you want to do?");
        typed.setAccessibleText("Command search");
        found.setId("command-found");
        found.setCellFactory(list -> new ActionCell());
        found.setFocusTraversable(false);
        typed.textProperty().addListener((o, was, now) -> search());
        typed.addEventFilter(KeyEvent.KEY_PRESSED, this::key);
        found.setOnMouseClicked(e -> perform());
        VBox.setVgrow(found, Priority.ALWAYS);
        getChildren().addAll(typed, found);
        setSpacing(6);
        setMaxSize(520, 420);
    }

    /** Empty and ready to type. */
    void begin() {
        typed.clear();
        search();
        typed.requestFocus();
    }

    private void search() {
        found.getItems().setAll(actions.search(typed.getText()));
        found.getSelectionModel().selectFirst();
    }

    private void key(KeyEvent e) {
        int at = found.getSelectionModel().getSelectedIndex();
        if (e.getCode() == KeyCode.ENTER) {
            perform();
        } else if (e.getCode() == KeyCode.ESCAPE) {
            close.run();
        } else if (e.getCode() == KeyCode.DOWN || e.getCode() == KeyCode.UP) {
            int next = Math.max(0, Math.min(found.getItems().size() - 1, at + (e.getCode() == KeyCode.DOWN ? 1 : -1)));
            found.getSelectionModel().select(next);
            found.scrollTo(Math.max(0, next - 4));
        } else {
            return;
        }
        e.consume();
    }

    private void perform() {
        Action action = found.getSelectionModel().getSelectedItem();
        if (action != null && action.enabled().get()) {
            close.run();
            action.perform();
        }
    }

    private static final class ActionCell extends ListCell<Action> {
        @Override
        protected void updateItem(Action action, boolean empty) {
            super.updateItem(action, empty);
            if (empty || action == null) {
                setGraphic(null);
                setText(null);
                return;
            }
            Label words = new Label(action.words());
            Label keys = new Label(action.keyWords());
            keys.getStyleClass().add("key");
            keys.setMinWidth(USE_PREF_SIZE);
            Label group = new Label(action.group());
            group.getStyleClass().add("muted");
            words.setDisable(!action.enabled().get());
            HBox.setHgrow(words, Priority.ALWAYS);
            words.setMaxWidth(Double.MAX_VALUE);
            HBox row = new HBox(10, words, group, keys);
            row.setAlignment(Pos.CENTER_LEFT);
            setText(null);
            setGraphic(row);
            setAccessibleText(action.words());
        }
    }
}
