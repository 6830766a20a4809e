package hemline.viewer.viewmodel;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import hemline.geodesy.BeamGeometry;
import hemline.geometry.Point;
import hemline.viewer.FakeLoop;
import org.junit.jupiter.api.Test;

/** Measure tool, status line, axis steps, hits, overlays. */
class SmallModelsTest {
    private static MeasureModel.Mark mark(double x, double y, long ms, int sweep) {
        return new MeasureModel.Mark(new Point(x, y), ms, sweep);
    }

    @Test
    void measuresDistanceAndBearingWithinOneSweep() {
        MeasureModel measure = new MeasureModel();
        assertThat(measure.words()).contains("click the first place");
        measure.mark(mark(0, 0, 0, 3));
        assertThat(measure.words()).contains("second place");
        measure.mark(mark(3, -4, 0, 3));
        assertThat(measure.words()).isEqualTo("Measured 5.00 km toward 143\u00b0 within one sweep");
    }

    @Test
    void betweenTwoSweepsItGivesASpeedFromTheRaysTimes() {
        MeasureModel measure = new MeasureModel();
        measure.mark(mark(0, 0, 0, 3));
        measure.mark(mark(0, 3.6, 300_000, 4));
        assertThat(measure.words()).isEqualTo("Measured 3.60 km toward 000\u00b0 in 5 min: 12.0 m s\u207b\u00b9");
        measure.mark(mark(1, 1, 0, 4));
        assertThat(measure.toProperty().get()).as("a third mark starts afresh").isNull();
    }

    @Test
    void leavingTheMeasureToolForgetsItsMarks() {
        MeasureModel measure = new MeasureModel();
        measure.onProperty().set(true);
        measure.mark(mark(0, 0, 0, 3));
        measure.onProperty().set(false);
        assertThat(measure.fromProperty().get()).isNull();
    }

    /** The centre of a beam at 0.5° is 1.0, 1.5 and 2.0 km up at 75.8, 101.9 and 124.6 km (4/3 earth). */
    @Test
    void theCeilingRangeIsWhereTheBeamPassesTheHeight() {
        BeamGeometry beam = new BeamGeometry(0.5, 0);
        assertThat(StatusModel.ceilingRangeKm(beam, 1000)).isCloseTo(75.8, within(0.1));
        assertThat(StatusModel.ceilingRangeKm(beam, 1500)).isCloseTo(101.9, within(0.1));
        assertThat(StatusModel.ceilingRangeKm(beam, 2000)).isCloseTo(124.6, within(0.1));
    }

    @Test
    void freshDataTurnOldAfterAQuarterOfAnHour() {
        StatusModel status = new StatusModel();
        FakeLoop loop = FakeLoop.small(true);
        long newest = FakeLoop.timeMs(11) + 17_900;
        status.open(loop, newest + 4 * 60_000);
        assertThat(status.oldProperty().get()).isFalse();
        assertThat(status.ageProperty().get()).contains("4 min old");
        status.refresh(newest + 16 * 60_000);
        assertThat(status.oldProperty().get()).isTrue();
        status.refresh(newest + 3 * 86_400_000L);
        assertThat(status.oldProperty().get()).as("an archived loop is not stale").isFalse();
        assertThat(status.ageProperty().get()).contains("archive");
        status.refresh(newest - 3_600_000);
        assertThat(status.ageProperty().get()).contains("ahead of the clock");
    }

    @Test
    void stepsAreOneTwoFive() {
        assertThat(NiceSteps.step(0.7)).isEqualTo(1);
        assertThat(NiceSteps.step(1)).isEqualTo(1);
        assertThat(NiceSteps.step(1.2)).isEqualTo(2);
        assertThat(NiceSteps.step(23)).isEqualTo(50);
        assertThat(NiceSteps.step(60)).isCloseTo(100, within(1e-9));
        assertThat(NiceSteps.multiples(-3, 5, 2)).containsExactly(-2.0, 0.0, 2.0, 4.0);
        assertThatThrownBy(() -> NiceSteps.step(0)).isInstanceOf(IllegalArgumentException.class);
    }

    @Test
    void hitsTakeTheNearestWithinReach() {
        FakeLoop loop = FakeLoop.small(true);
        Point onLine = loop.tracks().get(2).bySweep().get(4).get(0).vertices().get(10).position();
        assertThat(Hits.track(loop, 4, onLine.plus(new Point(0, 0.3)), 1)).map(t -> t.id()).contains("T03");
        assertThat(Hits.track(loop, 4, onLine.plus(new Point(0, 3)), 1)).isEmpty();
        assertThat(Hits.track(loop, 0, onLine, 1)).as("not in that sweep").isEmpty();
        assertThat(Hits.meeting(loop, new Point(1.2, 2), 1)).map(m -> m.id()).contains("M1");
    }

    @Test
    void overlaysGoBackToTheUsual() {
        OverlayModel overlays = new OverlayModel();
        overlays.toggle(Overlay.RINGS);
        overlays.toggle(Overlay.GRATICULE);
        overlays.reset();
        assertThat(overlays.isShown(Overlay.RINGS)).isTrue();
        assertThat(overlays.isShown(Overlay.GRATICULE)).isFalse();
    }
}
