package hemline.viewer.view;

import hemline.viewer.render.RasterFeed;
import hemline.viewer.viewmodel.Desk;
import hemline.viewer.viewmodel.ViewerActions;
import hemline.viewer.viewmodel.ViewerModel;
import hemline.viewer.viewmodel.WindowPlace;
import java.io.File;
import java.nio.file.Path;
import java.util.List;
import javafx.animation.AnimationTimer;
import javafx.geometry.Orientation;
import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.control.SplitPane;
import javafx.scene.input.TransferMode;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import javafx.stage.Screen;
import javafx.stage.Stage;

/** One window: read-out on top, plane beside ledger and traces, rail and status line below. */
public final class ViewerWindow {
    private final ViewerModel model;
    private final Stage stage;
    private final ViewerActions actions;
    private final PlanePane planePane;
    private final RailView rail;
    private final LedgerView ledger;
    private final SplitPane side = new SplitPane();
    private final SplitPane middle = new SplitPane();
    private final StackPane root = new StackPane();
    private final StackPane veil = new StackPane();
    private final CommandSearch search;
    private final ShortcutSheet shortcuts;
    private final AnimationTimer ticking;
    private Node focusedBefore;

    public ViewerWindow(Stage stage, ViewerModel model, RasterFeed feed, WindowDesk.Ask ask) {
        this.stage = stage;
        this.model = model;
        Desk desk = new WindowDesk(this, model, ask);
        actions = new ViewerActions(model, desk);
        planePane = new PlanePane(model, feed);
        rail = new RailView(model);
        ledger = new LedgerView(model);
        search = new CommandSearch(actions, this::lower);
        shortcuts = new ShortcutSheet(actions, this::lower);
        side.setOrientation(Orientation.VERTICAL);
        side.getItems().addAll(ledger, new TracesView(model));
        side.setDividerPositions(0.4);
        SplitPane.setResizableWithParent(side, false);
        BorderPane frame = new BorderPane(middle);
        frame.setTop(new VBox(new TopBar(model, actions), new ReadOutStrip(model)));
        HBox time = new HBox(new TransportView(model, actions), rail);
        time.getStyleClass().add("time-band");
        HBox.setHgrow(rail, Priority.ALWAYS);
        frame.setBottom(new VBox(time, new JobStrip(model, actions), new StatusLine(model)));
        veil.getStyleClass().add("veil");
        veil.setVisible(false);
        veil.setOnMouseClicked(e -> {
            if (e.getTarget() == veil) {
                lower();
            }
        });
        root.getChildren().addAll(frame, veil);
        root.getStyleClass().add("viewer");
        showSide();
        model.settings().sidePanelProperty().addListener((o, was, now) -> showSide());
        Themes.follow(root, model.settings());
        dropFiles();
        Scene scene = new Scene(root, 1280, 720);
        new KeyMap(actions.all()).install(scene);
        stage.setScene(scene);
        stage.setMinWidth(900);
        stage.setMinHeight(560);
        stage.setTitle("Hemline");
        model.sessionProperty().addListener((o, was, now) -> stage.setTitle("Hemline \u2013 " + now.title()));
        ticking = clock();
        ticking.start();
        WindowPlace kept = model.settings().windowProperty().get();
        if (kept != null) {
            place(kept);
        }
        planePane.plane().requestFocus();
    }

    /** Where the window was, unless that screen is gone. */
    private void place(WindowPlace kept) {
        if (!Screen.getScreensForRectangle(kept.x(), kept.y(), kept.width(), kept.height()).isEmpty()) {
            stage.setX(kept.x());
            stage.setY(kept.y());
            stage.setWidth(kept.width());
            stage.setHeight(kept.height());
            stage.setMaximized(kept.maximised());
        }
    }

    /** Stops the clock and keeps where the window is; call when it closes. */
    public void closing() {
        ticking.stop();
        model.settings().windowProperty().set(new WindowPlace((int) stage.getX(), (int) stage.getY(),
                (int) stage.getWidth(), (int) stage.getHeight(), stage.isMaximized()));
    }

    private void showSide() {
        middle.getItems().setAll(model.settings().sidePanelProperty().get() ? List.of(planePane, side)
                : List.of(planePane));
        middle.setDividerPositions(0.66);
    }

    private void dropFiles() {
        root.setOnDragOver(e -> {
            if (e.getDragboard().hasFiles()) {
                e.acceptTransferModes(TransferMode.COPY);
            }
            e.consume();
        });
        root.setOnDragDropped(e -> {
            if (e.getDragboard().hasFiles()) {
                dropped(e.getDragboard().getFiles().stream().map(File::toPath).toList());
                e.setDropCompleted(true);
            }
            e.consume();
        });
    }

    /** Map layers are added to what is open; anything else is opened. */
    void dropped(List<Path> paths) {
        List<Path> maps = paths.stream().filter(p -> p.toString().endsWith(".geojson")).toList();
        List<Path> sweeps = paths.stream().filter(p -> !maps.contains(p)).toList();
        maps.forEach(model.map()::add);
        if (!sweeps.isEmpty()) {
            model.open(sweeps);
        }
    }

    /** Lets the loop play and the data age. */
    private AnimationTimer clock() {
        return new AnimationTimer() {
            private long before;
            private long ageSaid;

            @Override
            public void handle(long now) {
                if (before != 0) {
                    model.loop().advance((now - before) / 1e9);
                }
                before = now;
                if (now - ageSaid > 1_000_000_000L) {
                    ageSaid = now;
                    model.refreshAge();
                }
            }
        };
    }

    void raiseSearch() {
        raise(search);
        search.begin();
    }

    void raiseShortcuts() {
        raise(shortcuts);
        shortcuts.begin();
    }

    private void raise(Node sheet) {
        if (!veil.isVisible()) {
            focusedBefore = stage.getScene().getFocusOwner();
        }
        veil.getChildren().setAll(sheet);
        veil.setVisible(true);
    }

    private void lower() {
        veil.setVisible(false);
        if (focusedBefore != null) {
            focusedBefore.requestFocus();
        }
    }

    void focusFilter() {
        model.settings().sidePanelProperty().set(true);
        ledger.focusFilter();
    }

    /** Plane, rail, ledger, and round again. */
    void focusNextPart() {
        List<Node> parts = model.settings().sidePanelProperty().get()
                ? List.of(planePane.plane(), rail, ledger.lookup("#ledger-filter")) : List.of(planePane.plane(), rail);
        int at = parts.indexOf(stage.getScene().getFocusOwner());
        parts.get((at + 1) % parts.size()).requestFocus();
    }

    Node picture() {
        return planePane;
    }

    Stage stage() {
        return stage;
    }

    public ViewerActions actions() {
        return actions;
    }
}
