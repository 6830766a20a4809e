package hemline.viewer.view;

import static org.assertj.core.api.Assertions.assertThat;

import hemline.geometry.Point;
import hemline.viewer.FakeLoop;
import hemline.viewer.FakeOpener;
import hemline.viewer.viewmodel.Action;
import hemline.viewer.viewmodel.Motion;
import hemline.viewer.viewmodel.Overlay;
import hemline.viewer.viewmodel.PlaneField;
import hemline.viewer.viewmodel.ViewTransform;
import hemline.viewer.viewmodel.ViewerModel;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import javafx.geometry.Point2D;
import javafx.geometry.VerticalDirection;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.CheckBox;
import javafx.scene.control.Label;
import javafx.scene.control.TableView;
import javafx.scene.input.Clipboard;
import javafx.scene.input.KeyCode;
import javafx.scene.input.MouseButton;
import javafx.scene.input.ScrollEvent;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;
import org.junit.jupiter.api.io.TempDir;
import org.testfx.api.FxRobot;

/** Every action by its key, and what a mouse does on plane, rail, legend, ledger and traces. */
@TestInstance(TestInstance.Lifecycle.PER_CLASS)
class EveryActionTest {
    private final FxRobot robot = new FxRobot();
    private final FakeOpener opener = new FakeOpener(FakeLoop::small);
    private Toolkit viewer;
    private ViewerModel model;

    @BeforeAll
    void open() throws Exception {
        viewer = new Toolkit(opener, 1280, 720).open();
        model = viewer.model;
    }

    @AfterAll
    void close() throws Exception {
        viewer.close();
    }

    @BeforeEach
    void startAfresh() throws Exception {
        Toolkit.run(() -> {
            model.selection().clear();
            model.loop().clearLimits();
            model.loop().show(6);
            model.plane().fit();
            model.overlays().reset();
            model.settings().reset();
            model.plane().fieldProperty().set(PlaneField.MEASURED);
            model.measure().onProperty().set(false);
            model.job().dismissTrouble();
            node("#plane").requestFocus();
        });
    }

    private Node node(String id) {
        return viewer.stage.getScene().lookup(id);
    }

    private void press(KeyCode... keys) {
        robot.push(keys);
        Toolkit.settle();
    }

    private Point2D onPlane(Point place) throws Exception {
        ViewTransform view = model.plane().view();
        return Toolkit.onFx(() -> node("#plane").localToScreen(view.screenX(place), view.screenY(place)));
    }

    @Test
    void keysOfTheLoop() throws Exception {
        press(KeyCode.PERIOD);
        assertThat(model.loop().index()).isEqualTo(7);
        press(KeyCode.PAGE_UP);
        assertThat(model.loop().index()).isEqualTo(6);
        press(KeyCode.I);
        press(KeyCode.END);
        assertThat(model.loop().index()).isEqualTo(11);
        press(KeyCode.HOME);
        assertThat(model.loop().index()).as("start of the range").isEqualTo(6);
        press(KeyCode.SHIFT, KeyCode.I);
        press(KeyCode.R);
        assertThat(model.loop().motionProperty().get()).isEqualTo(Motion.ROCK);
        press(KeyCode.SHIFT, KeyCode.SPACE);
        assertThat(model.loop().motionProperty().get()).isEqualTo(Motion.BACK);
        press(KeyCode.SHIFT, KeyCode.SPACE);
        assertThat(model.loop().motionProperty().get()).isEqualTo(Motion.STILL);
        double speed = model.loop().sweepsPerSecondProperty().get();
        press(KeyCode.SHIFT, KeyCode.PERIOD);
        assertThat(model.loop().sweepsPerSecondProperty().get()).isGreaterThan(speed);
        press(KeyCode.SHIFT, KeyCode.COMMA);
    }

    @Test
    void keysOfThePlane() {
        double zoom = model.plane().view().pxPerKm();
        press(KeyCode.EQUALS);
        assertThat(model.plane().view().pxPerKm()).isGreaterThan(zoom);
        press(KeyCode.RIGHT);
        press(KeyCode.UP);
        assertThat(model.plane().view().centre().xKm()).isPositive();
        assertThat(model.plane().view().centre().yKm()).isPositive();
        press(KeyCode.MINUS);
        press(KeyCode.DIGIT0);
        assertThat(model.plane().view().centre()).isEqualTo(new Point(0, 0));
        assertThat(model.plane().view().pxPerKm()).isEqualTo(zoom);
        press(KeyCode.DIGIT4);
        assertThat(model.plane().fieldProperty().get()).isEqualTo(PlaneField.VELOCITY);
        press(KeyCode.DIGIT3);
        assertThat(model.plane().fieldProperty().get()).isEqualTo(PlaneField.REMOVED);
        press(KeyCode.SHIFT, KeyCode.OPEN_BRACKET);
        assertThat(model.plane().opacityProperty().get()).isLessThan(1);
        press(KeyCode.SHIFT, KeyCode.CLOSE_BRACKET);
        assertThat(model.plane().opacityProperty().get()).isEqualTo(1);
    }

    @Test
    void keysOfEveryOverlay() {
        for (Overlay overlay : Overlay.values()) {
            press(KeyCode.valueOf(overlay.key()));
            assertThat(model.overlays().isShown(overlay)).as(overlay.words()).isNotEqualTo(overlay.shownAtFirst());
        }
    }

    @Test
    void keysOfTheSelectionAndTheWindow() throws Exception {
        press(KeyCode.CLOSE_BRACKET);
        assertThat(model.selection().track()).isEqualTo("T01");
        press(KeyCode.OPEN_BRACKET);
        assertThat(model.selection().track()).isEqualTo("T03");
        press(KeyCode.SHIFT, KeyCode.HOME);
        assertThat(model.loop().index()).isEqualTo(2);
        press(KeyCode.ESCAPE);
        assertThat(model.selection().track()).isEmpty();
        press(KeyCode.F9);
        assertThat(model.settings().sidePanelProperty().get()).isFalse();
        press(KeyCode.CONTROL, KeyCode.F);
        assertThat(model.settings().sidePanelProperty().get()).as("the filter needs the panel").isTrue();
        assertThat(viewer.stage.getScene().getFocusOwner().getId()).isEqualTo("ledger-filter");
        press(KeyCode.F6);
        assertThat(viewer.stage.getScene().getFocusOwner().getId()).isEqualTo("plane");
        press(KeyCode.CONTROL, KeyCode.T);
        assertThat(viewer.stage.getScene().getRoot().getStyleClass()).contains("light");
        press(KeyCode.CONTROL, KeyCode.L);
        assertThat(((Label) node("#place")).getText()).contains(java.time.ZoneId.systemDefault().getId());
        press(KeyCode.CONTROL, KeyCode.EQUALS);
        assertThat(viewer.stage.getScene().getRoot().getStyle()).contains("14.3px");
    }

    @Test
    void typingInTheFilterDoesNothingElse() {
        press(KeyCode.CONTROL, KeyCode.F);
        robot.write("b.");
        Toolkit.settle();
        assertThat(model.overlays().isShown(Overlay.BOUNDARIES)).isTrue();
        assertThat(model.loop().index()).isEqualTo(6);
        assertThat(model.ledger().filterProperty().get()).isEqualTo("b.");
        robot.eraseText(2);
        Toolkit.settle();
        assertThat(model.ledger().tracks()).hasSize(3);
    }

    @Test
    void dragPansAndWheelZoomsAboutTheCursor() throws Exception {
        Point place = new Point(20, 10);
        Point2D from = onPlane(place);
        robot.drag(from, MouseButton.PRIMARY).dropBy(60, 30);
        Toolkit.settle();
        Point2D now = onPlane(place);
        assertThat(now.distance(from.add(60, 30))).isLessThan(2);
        robot.moveTo(now);
        robot.scroll(3, VerticalDirection.UP);
        Toolkit.settle();
        assertThat(onPlane(place).distance(now)).as("the place under the cursor stays").isLessThan(2);
    }

    @Test
    void pinchZooms() throws Exception {
        double zoom = model.plane().view().pxPerKm();
        Toolkit.run(() -> node("#plane").fireEvent(new javafx.scene.input.ZoomEvent(javafx.scene.input.ZoomEvent.ZOOM,
                200, 200, 200, 200, false, false, false, false, false, false, 1.5, 1.5, null)));
        assertThat(model.plane().view().pxPerKm()).isEqualTo(1.5 * zoom);
        Toolkit.run(() -> node("#plane").fireEvent(new ScrollEvent(ScrollEvent.SCROLL, 1, 1, 1, 1, false, false, false,
                false, false, false, 0, 0, 0, 0, ScrollEvent.HorizontalTextScrollUnits.NONE, 0,
                ScrollEvent.VerticalTextScrollUnits.NONE, 0, 0, null)));
        assertThat(model.plane().view().pxPerKm()).as("a scroll of nothing").isEqualTo(1.5 * zoom);
    }

    @Test
    void measuringByMouseBetweenTwoSweepsGivesASpeed() throws Exception {
        press(KeyCode.X);
        robot.clickOn(onPlane(new Point(0, 30)));
        press(KeyCode.PERIOD);
        robot.clickOn(onPlane(new Point(0, 40)));
        Toolkit.settle();
        Label words = (Label) node("#measure-words");
        assertThat(words.isVisible()).isTrue();
        assertThat(words.getText()).startsWith("Measured ").contains("in 5 min: ").endsWith("m s\u207b\u00b9");
        press(KeyCode.ESCAPE);
        assertThat(words.isVisible()).isFalse();
    }

    @Test
    void measuringByKeyMarksThePlaceInTheMiddle() throws Exception {
        Toolkit.run(() -> model.plane().cursorProperty().set(null));
        press(KeyCode.X);
        press(KeyCode.ENTER);
        assertThat(model.measure().fromProperty().get().place()).isEqualTo(model.plane().view().centre());
    }

    @Test
    void clickAndDragOnTheRailScrub() throws Exception {
        Node rail = node("#rail");
        var layout = hemline.viewer.viewmodel.RailLayout.of(model.session(), rail.getLayoutBounds().getWidth(),
                rail.getLayoutBounds().getHeight());
        Point2D third = Toolkit.onFx(() -> rail.localToScreen(layout.sweepX().get(3), 20));
        Point2D ninth = Toolkit.onFx(() -> rail.localToScreen(layout.sweepX().get(9), 20));
        robot.clickOn(third);
        assertThat(model.loop().index()).isEqualTo(3);
        robot.drag(third, MouseButton.PRIMARY).dropTo(ninth);
        Toolkit.settle();
        assertThat(model.loop().index()).isEqualTo(9);
        press(KeyCode.LEFT);
        assertThat(model.loop().index()).as("the rail's own arrow key").isEqualTo(8);
        var bar = layout.bars().get(0);
        robot.clickOn(Toolkit.onFx(() -> rail.localToScreen(bar.fromX() + 40, bar.y() + 4)));
        assertThat(model.selection().track()).isEqualTo(bar.track().id());
        var mark = layout.meetings().get(0);
        robot.clickOn(Toolkit.onFx(() -> rail.localToScreen(mark.x(), mark.y() - 3)));
        Toolkit.settle();
        assertThat(model.selection().meeting()).isEqualTo("M1");
        assertThat(model.loop().index()).isEqualTo(8);
    }

    @Test
    void legendRowsSwitchTheirOverlay() throws Exception {
        Toolkit.run(() -> ((javafx.scene.control.TitledPane) node("#legend")).setExpanded(true));
        CheckBox row = (CheckBox) node("#show-meetings");
        robot.clickOn(row);
        Toolkit.settle();
        assertThat(model.overlays().isShown(Overlay.MEETINGS)).isFalse();
        Toolkit.run(() -> ((javafx.scene.control.TitledPane) node("#legend")).setExpanded(false));
    }

    @Test
    void ledgerSortsByAColumnAndCopiesWhatItShows() throws Exception {
        robot.clickOn("Speed");
        Toolkit.settle();
        TableView<?> table = (TableView<?>) node("#tracks");
        assertThat(table.getItems()).first().hasFieldOrPropertyWithValue("id", "T03");
        robot.clickOn("Speed");
        Toolkit.settle();
        assertThat(table.getItems()).first().hasFieldOrPropertyWithValue("id", "T01");
        robot.clickOn("#ledger-copy");
        Toolkit.settle();
        String copied = Toolkit.onFx(() -> Clipboard.getSystemClipboard().getString());
        assertThat(copied).startsWith("Track\tSpeed (m s\u207b\u00b9)").contains("\nT01\t11.5\t");
        Toolkit.run(() -> table.getSortOrder().clear());
    }

    @Test
    void tracesReadOutUnderTheCursorAndGoToTheirSweep() throws Exception {
        Toolkit.run(() -> model.selection().selectTrack("T01"));
        Node radius = node("#trace-radius");
        Point2D start = Toolkit.onFx(() -> radius.localToScreen(hemline.viewer.render.TracePainter.LEFT_PX + 8, 30));
        robot.clickOn(start);
        Toolkit.settle();
        assertThat(model.loop().index()).isZero();
        assertThat(radius.getAccessibleText()).startsWith("Radius of T01: 21:00  9.0");
    }

    @Test
    void picturesAreCopiedAndSaved(@TempDir Path folder) throws Exception {
        press(KeyCode.CONTROL, KeyCode.SHIFT, KeyCode.C);
        assertThat(Toolkit.onFx(() -> Clipboard.getSystemClipboard().hasImage())).isTrue();
        Path file = folder.resolve("plane.png");
        viewer.picture = Optional.of(file);
        press(KeyCode.CONTROL, KeyCode.S);
        assertThat(Files.size(file)).isGreaterThan(10_000);
        viewer.picture = Optional.of(folder.resolve("no/such/folder.png"));
        press(KeyCode.CONTROL, KeyCode.S);
        assertThat(((Label) node("#job-trouble")).getText()).startsWith("Saving the picture failed");
        robot.clickOn("#job-dismiss");
        Toolkit.settle();
        assertThat(node("#job-trouble").getParent().isVisible()).isFalse();
    }

    @Test
    void filesAndFoldersAreOpenedAndRemembered() throws Exception {
        viewer.files = List.of(Path.of("/loops/one.nc"), Path.of("/loops/two.nc"));
        press(KeyCode.CONTROL, KeyCode.O);
        Toolkit.await(() -> !model.job().runningProperty().get());
        assertThat(opener.opened).last().isEqualTo(viewer.files);
        viewer.folder = Optional.of(Path.of("/loops/broken"));
        press(KeyCode.CONTROL, KeyCode.SHIFT, KeyCode.O);
        Toolkit.await(() -> !model.job().runningProperty().get());
        assertThat(((Label) node("#job-trouble")).getText()).contains("fetch the file again");
        assertThat(model.session()).as("what was open stays").isNotNull();
        assertThat(model.settings().recent()).contains(Path.of("/loops/one.nc"));
        assertThat(viewer.window.actions().search("again one.nc")).hasSize(1);
    }

    @Test
    void theShortcutSheetNamesEveryKeyAndCloses() {
        press(KeyCode.F1);
        Node sheet = node("#shortcut-sheet");
        assertThat(sheet.getParent().isVisible()).isTrue();
        for (Action action : viewer.window.actions().all()) {
            if (!action.keys().isEmpty()) {
                assertThat(sheet.lookupAll(".label")).extracting(n -> ((Label) n).getText()).contains(action.words());
            }
        }
        press(KeyCode.ESCAPE);
        assertThat(sheet.getParent().isVisible()).isFalse();
    }

    @Test
    void everyButtonSaysWhatItDoes() {
        for (Node button : viewer.stage.getScene().getRoot().lookupAll(".button")) {
            if (button instanceof Button b && b.getId() != null && b.getId().startsWith("do-")) {
                assertThat(b.getAccessibleText()).as(b.getId()).isNotBlank();
                assertThat(b.getTooltip().getText()).as(b.getId()).isNotBlank();
            }
        }
    }

    @Test
    void theSmallestWindowCutsNoWords() throws Exception {
        for (String id : List.of("#guidance", "#age", "#time", "#date", "#do-field-measured", "#do-commands")) {
            Node node = node(id);
            double needs = node.prefWidth(-1);
            assertThat(node.getLayoutBounds().getWidth()).as(id).isGreaterThanOrEqualTo(needs - 1);
        }
    }
}
