package hemline.viewer.viewmodel;

import static org.assertj.core.api.Assertions.assertThat;

import hemline.geometry.Point;
import hemline.viewer.FakeLoop;
import hemline.viewer.FakeOpener;
import java.nio.file.Path;
import java.time.Clock;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.List;
import org.junit.jupiter.api.Test;

class ViewerModelTest {
    private final Clock clock = Clock.fixed(Instant.parse("2031-07-14T22:12:00Z"), ZoneOffset.UTC);
    private final FakeOpener opener = new FakeOpener(FakeLoop::small);
    private final ViewerModel model = new ViewerModel(opener, Runnable::run, Runnable::run, Runnable::run, clock);

    private void open() {
        model.open(List.of(Path.of("invented")));
    }

    @Test
    void opensOnTheNewestSweepAnalysed() {
        open();
        assertThat(model.session().analysed()).isTrue();
        assertThat(model.loop().index()).isEqualTo(11);
        assertThat(model.shownProperty().get().index()).isEqualTo(11);
        assertThat(model.shownProperty().get().mask()).isPresent();
        assertThat(model.ledger().tracks()).hasSize(3);
        assertThat(model.job().runningProperty().get()).isFalse();
    }

    @Test
    void sweepsCanBeLookedAtWhileTheyAreAnalysed() {
        Deque<Runnable> ui = new ArrayDeque<>();
        ViewerModel slow = new ViewerModel(opener, Runnable::run, Runnable::run, ui::add, clock);
        slow.open(List.of(Path.of("invented")));
        while (slow.session() == null) {
            ui.poll().run();
        }
        assertThat(slow.session().analysed()).isFalse();
        slow.loop().show(3);
        slow.plane().zoomIn();
        slow.plane().pan(30, 40);
        ViewTransform before = slow.plane().view();
        while (!ui.isEmpty()) {
            ui.poll().run();
        }
        assertThat(slow.session().analysed()).isTrue();
        assertThat(slow.loop().index()).as("the result does not move the user's view").isEqualTo(3);
        assertThat(slow.plane().view()).isEqualTo(before);
        assertThat(slow.shownProperty().get().mask()).as("the screened sweep replaces the raw one").isPresent();
    }

    @Test
    void aFitReachesALittleBeyondTheCeiling() {
        double radius = ViewerModel.fitRadiusKm(new FakeLoop(1, 36, 1000, false).sweep(0), 1500);
        assertThat(radius).isBetween(105.0, 120.0);
        assertThat(ViewerModel.fitRadiusKm(FakeLoop.small(false).sweep(0), 1500)).as("the sweep's own reach")
                .isBetween(59.0, 60.0);
    }

    @Test
    void whatCannotBeOpenedLeavesWhatIsThere() {
        open();
        model.loop().show(4);
        model.open(List.of(Path.of("broken")));
        assertThat(model.session()).isNotNull();
        assertThat(model.loop().index()).isEqualTo(4);
        assertThat(model.job().troubleProperty().get()).contains("ends within the first ray")
                .contains("fetch the file again");
    }

    @Test
    void aSweepThatCannotBeReadSaysSo() {
        FakeLoop loop = FakeLoop.small(true);
        ViewerModel other = new ViewerModel(new FakeOpener(analysed -> new BrokenSweep(loop, 5)), Runnable::run,
                Runnable::run, Runnable::run, clock);
        other.open(List.of(Path.of("x")));
        other.loop().show(5);
        assertThat(other.shownProperty().get()).isNull();
        assertThat(other.sweepTroubleProperty().get()).isEqualTo("Sweep 6 could not be read: the file is gone");
        other.loop().step(1);
        assertThat(other.sweepTroubleProperty().get()).isEmpty();
        assertThat(other.shownProperty().get().index()).isEqualTo(6);
    }

    @Test
    void aNewLoopStartsAsMeasuredSinceItIsNotScreenedYet() {
        open();
        model.plane().fieldProperty().set(PlaneField.SCREENED);
        open();
        assertThat(model.plane().fieldProperty().get()).isEqualTo(PlaneField.MEASURED);
    }

    @Test
    void aMeetingIsShownAtItsSweepAndPlace() {
        open();
        model.plane().resize(400, 400);
        model.plane().zoom(20, 0, 0);
        model.goToMeeting("M1");
        assertThat(model.loop().index()).isEqualTo(8);
        assertThat(model.plane().view().centre()).isEqualTo(new Point(1, 2));
        assertThat(model.selection().meeting()).isEqualTo("M1");
        assertThat(model.selection().track()).isEmpty();
    }

    @Test
    void aTrackThatIsNotInTheSweepIsShownAtItsNearestOne() {
        open();
        model.goToTrack("T03");
        assertThat(model.loop().index()).isEqualTo(10);
        model.loop().show(0);
        model.goToTrack("T03");
        assertThat(model.loop().index()).isEqualTo(2);
    }

    @Test
    void clicksSelectMeetingsBeforeTracksAndEmptyGroundClears() {
        open();
        model.selectAt(new Point(1, 2), 2);
        assertThat(model.selection().meeting()).isEqualTo("M1");
        Point onTrack = model.track("T02").orElseThrow().bySweep().get(11).get(0).vertices().get(20).position();
        model.selectAt(onTrack, 0.5);
        assertThat(model.selection().track()).isEqualTo("T02");
        model.selectAt(new Point(80, 80), 0.5);
        assertThat(model.selection().track()).isEmpty();
    }

    @Test
    void hiddenOverlaysCannotBeHit() {
        open();
        model.overlays().toggle(Overlay.MEETINGS);
        model.overlays().toggle(Overlay.BOUNDARIES);
        model.selectAt(new Point(1, 2), 2);
        assertThat(model.selection().meeting()).isEmpty();
        assertThat(model.selection().track()).isEmpty();
    }

    @Test
    void marksOfTheMeasureToolCarryTheirRaysTime() {
        open();
        Point place = new Point(0, -40);
        model.markAt(place);
        assertThat(model.measure().fromProperty().get().timeMs())
                .isEqualTo(model.session().frames().get(11).timeAtMs(place)).isGreaterThan(FakeLoop.timeMs(11));
    }

    @Test
    void theReadOutFollowsCursorAndSweep() {
        open();
        assertThat(model.readOut().get()).isEmpty();
        model.plane().cursorProperty().set(new Point(12, 12));
        assertThat(model.readOut().get().orElseThrow().masked()).isEqualTo("static clutter");
        long before = model.readOut().get().orElseThrow().rayMs();
        model.loop().step(-1);
        assertThat(model.readOut().get().orElseThrow().rayMs()).isEqualTo(before - FakeLoop.STEP_MS);
    }
}
