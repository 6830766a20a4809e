package hemline.viewer.view;

import static org.assertj.core.api.Assertions.assertThat;

import hemline.viewer.FakeLoop;
import hemline.viewer.FakeOpener;
import hemline.viewer.viewmodel.Motion;
import hemline.viewer.viewmodel.Overlay;
import hemline.viewer.viewmodel.PlaneField;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.TableView;
import javafx.scene.input.KeyCode;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;
import org.testfx.api.FxRobot;

@TestInstance(TestInstance.Lifecycle.PER_CLASS)
class ViewerWindowTest {
    private final FxRobot robot = new FxRobot();
    private Toolkit viewer;

    @BeforeAll
    void openTheInventedLoop() throws Exception {
        viewer = new Toolkit(new FakeOpener(FakeLoop::small), 1280, 720).open();
    }

    @AfterAll
    void close() throws Exception {
        viewer.close();
    }

    @BeforeEach
    void startFromTheNewestSweepWithNothingSelected() throws Exception {
        Toolkit.run(() -> {
            viewer.model.selection().clear();
            viewer.model.loop().clearLimits();
            viewer.model.loop().show(11);
            viewer.model.plane().fit();
            viewer.model.overlays().reset();
            viewer.model.plane().fieldProperty().set(PlaneField.MEASURED);
            viewer.model.measure().onProperty().set(false);
            viewer.model.ledger().filterProperty().set("");
            robot.lookup("#plane").query().requestFocus();
        });
    }

    private String text(String id) {
        return robot.lookup(id).<Label>query().getText();
    }

    private void press(KeyCode... keys) {
        robot.push(keys);
        Toolkit.settle();
    }

    @Test
    void showsTimeAndPlaceInTheLoop() {
        assertThat(text("#time")).startsWith("22:00");
        assertThat(text("#place")).isEqualTo("sweep 12 of 12");
        assertThat(text("#title")).contains("Marrow Flat");
    }

    @Test
    void alwaysSaysThatItIsGuidance() {
        Label guidance = robot.lookup("#guidance").query();
        assertThat(guidance.getText()).isEqualTo("Guidance, not a warning");
        assertThat(guidance.isVisible()).isTrue();
        assertThat(text("#age")).contains("2031-07-14").contains("UTC").contains("old");
        assertThat(text("#reach")).contains("km");
    }

    @Test
    void stepsByKey() {
        press(KeyCode.COMMA);
        assertThat(text("#place")).isEqualTo("sweep 11 of 12");
        press(KeyCode.PERIOD);
        assertThat(text("#place")).isEqualTo("sweep 12 of 12");
        press(KeyCode.HOME);
        assertThat(text("#place")).isEqualTo("sweep 1 of 12");
    }

    @Test
    void stepsByButton() {
        robot.clickOn("#do-previous");
        assertThat(viewer.model.loop().index()).isEqualTo(10);
        robot.clickOn("#do-next");
        assertThat(viewer.model.loop().index()).isEqualTo(11);
    }

    @Test
    void playsAndStopsByKey() throws Exception {
        press(KeyCode.SPACE);
        assertThat(viewer.model.loop().motionProperty().get()).isEqualTo(Motion.FORWARD);
        Toolkit.await(() -> viewer.model.loop().index() < 11);
        press(KeyCode.SPACE);
        assertThat(viewer.model.loop().motionProperty().get()).isEqualTo(Motion.STILL);
    }

    @Test
    void ledgerRowSelectsOnPlaneAndTraces() {
        robot.clickOn("T02");
        Toolkit.settle();
        assertThat(viewer.model.selection().track()).isEqualTo("T02");
        assertThat(text("#traces-heading")).startsWith("T02");
        Node plane = robot.lookup("#plane").query();
        assertThat(plane.getAccessibleText()).contains("Selected T02");
    }

    @Test
    void clickOnALineSelectsItInTheLedger() throws Exception {
        Node plane = robot.lookup("#plane").query();
        var piece = viewer.model.track("T01").orElseThrow().bySweep().get(11).get(0);
        var place = piece.vertices().get(piece.vertices().size() / 2).position();
        var view = viewer.model.plane().view();
        var screen = Toolkit.onFx(() -> plane.localToScreen(view.screenX(place), view.screenY(place)));
        robot.clickOn(screen);
        Toolkit.settle();
        assertThat(viewer.model.selection().track()).isEqualTo("T01");
        TableView<?> table = robot.lookup("#tracks").query();
        assertThat(table.getSelectionModel().getSelectedItem()).hasFieldOrPropertyWithValue("id", "T01");
    }

    @Test
    void cursorReadsOutTheGateUnderIt() throws Exception {
        Node plane = robot.lookup("#plane").query();
        var view = viewer.model.plane().view();
        robot.moveTo(Toolkit.onFx(() -> plane.localToScreen(view.screenX(12), view.screenY(12))));
        Toolkit.settle();
        assertThat(text("#read-masked")).isEqualTo("static clutter");
        assertThat(text("#read-echo")).isEqualTo("45.0 dBZ");
        assertThat(Double.parseDouble(text("#read-azimuth").replace("\u00b0", ""))).isBetween(43.0, 47.0);
        assertThat(text("#read-latitude")).endsWith("N");
    }

    @Test
    void overlayKeyHidesAndShows() {
        press(KeyCode.B);
        assertThat(viewer.model.overlays().isShown(Overlay.BOUNDARIES)).isFalse();
        press(KeyCode.B);
        assertThat(viewer.model.overlays().isShown(Overlay.BOUNDARIES)).isTrue();
    }

    @Test
    void commandSearchDoesWhatWasTyped() {
        press(KeyCode.CONTROL, KeyCode.K);
        robot.write("field: velocity");
        press(KeyCode.ENTER);
        assertThat(viewer.model.plane().fieldProperty().get()).isEqualTo(PlaneField.VELOCITY);
        assertThat(robot.lookup("#command-search").query().getParent().isVisible()).isFalse();
    }
}
