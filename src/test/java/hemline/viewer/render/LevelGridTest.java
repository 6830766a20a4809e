package hemline.viewer.render;

import static org.assertj.core.api.Assertions.assertThat;

import hemline.geometry.Point;
import hemline.sweep.Field;
import hemline.sweep.ReflectivityScale;
import hemline.viewer.FakeLoop;
import hemline.viewer.viewmodel.HeldSweep;
import hemline.viewer.viewmodel.PlaneField;
import hemline.viewer.viewmodel.ReadOut;
import hemline.viewer.viewmodel.ViewTransform;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class LevelGridTest {
    private final FakeLoop loop = FakeLoop.small(true);
    private final HeldSweep held = new HeldSweep(4, loop.sweep(4), loop.screened(4).map(s -> s.mask()));

    private int[] pixels(PlaneField field, ViewTransform view) {
        PolarMap map = new PolarMap(view, 1);
        int[] argb = new int[map.width() * map.height()];
        LevelGrid.of(held, field).paint(map, argb);
        return argb;
    }

    /** The picture and the read-out find gates by different ways; they must agree but at gate edges. */
    @Test
    void everyPixelHasTheColourOfTheGateUnderIt() {
        ViewTransform view = new ViewTransform(new Point(-12, 7), 7.3, 240, 180);
        int[] argb = pixels(PlaneField.MEASURED, view);
        int differ = 0;
        for (int row = 0; row < 180; row++) {
            for (int column = 0; column < 240; column++) {
                ReadOut read = ReadOut.at(view.toPlane(column + 0.5, row + 0.5), held);
                float rounded = Field.isEcho(read.dbz()) ? Math.round(2 * read.dbz()) / 2f : read.dbz();
                if (ReflectivityScale.standard().argb(rounded) != argb[row * 240 + column]) {
                    differ++;
                }
            }
        }
        assertThat(differ).as("pixels on the edge of a gate, of 43200").isLessThan(1400);
    }

    @Test
    void northIsUpAndEastIsRight() {
        ViewTransform view = ViewTransform.fitting(60, 200, 200);
        int[] argb = pixels(PlaneField.REMOVED, view);
        int masts = (int) view.screenY(12.0) * 200 + (int) view.screenX(12.0);
        assertThat(argb[masts]).isEqualTo(ReasonColours.argb(hemline.sweep.MaskReason.CLUTTER));
    }

    @Test
    void theScreenedFieldLacksClutterButKeepsDeepConvection() {
        ViewTransform view = ViewTransform.fitting(60, 400, 400);
        int masts = (int) view.screenY(12.0) * 400 + (int) view.screenX(12.0);
        int cell = (int) view.screenY(14.8) * 400 + (int) view.screenX(-30.4);
        int[] measured = pixels(PlaneField.MEASURED, view);
        int[] screened = pixels(PlaneField.SCREENED, view);
        assertThat(measured[masts]).isNotZero();
        assertThat(screened[masts]).isZero();
        assertThat(screened[cell]).isEqualTo(measured[cell]).isNotZero();
    }

    @Test
    void nothingIsDrawnBeyondTheLastGate() {
        int[] argb = pixels(PlaneField.MEASURED, ViewTransform.fitting(200, 100, 100));
        assertThat(argb[0]).isZero();
        assertThat(argb[50 * 100 + 99]).isZero();
        assertThat(argb[50 * 100 + 50]).isNotZero();
    }

    @Test
    void aDenserScreenGetsMorePixels() {
        PolarMap map = new PolarMap(ViewTransform.fitting(60, 100, 80), 1.5);
        assertThat(map.width()).isEqualTo(150);
        assertThat(map.height()).isEqualTo(120);
    }

    @Test
    void withoutVelocityThereIsNothingToDraw() {
        HeldSweep dry = new HeldSweep(0, withoutVelocity(), Optional.empty());
        PolarMap map = new PolarMap(ViewTransform.fitting(60, 50, 50), 1);
        int[] argb = new int[2500];
        LevelGrid.of(dry, PlaneField.VELOCITY).paint(map, argb);
        assertThat(argb).containsOnly(0);
    }

    private hemline.sweep.Sweep withoutVelocity() {
        hemline.sweep.Sweep s = held.raw();
        return new hemline.sweep.Sweep(s.site(), s.source(), s.elevationDeg(), s.beamWidthDeg(), s.firstGateCentreM(),
                s.gateSpacingM(), s.rays(), s.reflectivity(), Optional.empty(), Double.NaN);
    }
}
